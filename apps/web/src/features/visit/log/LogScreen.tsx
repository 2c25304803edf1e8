import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import type { FoldedEntry } from '@rimeward/field-log';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { useDates } from '../../../app/i18n/use-dates';
import { FormTextField } from '../../../components/FormTextField';
import { PhoneScreen } from '../../../components/PhoneScreen';
import { useDraft } from './use-draft';
import { useVisitLog } from './visit-log';

/** Everything that has been written down, newest first. What was taken back stays, struck through, with its reason. */
export function LogScreen() {
  const { t } = useTranslation('visit');
  const { visit, state } = useVisitLog();
  return (
    <PhoneScreen title={t('visit.log')} subtitle={visit.site.name} back={`/visit/${visit.id}`}>
      <Box component="ol" sx={{ listStyle: 'none', p: 0, m: 0 }}>
        {state.entries
          .filter((folded) => folded.entry.type !== 'corrected')
          .reverse()
          .map((folded) => (
            <LogRow key={folded.entry.id} folded={folded} />
          ))}
      </Box>
    </PhoneScreen>
  );
}

function LogRow({ folded }: { folded: FoldedEntry }) {
  const { t } = useTranslation('visit');
  const { t: words } = useTranslation('log');
  const dates = useDates();
  const { nameOf } = useVisitLog();
  const [open, setOpen] = useState(false);
  const { entry, corrections, standing } = folded;
  const struck = standing === 'withdrawn';
  return (
    <Box component="li" sx={{ borderTop: 1, borderColor: 'divider', py: 1.5 }}>
      <Button
        fullWidth
        onClick={() => setOpen(!open)}
        aria-expanded={open}
        sx={{ justifyContent: 'flex-start' }}
      >
        <Typography sx={{ textAlign: 'left', textDecoration: struck ? 'line-through' : 'none' }}>
          {`${dates.time(folded.atMs)} · ${words(`entries.${entry.type}`)} · ${nameOf(entry.actor)}`}
        </Typography>
      </Button>
      {corrections.map((correction) => (
        <Typography key={correction.id}>
          {`${t(struck ? 'visit.withdrawn' : 'visit.corrected')}: ${correction.body.reason}`}
        </Typography>
      ))}
      {open && standing !== 'withdrawn' && <WithdrawForm entryId={entry.id} />}
    </Box>
  );
}

function WithdrawForm({ entryId }: { entryId: string }) {
  const { t } = useTranslation('visit');
  const { visit, withdraw } = useVisitLog();
  const form = useForm({ defaultValues: { reason: '' } });
  const drop = useDraft(`visit/${visit.id}/withdraw/${entryId}`, form);
  const submit = form.handleSubmit(async ({ reason }) => {
    if (await withdraw(entryId, reason)) await drop();
  });
  return (
    <Stack component="form" spacing={2} noValidate onSubmit={(event) => void submit(event)}>
      <FormTextField
        control={form.control}
        name="reason"
        label={t('visit.correctReason')}
        required={t('required')}
      />
      <Button type="submit" variant="contained">
        {t('visit.correct')}
      </Button>
    </Stack>
  );
}
