import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { useLiveQuery } from 'dexie-react-hooks';
import { useTranslation } from 'react-i18next';
import { Link, useNavigate } from 'react-router-dom';
import { useDates } from '../../app/i18n/use-dates';
import { MainAction } from '../../components/MainAction';
import { PhoneScreen } from '../../components/PhoneScreen';
import { deliveryStatus } from '../../phone/delivery/status';
import type { PhoneVisit } from '../../phone/queries/visits';
import { visitsForDay } from '../../phone/queries/visits';
import { dayShifted } from './day';
import { StopRow } from './StopRow';
import { standingOf, stopLogs, type StopLog } from './stop-standing';

interface Props {
  /** The day shown, YYYY-MM-DD, by the company's calendar. */
  day: string;
  today: string;
}

/** The day's stops in driving order, all from this phone, with what matters before opening the gate. */
export function TodayScreen({ day, today }: Props) {
  const { t } = useTranslation('today');
  const dates = useDates();
  const navigate = useNavigate();
  const visits = useLiveQuery(() => visitsForDay(day), [day]);
  const logs = useLiveQuery(async () => stopLogs(visits ?? []), [visits]);
  const status = useLiveQuery(() => deliveryStatus(), []);
  const next = nextStop(visits ?? [], logs ?? {});

  return (
    <PhoneScreen
      title={day === today ? t('title') : dates.day(day)}
      subtitle={day === today ? dates.day(day) : undefined}
      action={
        next ? (
          <MainAction onClick={() => void navigate(`/visit/${next.id}`)}>
            {t('next', { site: next.site.name })}
          </MainAction>
        ) : undefined
      }
    >
      {status && <Readiness reached={status.lastContactMs !== null} stops={visits?.length ?? 0} />}
      {visits?.length === 0 && status?.lastContactMs !== null && <Typography>{t('noStops')}</Typography>}
      <Box component="ol" sx={{ listStyle: 'none', p: 0, m: 0 }}>
        {visits?.map((visit) => (
          <StopRow key={visit.id} visit={visit} log={logs?.[visit.id] ?? null} />
        ))}
      </Box>
      {visits && visits.length > 0 && !next && <Typography>{t('dayDone')}</Typography>}
      <Stack direction="row" spacing={2}>
        <Button component={Link} to={`/today/${dayShifted(day, -1)}`} variant="outlined" fullWidth>
          {t('earlier')}
        </Button>
        <Button component={Link} to={`/today/${dayShifted(day, 1)}`} variant="outlined" fullWidth>
          {t('later')}
        </Button>
      </Stack>
      <Button component={Link} to="/on-this-phone" variant="outlined" fullWidth>
        {status && status.pendingEntries > 0
          ? t('waiting', { count: status.pendingEntries })
          : t('onThisPhone')}
      </Button>
    </PhoneScreen>
  );
}

function Readiness({ reached, stops }: { reached: boolean; stops: number }) {
  const { t } = useTranslation('today');
  if (!reached) return <Typography sx={{ fontWeight: 600 }}>{t('neverPulled')}</Typography>;
  return stops > 0 ? <Typography>{t('ready')}</Typography> : null;
}

function nextStop(visits: PhoneVisit[], logs: Record<string, StopLog>): PhoneVisit | null {
  return (
    visits.find((visit) => {
      const standing = standingOf(logs[visit.id] ?? null);
      return standing === 'untouched' || standing === 'started' || standing === 'sent-back';
    }) ?? null
  );
}
