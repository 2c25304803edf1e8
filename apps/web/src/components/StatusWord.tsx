import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';

export type StatusShape = 'todo' | 'partly' | 'done' | 'not-needed' | 'attention';

/** A state as shape and word together: open ring, half-filled ring, tick, dash, diamond. */
export function StatusWord({ status, label }: { status: StatusShape; label: string }) {
  return (
    <Stack direction="row" spacing={1} sx={{ alignItems: 'center', flexShrink: 0, maxWidth: '50%' }}>
      <svg width="24" height="24" viewBox="0 0 24 24" aria-hidden="true" style={{ flexShrink: 0 }}>
        {shapes[status]}
      </svg>
      <Typography component="span" variant="body2" sx={{ fontWeight: 600, textAlign: 'left' }}>
        {label}
      </Typography>
    </Stack>
  );
}

const line = { fill: 'none', stroke: 'currentColor', strokeWidth: 3 } as const;
const shapes = {
  todo: <circle cx="12" cy="12" r="9" {...line} />,
  partly: (
    <>
      <circle cx="12" cy="12" r="9" {...line} />
      <path d="M12 3a9 9 0 0 1 0 18z" fill="currentColor" />
    </>
  ),
  done: <path d="M3 13l6 6L21 5" {...line} strokeWidth={4} />,
  'not-needed': <path d="M4 12h16" {...line} />,
  attention: <path d="M12 1l11 11-11 11L1 12z" fill="currentColor" />,
} as const;
