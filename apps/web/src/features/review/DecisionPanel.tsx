import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import type { DecideRequest } from '@rimeward/contracts';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useFieldArray, useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { v4 as uuidv4 } from 'uuid';
import { FormTextField } from '../../components/FormTextField';
import { decide, ReviewFault } from './api';
import { useSentence } from './use-sentence';
import { ReviewHistory } from './ReviewHistory';
import type { OpenRecord } from './use-record';

interface DecisionForm {
  remark: string;
  questions: { text: string; ruleId: string | null }[];
}

/** Accept, send back with questions, or order a return visit. What is typed stays when somebody else was faster. */
export function DecisionPanel({ open, onAgain }: { open: OpenRecord; onAgain: () => void }) {
  const { t } = useTranslation('review');
  const { t: shell } = useTranslation();
  const say = useSentence();
  const { record } = open;
  const client = useQueryClient();
  const [noQuestion, setNoQuestion] = useState(false);
  const form = useForm<DecisionForm>({ defaultValues: { remark: '', questions: [] } });
  const questions = useFieldArray({ control: form.control, name: 'questions' });
  const deciding = useMutation({
    mutationFn: (request: DecideRequest) => decide(record.visit.id, request),
    onSuccess: async () => {
      form.reset({ remark: '', questions: [] });
      await client.invalidateQueries();
    },
  });
  const fault = deciding.error instanceof ReviewFault ? deciding.error.code : null;

  function submit(decision: DecideRequest['decision']): void {
    const { remark, questions: asked } = form.getValues();
    const written = asked.filter(({ text }) => text.trim() !== '');
    setNoQuestion(decision === 'sent-back' && written.length === 0);
    if (decision === 'sent-back' && written.length === 0) return;
    deciding.mutate({
      decision,
      remark: remark.trim() || null,
      questions: decision === 'sent-back' ? written.map((one) => ({ id: uuidv4(), ...one })) : [],
      expectedNumber: record.reviews.length,
      seenPosition: record.position,
    });
  }

  return (
    <Box component="section" sx={{ border: 2, borderColor: 'primary.main', p: 2 }}>
      <Typography variant="h2">{t('decision.title')}</Typography>
      <Stack spacing={2} sx={{ mt: 1 }}>
        <FormTextField
          control={form.control}
          name="remark"
          label={t('decision.remark')}
          multiline
          maxLength={4_000}
        />
        {questions.fields.map((field, index) => (
          <Box key={field.id}>
            <FormTextField
              control={form.control}
              name={`questions.${index}.text`}
              label={t('decision.question')}
              multiline
              maxLength={2_000}
            />
            <Button onClick={() => questions.remove(index)}>{t('decision.removeQuestion')}</Button>
          </Box>
        ))}
        <Button variant="outlined" onClick={() => questions.append({ text: '', ruleId: null })}>
          {t('decision.addQuestion')}
        </Button>
        {record.findings.length > 0 && questions.fields.length === 0 && (
          <Button
            variant="outlined"
            onClick={() =>
              questions.append(
                record.findings.slice(0, 5).map((finding) => ({
                  text: say(finding),
                  ruleId: finding.ruleId,
                })),
              )
            }
          >
            {t('decision.ask')}
          </Button>
        )}
        {noQuestion && (
          <Typography role="alert" sx={{ color: 'error.main', fontWeight: 600 }}>
            {t('decision.questionNeeded')}
          </Typography>
        )}
        {fault && (
          <Alert
            severity="error"
            icon={false}
            variant="filled"
            sx={{ fontSize: 17 }}
            action={
              <Button color="inherit" onClick={onAgain}>
                {t('again')}
              </Button>
            }
          >
            {fault === 'changed-since-opened'
              ? t('decision.changed')
              : fault === 'no-office'
                ? t('failed')
                : shell(`problems.${fault}`)}
          </Alert>
        )}
        {deciding.isSuccess && <Typography role="status">{t('decision.done')}</Typography>}
        <Button variant="contained" disabled={deciding.isPending} onClick={() => submit('accepted')}>
          {t('decision.accept')}
        </Button>
        <Button variant="outlined" disabled={deciding.isPending} onClick={() => submit('sent-back')}>
          {t('decision.sendBack')}
        </Button>
        <Button variant="outlined" disabled={deciding.isPending} onClick={() => submit('return-visit')}>
          {t('decision.returnVisit')}
        </Button>
        <ReviewHistory open={open} />
      </Stack>
    </Box>
  );
}
