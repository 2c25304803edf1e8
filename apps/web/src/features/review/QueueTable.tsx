import Box from '@mui/material/Box';
import Table from '@mui/material/Table';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableContainer from '@mui/material/TableContainer';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Typography from '@mui/material/Typography';
import { severities, type QueueItem } from '@rimeward/contracts';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { useDates } from '../../app/i18n/use-dates';
import { useSentence } from './use-sentence';
import { SeverityMark } from './SeverityMark';

interface Props {
  items: QueueItem[];
  /** Place of the row that the keys stand on. */
  at: number;
  query: string;
}

const columns = ['site', 'findings', 'standing', 'day', 'crew', 'zones', 'cycles', 'photos'] as const;
const figures = new Set<string>(['zones', 'cycles', 'photos']);

/** The queue as a table with a frozen head; figures stand to the right, in even digits. */
export function QueueTable({ items, at, query }: Props) {
  const { t } = useTranslation('review');
  if (items.length === 0) return null;
  return (
    <TableContainer sx={{ maxHeight: { lg: '72vh' }, border: 1, borderColor: 'divider' }}>
      <Table stickyHeader size="small">
        <TableHead>
          <TableRow>
            {columns.map((column) => (
              <TableCell
                key={column}
                align={figures.has(column) ? 'right' : 'left'}
                sx={{ fontSize: 16, fontWeight: 700 }}
              >
                {t(`queue.columns.${column}`)}
              </TableCell>
            ))}
          </TableRow>
        </TableHead>
        <TableBody>
          {items.map((item, index) => (
            <QueueRow key={item.visitId} item={item} current={index === at} query={query} />
          ))}
        </TableBody>
      </Table>
    </TableContainer>
  );
}

function QueueRow({ item, current, query }: { item: QueueItem; current: boolean; query: string }) {
  const { t } = useTranslation('review');
  const say = useSentence();
  const dates = useDates();
  const present = severities.filter((severity) => item.counts[severity] > 0);
  const figure = { fontVariantNumeric: 'tabular-nums', fontSize: 17 } as const;
  return (
    <TableRow
      aria-selected={current}
      sx={{
        outline: current ? '3px solid' : 'none',
        outlineOffset: -3,
        outlineColor: 'primary.main',
        '& td': { fontSize: 16, verticalAlign: 'top' },
      }}
    >
      <TableCell sx={{ minWidth: 180 }}>
        <Box
          component={Link}
          to={`/review/${item.visitId}?${query}`}
          sx={{ color: 'primary.main', fontWeight: 700, fontSize: 18, display: 'inline-block', py: 1 }}
        >
          {item.siteName}
        </Box>
        <Typography variant="body2">{item.town}</Typography>
      </TableCell>
      <TableCell sx={{ minWidth: 260 }}>
        <Box sx={{ display: 'flex', gap: 1.5, flexWrap: 'wrap' }}>
          {present.length === 0 && t('queue.clean')}
          {present.map((severity) => (
            <SeverityMark key={severity} severity={severity} count={item.counts[severity]} />
          ))}
          {item.heldEntries > 0 && <strong>{t('queue.held', { count: item.heldEntries })}</strong>}
        </Box>
        {item.worst[0] && <Typography variant="body2">{say(item.worst[0])}</Typography>}
      </TableCell>
      <TableCell sx={{ fontWeight: 600 }}>{t(`standings.${item.standing}`)}</TableCell>
      <TableCell>{dates.day(item.date)}</TableCell>
      <TableCell>
        {item.crewName}
        <Typography variant="body2">{item.technicians.join(', ')}</Typography>
      </TableCell>
      <TableCell align="right" sx={figure}>
        {t('queue.zonesDone', { done: item.zonesDone, total: item.zonesTotal })}
      </TableCell>
      <TableCell align="right" sx={figure}>
        {item.cycles}
      </TableCell>
      <TableCell align="right" sx={figure}>
        {item.photos}
        {item.photosMissing > 0 && (
          <Typography variant="body2">{t('queue.photosMissing', { count: item.photosMissing })}</Typography>
        )}
      </TableCell>
    </TableRow>
  );
}
