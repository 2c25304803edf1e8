import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useTranslation } from 'react-i18next';
import { useDates } from '../../app/i18n/use-dates';
import type { OpenRecord } from './use-record';

/** Every decision so far with its questions and the technician's answers. */
export function ReviewHistory({ open: { record, state } }: { open: OpenRecord }) {
  const { t } = useTranslation('review');
  const dates = useDates();
  if (record.reviews.length === 0) return null;
  return (
    <Box>
      <Typography variant="h3">{t('decision.history')}</Typography>
      {record.reviews.map((review) => (
        <Box key={review.id} sx={{ borderTop: 1, borderColor: 'divider', py: 1 }}>
          <Typography sx={{ fontWeight: 600 }}>
            {t('decision.by', {
              decision: t(`decision.decisions.${review.decision}`),
              name: review.by.name,
              when: dates.moment(Date.parse(review.at)),
            })}
          </Typography>
          {review.remark && <Typography>{review.remark}</Typography>}
          {review.questions.map((question) => {
            const answer = state.answers.find(({ questionId }) => questionId === question.id);
            return (
              <Box key={question.id}>
                <Typography>{question.text}</Typography>
                <Typography sx={{ fontWeight: 600 }}>
                  {answer ? t('decision.answer', { answer: answer.answer }) : t('decision.noAnswer')}
                </Typography>
              </Box>
            );
          })}
        </Box>
      ))}
    </Box>
  );
}
