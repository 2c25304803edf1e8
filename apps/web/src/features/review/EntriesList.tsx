import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { FoldedEntry } from '@rimeward/field-log';
import { useTranslation } from 'react-i18next';
import { entryFacts } from '../../app/log-words/entry-facts';
import { useDates } from '../../app/i18n/use-dates';
import type { OpenRecord } from './use-record';

/** Every entry in order, with what it says, who said it and when; corrected ones stay, with their correction. */
export function EntriesList({ open: { record, state } }: { open: OpenRecord }) {
  const { t } = useTranslation('review');
  const names = new Map(record.people.map(({ id, name }) => [id, name]));
  return (
    <Box component="section">
      <Typography variant="h2">{`${t('record.entries')} (${state.entries.length})`}</Typography>
      <Box component="ol" sx={{ listStyle: 'none', p: 0, m: 0 }} data-entries="">
        {state.entries
          .filter(({ entry }) => entry.type !== 'corrected')
          .map((folded) => (
            <EntryLine
              key={folded.entry.id}
              folded={folded}
              who={names.get(folded.entry.actor) ?? folded.entry.actor.slice(0, 8)}
              record={record}
            />
          ))}
      </Box>
    </Box>
  );
}

function EntryLine({
  folded,
  who,
  record,
}: {
  folded: FoldedEntry;
  who: string;
  record: OpenRecord['record'];
}) {
  const { t } = useTranslation('review');
  const { t: words } = useTranslation('log');
  const dates = useDates();
  const { entry, corrections, standing, atMs } = folded;
  const facts = entryFacts(entry, record.visit.system, words);
  return (
    <Box component="li" data-entry={entry.id} sx={{ borderTop: 1, borderColor: 'divider', py: 0.75 }}>
      <Typography sx={{ textDecoration: standing === 'withdrawn' ? 'line-through' : 'none' }}>
        <Box component="span" sx={{ fontVariantNumeric: 'tabular-nums', mr: 1 }}>
          {dates.time(atMs)}
        </Box>
        <strong>{words(`entries.${entry.type}`)}</strong>
        {facts && ` · ${facts}`}
      </Typography>
      <Typography variant="body2">{who}</Typography>
      {corrections.map((correction) => (
        <Typography key={correction.id} variant="body2" sx={{ fontWeight: 600 }}>
          {t(standing === 'withdrawn' ? 'record.withdrawn' : 'record.corrected', {
            reason: correction.body.reason,
          })}
        </Typography>
      ))}
    </Box>
  );
}
