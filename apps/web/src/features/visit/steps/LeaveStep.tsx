import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { EntryBody } from '@rimeward/field-log';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { ChoiceTiles } from '../../../components/ChoiceTiles';
import { FormTextField } from '../../../components/FormTextField';
import { MainAction } from '../../../components/MainAction';
import { useDraft } from '../log/use-draft';
import { useVisitLog } from '../log/visit-log';
import { SignaturePadField } from './SignaturePadField';
import { StepScreen } from './StepScreen';

type Left = EntryBody<'left'>;
interface LeaveForm {
  outcome: Left['outcome'] | null;
  why: NonNullable<Left['why']> | null;
  present: Left['present'] | null;
  signerName: string;
  signaturePath: string;
  nextSteps: string;
}
const empty: LeaveForm = {
  outcome: null,
  why: null,
  present: null,
  signerName: '',
  signaturePath: '',
  nextSteps: '',
};
const whys = ['no-access', 'no-shutoff', 'broken-pipe', 'weather', 'other'] as const;

/** The end of the visit: how it ended, who was present, what comes next. */
export function LeaveStep({ onDone }: { onDone: () => void }) {
  const { t } = useTranslation('visit');
  const { visit, steps, save } = useVisitLog();
  const form = useForm<LeaveForm>({ defaultValues: empty });
  const drop = useDraft(`visit/${visit.id}/leave`, form);
  const [asked, setAsked] = useState(false);
  const values = form.watch();
  const open = steps.filter(
    (step) => step.id !== 'leave' && (step.status === 'todo' || step.status === 'partly'),
  );

  const missing = !values.outcome || !values.present || (values.outcome === 'cut-short' && !values.why);
  const submit = form.handleSubmit(
    async ({ outcome, why, present, signerName, signaturePath, nextSteps }) => {
      if (!outcome || !present || (outcome === 'cut-short' && !why)) return;
      const body: Left = { outcome, present, why: outcome === 'cut-short' ? why : null };
      if (present === 'signed') Object.assign(body, { signerName, signaturePath });
      if (nextSteps) body.nextSteps = nextSteps;
      if (!(await save('left', body))) return;
      await drop();
      onDone();
    },
  );

  return (
    <StepScreen
      step="leave"
      action={
        <MainAction
          onClick={() => {
            setAsked(true);
            void submit();
          }}
        >
          {t('leave.save')}
        </MainAction>
      }
    >
      {open.length > 0 && (
        <Box>
          <Typography variant="h2">{t('leave.open')}</Typography>
          {open.map((step) => (
            <Typography
              key={step.id}
            >{`${t(`stepNames.${step.id}`)}: ${t(`stepStatus.${step.status}`)}`}</Typography>
          ))}
        </Box>
      )}
      <ChoiceTiles
        label={t('leave.outcome')}
        options={(['done', 'cut-short'] as const).map((value) => ({
          value,
          label: t(`leave.outcomes.${value}`),
        }))}
        value={values.outcome}
        error={asked && !values.outcome ? t('required') : null}
        onChange={(to) => form.setValue('outcome', to)}
      />
      {values.outcome === 'cut-short' && (
        <ChoiceTiles
          label={t('leave.why')}
          options={whys.map((value) => ({ value, label: t(`leave.whys.${value}`) }))}
          value={values.why}
          error={asked && missing && !values.why ? t('required') : null}
          onChange={(to) => form.setValue('why', to)}
        />
      )}
      <ChoiceTiles
        label={t('leave.present')}
        options={(['signed', 'nobody-present'] as const).map((value) => ({
          value,
          label: t(`leave.presents.${value}`),
        }))}
        value={values.present}
        error={asked && !values.present ? t('required') : null}
        onChange={(to) => form.setValue('present', to)}
      />
      {values.present === 'signed' && (
        <>
          <FormTextField
            control={form.control}
            name="signerName"
            label={t('leave.signer')}
            required={t('required')}
          />
          <SignaturePadField
            label={t('leave.signature')}
            clearLabel={t('leave.clearSignature')}
            value={values.signaturePath}
            onChange={(path) => form.setValue('signaturePath', path)}
          />
        </>
      )}
      <FormTextField control={form.control} name="nextSteps" label={t('leave.nextSteps')} multiline />
    </StepScreen>
  );
}
