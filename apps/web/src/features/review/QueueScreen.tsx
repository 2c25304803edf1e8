import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useInfiniteQuery } from '@tanstack/react-query';
import { useEffect, useRef, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { usePreferences } from '../../app/theme/preferences';
import { fetchQueue } from './api';
import { AskAgain } from './AskAgain';
import { downloadQueue } from './queue-csv';
import { QueueFilters } from './QueueFilters';
import { QueueTable } from './QueueTable';
import { HeldPanel } from './HeldPanel';
import { PhonesPanel } from './PhonesPanel';

/** The visits that wait for a decision, worst first. Filters live in the address, so that a view can be sent to a colleague. */
export function QueueScreen() {
  const { t } = useTranslation('review');
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const [{ keys }] = usePreferences();
  const query = search.toString();
  const queue = useInfiniteQuery({
    queryKey: ['queue', query],
    queryFn: ({ pageParam }) =>
      fetchQueue([query, pageParam ? `after=${pageParam}` : ''].filter(Boolean).join('&')),
    initialPageParam: '',
    getNextPageParam: (page) => page.next ?? undefined,
    refetchInterval: 30_000,
  });
  const items = queue.data?.pages.flatMap((page) => page.items) ?? [];
  const total = queue.data?.pages[0]?.total ?? 0;
  const [at, setAt] = useState(0);
  const list = useRef<HTMLDivElement>(null);
  useEffect(() => {
    document.title = `${t('title')} · Rimeward`;
  }, [t]);

  function onKey(key: string): void {
    if (!keys) return;
    if (key === 'j' || key === 'ArrowDown') setAt(Math.min(items.length - 1, at + 1));
    else if (key === 'k' || key === 'ArrowUp') setAt(Math.max(0, at - 1));
    else if (key === 'Enter' && items[at]) void navigate(`/review/${items[at].visitId}?${query}`);
  }

  return (
    <Box
      sx={{
        display: 'grid',
        gridTemplateColumns: { xs: '1fr', lg: 'minmax(0, 1fr) 340px' },
        gap: 3,
        p: { xs: 2, md: 3 },
      }}
    >
      <Box component="main" sx={{ minWidth: 0 }}>
        <Typography variant="h1" sx={{ mb: 2 }}>
          {t('title')}
        </Typography>
        <QueueFilters />
        <Box sx={{ display: 'flex', gap: 2, alignItems: 'center', my: 1, flexWrap: 'wrap' }}>
          <Typography sx={{ fontWeight: 600 }} role="status">
            {queue.isPending ? t('loading') : t('queue.total', { count: total })}
          </Typography>
          <Button variant="outlined" disabled={items.length === 0} onClick={() => downloadQueue(items, t)}>
            {t('queue.csv')}
          </Button>
          {keys && <Typography variant="body2">{t('queue.keys')}</Typography>}
        </Box>
        {queue.isError && <AskAgain error={queue.error} onAgain={() => void queue.refetch()} />}
        {!queue.isPending && items.length === 0 && !queue.isError && (
          <Typography>{t('queue.empty')}</Typography>
        )}
        <Box
          ref={list}
          tabIndex={0}
          onKeyDown={(event) => {
            if (event.target === list.current) onKey(event.key);
          }}
          aria-label={t('title')}
          role="group"
        >
          <QueueTable items={items} at={at} query={query} />
        </Box>
        {queue.hasNextPage && (
          <Button fullWidth variant="outlined" sx={{ mt: 2 }} onClick={() => void queue.fetchNextPage()}>
            {t('queue.more')}
          </Button>
        )}
      </Box>
      <Box component="aside" sx={{ display: 'grid', gap: 3, alignContent: 'start' }}>
        <PhonesPanel />
        <HeldPanel />
      </Box>
    </Box>
  );
}
