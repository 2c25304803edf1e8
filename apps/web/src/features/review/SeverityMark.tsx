import Box from '@mui/material/Box';
import type { Severity } from '@rimeward/contracts';
import { useTranslation } from 'react-i18next';

const colours = {
  danger: 'error.main',
  fault: 'warning.main',
  gap: 'info.main',
  note: 'text.primary',
} as const;
const shapes = {
  danger: <path d="M10 1 19 18H1z" fill="currentColor" />,
  fault: <path d="M10 1l9 9-9 9-9-9z" fill="currentColor" />,
  gap: <rect x="2.5" y="2.5" width="15" height="15" fill="none" stroke="currentColor" strokeWidth="3" />,
  note: <circle cx="10" cy="10" r="5" fill="currentColor" />,
} as const;

/** Severity as shape, colour and word together; with a count when there is one. */
export function SeverityMark({ severity, count }: { severity: Severity; count?: number }) {
  const { t } = useTranslation('review');
  return (
    <Box
      component="span"
      sx={{
        display: 'inline-flex',
        alignItems: 'center',
        gap: 0.5,
        color: colours[severity],
        fontWeight: 600,
        whiteSpace: 'nowrap',
      }}
    >
      <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true">
        {shapes[severity]}
      </svg>
      {count === undefined ? t(`severities.${severity}`) : `${count} ${t(`severities.${severity}`)}`}
    </Box>
  );
}
