import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { FormTextField } from '../../../components/FormTextField';
import { useDraft } from '../log/use-draft';
import { useVisitLog } from '../log/visit-log';

interface Props {
  zoneId: string;
  open: boolean;
  onOpen: () => void;
  onSkip: (reason: string) => Promise<void>;
}

/** A zone that gets no air needs a reason, in the technician's own words. */
export function SkipZone({ zoneId, open, onOpen, onSkip }: Props) {
  const { t } = useTranslation('visit');
  const { visit } = useVisitLog();
  const form = useForm({ defaultValues: { reason: '' } });
  const drop = useDraft(`visit/${visit.id}/skip/${zoneId}`, form);
  if (!open) return <Button onClick={onOpen}>{t('air.skip')}</Button>;

  const submit = form.handleSubmit(async ({ reason }) => {
    await onSkip(reason);
    await drop();
  });
  return (
    <Stack component="form" spacing={2} noValidate onSubmit={(event) => void submit(event)}>
      <FormTextField
        control={form.control}
        name="reason"
        label={t('air.skipReason')}
        required={t('required')}
        minLength={{ value: 3, message: t('tooShort', { count: 3 }) }}
      />
      <Button type="submit" variant="contained">
        {t('air.saveSkip')}
      </Button>
    </Stack>
  );
}
