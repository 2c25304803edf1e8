import type { HandValve } from '@rimeward/field-log';

const angle = { open: 0, 'half-open': 45, closed: 90, other: 90 } as const;

interface Props {
  role: HandValve['role'];
  position: keyof typeof angle | null;
}

/** A ball valve seen from above its handle: along the pipe open, across it closed, at 45 degrees half open. */
export function ValvePicture({ role, position }: Props) {
  const small = role !== 'shutoff';
  return (
    <svg width="56" height="56" viewBox="0 0 56 56" aria-hidden="true">
      <path d="M2 28H54" stroke="currentColor" strokeWidth={small ? 5 : 10} opacity="0.35" />
      <circle cx="28" cy="28" r={small ? 9 : 14} fill="none" stroke="currentColor" strokeWidth="3" />
      {position === null ? (
        <path
          d="M22 22a6 6 0 1 1 8 8c-2 1-2 2-2 4M28 40v1"
          stroke="currentColor"
          strokeWidth="3"
          fill="none"
        />
      ) : (
        <g transform={`rotate(${angle[position]} 28 28)`}>
          <path d="M28 28H52" stroke="currentColor" strokeWidth="7" strokeLinecap="round" />
          <circle cx="28" cy="28" r="4" fill="currentColor" />
        </g>
      )}
      {position === 'other' && <path d="M6 6l10 10M16 6L6 16" stroke="currentColor" strokeWidth="3" />}
    </svg>
  );
}
