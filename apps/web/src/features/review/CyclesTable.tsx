import Box from '@mui/material/Box';
import Table from '@mui/material/Table';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Typography from '@mui/material/Typography';
import { plainCeiling } from '@rimeward/rules';
import { useTranslation } from 'react-i18next';
import { clockText } from '../../app/format/clock-text';
import { useDates } from '../../app/i18n/use-dates';
import { useUnits } from '../../app/units/use-units';
import type { OpenRecord } from './use-record';

const columns = ['zone', 'start', 'length', 'gauge', 'ceiling', 'sign'] as const;

/** Every air cycle against the ceiling of its zone, in the order in which air went on. */
export function CyclesTable({ open: { record, state } }: { open: OpenRecord }) {
  const { t } = useTranslation('review');
  const dates = useDates();
  const units = useUnits();
  const zones = record.visit.system.zones;
  const cycles = Object.values(state.zones)
    .flatMap((zone) => zone.cycles)
    .sort((one, other) => one.started.atMs - other.started.atMs);
  const skipped = zones.filter((zone) => state.zones[zone.id]?.skipped);

  return (
    <Box component="section">
      <Typography variant="h2">{t('record.cycles')}</Typography>
      {cycles.length === 0 && <Typography>{t('record.noCycles')}</Typography>}
      {cycles.length > 0 && (
        <Table
          size="small"
          sx={{ '& td, & th': { fontSize: 16, fontVariantNumeric: 'tabular-nums', px: 1 } }}
        >
          <TableHead>
            <TableRow>
              {columns.map((column) => (
                <TableCell key={column} align={column === 'sign' ? 'left' : 'right'} sx={{ fontWeight: 700 }}>
                  {t(`record.${column}`)}
                </TableCell>
              ))}
            </TableRow>
          </TableHead>
          <TableBody>
            {cycles.map((cycle) => {
              const zone = zones.find((one) => one.id === cycle.zoneId);
              const ceiling = zone ? plainCeiling(record.visit.system, zone, null) : null;
              const highest = Math.max(...cycle.gaugeReadings.map((reading) => reading.pressurePsi));
              const over = ceiling !== null && highest > ceiling.pressurePsi;
              return (
                <TableRow key={cycle.cycleId}>
                  <TableCell align="right">{zone?.number ?? '?'}</TableCell>
                  <TableCell align="right">{dates.time(cycle.started.atMs)}</TableCell>
                  <TableCell align="right">
                    {cycle.durationMs === null ? t('record.airOn') : clockText(cycle.durationMs)}
                  </TableCell>
                  <TableCell align="right" sx={over ? { color: 'error.main', fontWeight: 700 } : undefined}>
                    {Number.isFinite(highest)
                      ? `${over ? '▲ ' : ''}${units.pressure(highest)}`
                      : t('record.notRecorded')}
                  </TableCell>
                  <TableCell align="right">{ceiling ? units.pressure(ceiling.pressurePsi) : ''}</TableCell>
                  <TableCell>
                    {cycle.endSign ? t(`record.signs.${cycle.endSign}`) : t('record.notRecorded')}
                  </TableCell>
                </TableRow>
              );
            })}
          </TableBody>
        </Table>
      )}
      {skipped.map((zone) => (
        <Typography key={zone.id}>
          {`${t('record.zone')} ${zone.number}: ${t('record.skipped', { reason: state.zones[zone.id]?.skipped?.reason })}`}
        </Typography>
      ))}
    </Box>
  );
}
