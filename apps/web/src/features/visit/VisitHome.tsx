import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import type { VisitStep } from '@rimeward/field-log';
import { useTranslation } from 'react-i18next';
import { Link, useNavigate } from 'react-router-dom';
import { MainAction } from '../../components/MainAction';
import { PhoneScreen } from '../../components/PhoneScreen';
import { StatusWord } from '../../components/StatusWord';
import { useVisitLog } from './log/visit-log';
import { VisitQuestions } from './VisitQuestions';

/** The visit as a list of work: the next step under the thumb, every other one a tap away. */
export function VisitHome() {
  const { t } = useTranslation('visit');
  const navigate = useNavigate();
  const { visit, state, steps } = useVisitLog();
  const proposed = steps.find((step) => step.proposed) ?? null;
  const running = state.runningCycles.at(-1);
  const runningZone = running && visit.system.zones.find((zone) => zone.id === running.zoneId);
  const base = `/visit/${visit.id}`;

  return (
    <PhoneScreen
      title={visit.site.name}
      subtitle={visit.site.address}
      back="/today"
      action={
        running ? (
          <MainAction tone="ember" onClick={() => void navigate(`${base}/air`)}>
            {t('visit.airOn', { number: runningZone?.number ?? '?' })}
          </MainAction>
        ) : proposed ? (
          <MainAction onClick={() => void navigate(`${base}/${proposed.id}`)}>
            {t('visit.nextStep', { step: t(`stepNames.${proposed.id}`) })}
          </MainAction>
        ) : (
          <MainAction onClick={() => void navigate('/today')}>{t('visit.allDone')}</MainAction>
        )
      }
    >
      <VisitQuestions />
      {visit.note && <Typography sx={{ fontWeight: 600 }}>{visit.note}</Typography>}
      <Box component="ol" aria-label={t('visit.everyStep')} sx={{ listStyle: 'none', p: 0, m: 0 }}>
        {steps
          .filter((step) => step.status !== 'not-needed')
          .map((step) => (
            <StepRow key={step.id} step={step} to={`${base}/${step.id}`} />
          ))}
      </Box>
      <Stack spacing={2}>
        <Button component={Link} to={`${base}/defects`} variant="outlined" fullWidth>
          {t('visit.defectsAndNotes')}
        </Button>
        <Button component={Link} to={`${base}/log`} variant="outlined" fullWidth>
          {t('visit.log')}
        </Button>
        <Button component={Link} to={`${base}/site`} variant="outlined" fullWidth>
          {t('visit.site')}
        </Button>
      </Stack>
    </PhoneScreen>
  );
}

function StepRow({ step, to }: { step: VisitStep; to: string }) {
  const { t } = useTranslation('visit');
  return (
    <Box component="li" sx={{ borderTop: 1, borderColor: 'divider' }}>
      <Button component={Link} to={to} fullWidth sx={{ minHeight: 80, justifyContent: 'space-between' }}>
        <Typography sx={{ textAlign: 'left' }}>{t(`stepNames.${step.id}`)}</Typography>
        <StatusWord
          status={step.status}
          label={
            step.total > 1 && step.status !== 'todo'
              ? t('visit.proposals.count', { done: step.done, total: step.total })
              : t(`stepStatus.${step.status}`)
          }
        />
      </Button>
    </Box>
  );
}
