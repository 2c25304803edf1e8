import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import type { Interlock } from '@rimeward/field-log';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { FormTextField } from '../../../components/FormTextField';
import { useDraft } from '../log/use-draft';
import { useVisitLog } from '../log/visit-log';

interface Props {
  blocked: Interlock[];
  onPass: (interlock: string, reason: string) => Promise<boolean>;
}

/** Where to go to set each interlock right. */
const steps: Partial<Record<Interlock['id'], string>> = {
  'water-off': 'water-off',
  'pressure-relieved': 'relief',
  'sensitive-parts': 'walk-through',
  'backflow-closed': 'backflow-before-air',
  'connection-downstream': 'connect',
  'couplings-pinned': 'connect',
  'regulator-under-ceiling': 'regulator',
  'people-clear': 'people-clear',
  'cautions-read': 'people-clear',
};

/** What holds the air back, each with the way to set it right, and with a reason to pass it where no person is at risk. */
export function InterlockList({ blocked, onPass }: Props) {
  const { t } = useTranslation('visit');
  const { visit } = useVisitLog();
  const [passing, setPassing] = useState<string | null>(null);
  return (
    <Stack spacing={2}>
      <Typography variant="h2">{t('air.blocked')}</Typography>
      {blocked.map((lock) => (
        <Box key={lock.id} sx={{ border: 2, borderColor: 'warning.main', p: 2 }}>
          <Typography sx={{ fontWeight: 600 }}>{t(`interlocks.${lock.id}`)}</Typography>
          {steps[lock.id] && (
            <Button
              component={Link}
              to={`/visit/${visit.id}/${steps[lock.id]}`}
              variant="contained"
              fullWidth
            >
              {t(`stepNames.${steps[lock.id] as 'connect'}`)}
            </Button>
          )}
          {lock.protectsPeople ? (
            <Typography>{t('air.protectsPeople')}</Typography>
          ) : passing === lock.id ? (
            <PassForm interlock={lock.id} onPass={onPass} />
          ) : (
            <Button onClick={() => setPassing(lock.id)}>{t('air.passWithReason')}</Button>
          )}
        </Box>
      ))}
    </Stack>
  );
}

function PassForm({ interlock, onPass }: { interlock: string; onPass: Props['onPass'] }) {
  const { t } = useTranslation('visit');
  const { visit } = useVisitLog();
  const form = useForm({ defaultValues: { reason: '' } });
  const drop = useDraft(`visit/${visit.id}/pass/${interlock}`, form);
  const submit = form.handleSubmit(async ({ reason }) => {
    if (await onPass(interlock, reason)) await drop();
  });
  return (
    <Stack component="form" spacing={1} noValidate onSubmit={(event) => void submit(event)}>
      <FormTextField
        control={form.control}
        name="reason"
        label={t('air.passReason')}
        required={t('required')}
        minLength={{ value: 3, message: t('tooShort', { count: 3 }) }}
      />
      <Button type="submit" variant="outlined">
        {t('air.savePass')}
      </Button>
    </Stack>
  );
}
