import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import type { ReactNode } from 'react';

export type CautionPicture =
  'people' | 'eyes-ears' | 'hose' | 'pressure' | 'backflow' | 'heat' | 'water' | 'pump';

/** A caution where the danger is: our own picture and words, framed in brass. */
export function Caution({ picture, children }: { picture: CautionPicture; children: ReactNode }) {
  return (
    <Stack
      direction="row"
      spacing={2}
      role="note"
      sx={{ alignItems: 'center', border: 2, borderColor: 'warning.main', borderRadius: 1, p: 1.5 }}
    >
      <svg width="48" height="48" viewBox="0 0 48 48" aria-hidden="true" style={{ flexShrink: 0 }}>
        <g fill="none" stroke="currentColor" strokeWidth="3" strokeLinecap="round" strokeLinejoin="round">
          {pictures[picture]}
        </g>
      </svg>
      <Typography>{children}</Typography>
    </Stack>
  );
}

const pictures: Record<CautionPicture, ReactNode> = {
  people: (
    <>
      <circle cx="16" cy="10" r="5" />
      <path d="M16 15v14M8 20h16M16 29l-6 13M16 29l6 13" />
      <path d="M40 42V26M34 20l4-6M46 20l-4-6M40 16V6" />
    </>
  ),
  'eyes-ears': (
    <>
      <circle cx="24" cy="24" r="15" />
      <path d="M14 22h8v6h-8zM26 22h8v6h-8zM22 25h4M9 18a15 15 0 0 1 30 0M6 19v10M42 19v10" />
    </>
  ),
  hose: (
    <>
      <path d="M4 34c10 0 8-20 18-20M26 14h18" />
      <path d="M22 9v10M26 9v10M24 4v20" />
      <path d="M34 24l4 8M28 26l-1 9" />
    </>
  ),
  pressure: (
    <>
      <circle cx="24" cy="26" r="16" />
      <path d="M24 26l9-8M12 26h3M24 14v3M36 26h-3M20 6h8" />
    </>
  ),
  backflow: (
    <>
      <path d="M4 36h10V16h20v20h10M20 16v-6h8v6" />
      <path d="M8 8l32 36" />
    </>
  ),
  heat: (
    <>
      <path d="M4 40h40M10 40V26M24 40V26M38 40V26" />
      <path d="M10 20c-3-4 3-5 0-10M24 20c-3-4 3-5 0-10M38 20c-3-4 3-5 0-10" />
    </>
  ),
  water: (
    <>
      <path d="M6 12h20v8H6zM26 14h8v4h-8z" />
      <path d="M37 16h7M36 21l7 5M35 25l4 8" />
    </>
  ),
  pump: (
    <>
      <circle cx="22" cy="26" r="12" />
      <path d="M22 14h20M22 26l6-6M22 26l-8 2M10 42h24M8 6l32 38" />
    </>
  ),
};
