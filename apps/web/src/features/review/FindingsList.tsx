import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { VisitRecord } from '@rimeward/contracts';
import { useTranslation } from 'react-i18next';
import { useSentence } from './use-sentence';
import { SeverityMark } from './SeverityMark';

/** What the rules conclude from the entries, worst first, each with its sentence. */
export function FindingsList({ record }: { record: VisitRecord }) {
  const { t } = useTranslation('review');
  const say = useSentence();
  return (
    <Box component="section">
      <Typography variant="h2">{t('record.findings')}</Typography>
      {record.findings.length === 0 && <Typography>{t('record.noFindings')}</Typography>}
      <Box component="ul" sx={{ listStyle: 'none', p: 0, m: 0 }}>
        {record.findings.map((finding, index) => (
          <Box
            component="li"
            key={`${finding.ruleId} ${index}`}
            sx={{ borderTop: 1, borderColor: 'divider', py: 1 }}
          >
            <SeverityMark severity={finding.severity} />
            <Typography>{say(finding)}</Typography>
          </Box>
        ))}
      </Box>
      <Typography variant="body2">{t('record.judged', { version: record.rulesVersion })}</Typography>
    </Box>
  );
}
