import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { StatusWord } from '../../components/StatusWord';
import type { PhoneVisit } from '../../phone/queries/visits';
import { openQuestionCount, standingOf, type StopLog } from './stop-standing';

const shapes = {
  untouched: 'todo',
  started: 'partly',
  left: 'done',
  answered: 'done',
  accepted: 'done',
  'sent-back': 'attention',
  'return-visit': 'attention',
} as const;

/** One stop: place in the order, site, what to know at the gate, how far it is. */
export function StopRow({ visit, log }: { visit: PhoneVisit; log: StopLog | null }) {
  const { t } = useTranslation('today');
  const standing = standingOf(log);
  const questions = openQuestionCount(log);
  const word = questions > 0 ? t('sentBack', { count: questions }) : t(`standing.${standing}`);
  return (
    <Box component="li" sx={{ borderTop: 1, borderColor: 'divider' }}>
      <Button component={Link} to={`/visit/${visit.id}`} fullWidth sx={{ minHeight: 96, textAlign: 'left' }}>
        <Stack direction="row" spacing={2} sx={{ width: '100%', alignItems: 'center' }}>
          <Typography variant="reading" component="span" aria-label={t('stop', { sequence: visit.sequence })}>
            {visit.sequence}
          </Typography>
          <Box sx={{ flexGrow: 1, minWidth: 0 }}>
            <Typography sx={{ fontWeight: 600 }}>{visit.site.name}</Typography>
            <Typography>{`${visit.site.address} · ${t('zones', { count: visit.system.zones.length })}`}</Typography>
            {visit.purpose !== 'winterize' && <Typography>{t(`purpose.${visit.purpose}`)}</Typography>}
            {visit.note && <Typography>{visit.note}</Typography>}
          </Box>
          <StatusWord status={shapes[standing]} label={word} />
        </Stack>
      </Button>
    </Box>
  );
}
