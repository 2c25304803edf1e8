import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import MenuItem from '@mui/material/MenuItem';
import TextField from '@mui/material/TextField';
import { severities, visitStandings } from '@rimeward/contracts';
import { useEffect, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useSearchParams } from 'react-router-dom';

const named = ['date', 'standing', 'severity', 'q'] as const;

/** Day, state, severity and search; each is a part of the address. */
export function QueueFilters() {
  const { t } = useTranslation('review');
  const [search, setSearch] = useSearchParams();
  const [typed, setTyped] = useState(search.get('q') ?? '');

  function put(name: (typeof named)[number], value: string): void {
    setSearch(
      (before) => {
        const next = new URLSearchParams(before);
        if (value) next.set(name, value);
        else next.delete(name);
        return next;
      },
      { replace: true },
    );
  }
  useEffect(() => {
    const timer = setTimeout(() => {
      if (typed !== (search.get('q') ?? '')) put('q', typed.trim());
    }, 300);
    return () => clearTimeout(timer);
    // Only what is typed starts the wait; the address follows it.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [typed]);

  return (
    <Box
      role="search"
      sx={{
        display: 'grid',
        gap: 2,
        gridTemplateColumns: { xs: '1fr 1fr', md: '2fr 1fr 1fr 1fr auto' },
        alignItems: 'center',
      }}
    >
      <TextField
        label={t('queue.search')}
        value={typed}
        onChange={(event) => setTyped(event.target.value)}
        sx={{ gridColumn: { xs: '1 / -1', md: 'auto' } }}
      />
      <TextField
        label={t('queue.day')}
        type="date"
        value={search.get('date') ?? ''}
        onChange={(event) => put('date', event.target.value)}
        slotProps={{ inputLabel: { shrink: true } }}
      />
      <TextField
        select
        label={t('queue.standing')}
        value={search.get('standing') ?? ''}
        onChange={(event) => put('standing', event.target.value)}
        slotProps={{ inputLabel: { shrink: true }, select: { displayEmpty: true } }}
      >
        <MenuItem value="">{t('queue.all')}</MenuItem>
        {visitStandings.map((standing) => (
          <MenuItem key={standing} value={standing}>
            {t(`standings.${standing}`)}
          </MenuItem>
        ))}
      </TextField>
      <TextField
        select
        label={t('queue.severity')}
        value={search.get('severity') ?? ''}
        onChange={(event) => put('severity', event.target.value)}
        slotProps={{ inputLabel: { shrink: true }, select: { displayEmpty: true } }}
      >
        <MenuItem value="">{t('queue.all')}</MenuItem>
        {severities.map((severity) => (
          <MenuItem key={severity} value={severity}>
            {t(`severities.${severity}`)}
          </MenuItem>
        ))}
      </TextField>
      {named.some((name) => search.has(name)) && (
        <Button
          onClick={() => {
            setTyped('');
            setSearch({}, { replace: true });
          }}
        >
          {t('queue.clear')}
        </Button>
      )}
    </Box>
  );
}
