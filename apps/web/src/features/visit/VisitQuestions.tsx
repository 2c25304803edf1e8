import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import type { Review } from '@rimeward/contracts';
import { useLiveQuery } from 'dexie-react-hooks';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { FormTextField } from '../../components/FormTextField';
import { reviewsOfVisit } from '../../phone/queries/entries';
import { useDraft } from './log/use-draft';
import { useVisitLog } from './log/visit-log';

/** What the office asked when it sent the visit back, and the answers, which are entries like any other. */
export function VisitQuestions() {
  const { t } = useTranslation('visit');
  const { visit, state } = useVisitLog();
  const reviews = useLiveQuery(() => reviewsOfVisit(visit.id), [visit.id]) ?? [];
  const last = reviews.at(-1);
  if (!last || last.decision !== 'sent-back') return null;
  return (
    <Box sx={{ border: 3, borderColor: 'warning.main', p: 2 }}>
      <Typography variant="h2">{t('visit.sentBack', { name: last.by.name })}</Typography>
      {last.remark && <Typography>{last.remark}</Typography>}
      {last.questions.map((question) => {
        const answer = state.answers.find((one) => one.questionId === question.id);
        return (
          <Box key={question.id} sx={{ mt: 2 }}>
            <Typography sx={{ fontWeight: 600 }}>{question.text}</Typography>
            {answer ? (
              <Typography>{`${t('visit.answered')}: ${answer.answer}`}</Typography>
            ) : (
              <AnswerForm question={question} />
            )}
          </Box>
        );
      })}
    </Box>
  );
}

function AnswerForm({ question }: { question: Review['questions'][number] }) {
  const { t } = useTranslation('visit');
  const { visit, save } = useVisitLog();
  const form = useForm({ defaultValues: { answer: '' } });
  const drop = useDraft(`visit/${visit.id}/answer/${question.id}`, form);
  const submit = form.handleSubmit(async ({ answer }) => {
    if (await save('question-answered', { questionId: question.id, answer })) await drop();
  });
  return (
    <Stack component="form" spacing={2} noValidate onSubmit={(event) => void submit(event)}>
      <FormTextField
        control={form.control}
        name="answer"
        label={t('visit.answer')}
        required={t('required')}
        multiline
      />
      <Button type="submit" variant="contained">
        {t('visit.sendAnswer')}
      </Button>
    </Stack>
  );
}
