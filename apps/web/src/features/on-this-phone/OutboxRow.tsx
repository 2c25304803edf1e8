import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import { useTranslation } from 'react-i18next';
import { useDates } from '../../app/i18n/use-dates';
import { StatusWord } from '../../components/StatusWord';
import type { OutboxItem } from '../../phone/queries/outbox';
import { sizeText } from '../../app/format/size-text';

const shapes = {
  'on-this-phone': 'todo',
  'on-its-way': 'partly',
  'with-the-office': 'done',
  held: 'attention',
} as const;

/** One entry or photograph that is still here, and where it stands in words. */
export function OutboxRow({ item }: { item: OutboxItem }) {
  const { t, i18n } = useTranslation('on-this-phone');
  const dates = useDates();
  return (
    <Box component="li" sx={{ borderTop: 1, borderColor: 'divider', py: 1.5, display: 'flex', gap: 2 }}>
      <Typography sx={{ flexGrow: 1 }}>
        {[
          t(item.kind === 'photo' ? 'photograph' : 'entry'),
          dates.moment(item.savedMs),
          sizeText(item.bytes, i18n.resolvedLanguage ?? 'en'),
        ].join(' · ')}
      </Typography>
      <StatusWord status={shapes[item.standing]} label={t(`standings.${item.standing}`)} />
    </Box>
  );
}
