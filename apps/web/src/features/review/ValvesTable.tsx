import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useTranslation } from 'react-i18next';
import type { OpenRecord } from './use-record';

/** The winter position of every hand valve of the backflow assembly. */
export function ValvesTable({ open: { record, state } }: { open: OpenRecord }) {
  const { t } = useTranslation('review');
  const { valves, kind } = record.visit.system.backflow;
  if (valves.length === 0) return null;
  return (
    <Box component="section">
      <Typography variant="h2">{`${t('record.valves')} · ${kind}`}</Typography>
      <Box component="dl" sx={{ display: 'grid', gridTemplateColumns: '1fr 1fr', columnGap: 2, m: 0 }}>
        {valves.map((valve) => {
          const position = state.valves[valve.id]?.winter?.position;
          const right = position === 'half-open';
          return (
            <Box key={valve.id} sx={{ display: 'contents' }}>
              <Typography component="dt">
                {t(`record.valve.${valve.role}`, { number: valve.number })}
              </Typography>
              <Typography
                component="dd"
                sx={{ m: 0, fontWeight: 600, color: right ? 'text.primary' : 'error.main' }}
              >
                {`${right ? '' : '▲ '}${position ? t(`record.positions.${position}`) : t('record.notRecorded')}`}
              </Typography>
            </Box>
          );
        })}
      </Box>
    </Box>
  );
}
