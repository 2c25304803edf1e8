import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useEffect } from 'react';
import { useTranslation } from 'react-i18next';
import { Link, useSearchParams } from 'react-router-dom';
import { useDates } from '../../app/i18n/use-dates';
import { AskAgain } from './AskAgain';
import { CyclesTable } from './CyclesTable';
import { DecisionPanel } from './DecisionPanel';
import { EntriesList } from './EntriesList';
import { FindingsList } from './FindingsList';
import { PhotosPanel } from './PhotosPanel';
import { useRecord, type OpenRecord } from './use-record';
import { ValvesTable } from './ValvesTable';

/** One visit for its decision: findings and decision, air and entries, photographs, side by side on a desk. */
export function RecordScreen({ visitId }: { visitId: string }) {
  const { t } = useTranslation('review');
  const asked = useRecord(visitId);
  if (asked.isPending) return <Typography sx={{ p: 3 }}>{t('loading')}</Typography>;
  if (!asked.open) return <AskAgain error={asked.error} onAgain={() => void asked.refetch()} />;
  return <Record open={asked.open} onAgain={() => void asked.refetch()} />;
}

function Record({ open, onAgain }: { open: OpenRecord; onAgain: () => void }) {
  const { t } = useTranslation('review');
  const dates = useDates();
  const [search] = useSearchParams();
  const { record } = open;
  const { visit } = record;
  useEffect(() => {
    document.title = `${visit.site.name} · Rimeward`;
  }, [visit.site.name]);
  return (
    <Box component="main" sx={{ p: { xs: 2, md: 3 } }}>
      <Box sx={{ display: 'flex', gap: 2, alignItems: 'center', flexWrap: 'wrap', mb: 2 }}>
        <Button component={Link} to={`/review?${search.toString()}`} variant="outlined">
          {t('record.back')}
        </Button>
        <Box>
          <Typography variant="h1">{visit.site.name}</Typography>
          <Typography>
            {[
              visit.site.address,
              visit.site.town,
              dates.day(visit.date),
              visit.assigned.map(({ name }) => name).join(', '),
            ]
              .filter(Boolean)
              .join(' · ')}
          </Typography>
        </Box>
        <Typography sx={{ fontWeight: 700, ml: 'auto' }}>{t(`standings.${record.standing}`)}</Typography>
      </Box>
      <Box
        sx={{
          display: 'grid',
          gap: 3,
          alignItems: 'start',
          gridTemplateColumns: {
            xs: 'minmax(0, 1fr)',
            md: 'repeat(2, minmax(0, 1fr))',
            xl: '400px minmax(0, 1fr) 400px',
            lg: '360px minmax(0, 1fr) 360px',
          },
        }}
      >
        <Box sx={{ display: 'grid', gap: 3 }}>
          <FindingsList record={record} />
          <DecisionPanel open={open} onAgain={onAgain} />
        </Box>
        <Box sx={{ display: 'grid', gap: 3 }}>
          <CyclesTable open={open} />
          <ValvesTable open={open} />
          <EntriesList open={open} />
        </Box>
        <PhotosPanel record={record} />
      </Box>
    </Box>
  );
}
