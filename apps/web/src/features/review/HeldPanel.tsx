import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { heldReasons, type HeldResponse } from '@rimeward/contracts';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { useDates } from '../../app/i18n/use-dates';
import { FormTextField } from '../../components/FormTextField';
import { fetchHeld, settleHeld } from './api';
import { AskAgain } from './AskAgain';

type HeldEntry = HeldResponse['entries'][number];

/** What the office could not understand: kept, shown, and settled by a person with a note. */
export function HeldPanel() {
  const { t } = useTranslation('review');
  const held = useQuery({ queryKey: ['held'], queryFn: fetchHeld, refetchInterval: 60_000 });
  const entries = held.data?.entries ?? [];
  return (
    <Box component="section">
      <Typography variant="h2">{t('held.title')}</Typography>
      {held.isError && <AskAgain error={held.error} onAgain={() => void held.refetch()} />}
      {held.data && entries.length === 0 && <Typography>{t('held.none')}</Typography>}
      {entries.slice(0, 20).map((entry) => (
        <HeldLine key={entry.id} entry={entry} />
      ))}
    </Box>
  );
}

function HeldLine({ entry }: { entry: HeldEntry }) {
  const { t } = useTranslation('review');
  const dates = useDates();
  const reason = heldReasons.find((one) => one === entry.heldReason);
  return (
    <Box sx={{ borderTop: 1, borderColor: 'divider', py: 1 }}>
      <Typography sx={{ fontWeight: 600 }}>
        {reason ? t(`held.reasons.${reason}`) : entry.heldReason}
      </Typography>
      <Typography variant="body2">
        {t('held.from', { device: entry.deviceName, when: dates.moment(Date.parse(entry.receivedAt)) })}
      </Typography>
      <Box
        component="pre"
        sx={{
          fontSize: 13,
          maxHeight: 90,
          overflow: 'auto',
          whiteSpace: 'pre-wrap',
          overflowWrap: 'anywhere',
        }}
      >
        {entry.text.slice(0, 600)}
      </Box>
      {entry.settled ? (
        <Typography variant="body2">
          {t('held.settled', { by: entry.settled.by, note: entry.settled.note })}
        </Typography>
      ) : (
        <SettleForm id={entry.id} />
      )}
    </Box>
  );
}

function SettleForm({ id }: { id: string }) {
  const { t } = useTranslation('review');
  const client = useQueryClient();
  const form = useForm({ defaultValues: { note: '' } });
  const settle = useMutation({
    mutationFn: (note: string) => settleHeld(id, note),
    onSuccess: () => client.invalidateQueries({ queryKey: ['held'] }),
  });
  const submit = form.handleSubmit(({ note }) => settle.mutateAsync(note));
  return (
    <Stack component="form" spacing={1} noValidate onSubmit={(event) => void submit(event)}>
      <FormTextField control={form.control} name="note" label={t('held.note')} required={t('held.note')} />
      <Button type="submit" variant="outlined">
        {t('held.settle')}
      </Button>
      {settle.isError && <Typography role="alert">{t('failed')}</Typography>}
    </Stack>
  );
}
