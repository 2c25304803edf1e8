import type { QueueItem } from '@rimeward/contracts';
import type { TFunction } from 'i18next';
import { csvText } from '../../app/format/csv-text';

/** Saves the rows on the screen as a CSV file. */
export function downloadQueue(items: QueueItem[], t: TFunction<'review'>): void {
  const head = ['site', 'day', 'crew', 'zones', 'cycles', 'photos', 'standing'] as const;
  const rows = items.map((item) => [
    `${item.siteName}, ${item.town}`,
    item.date,
    item.crewName ?? '',
    `${item.zonesDone}/${item.zonesTotal}`,
    item.cycles,
    item.photos,
    t(`standings.${item.standing}`),
    item.counts.danger,
    item.counts.fault,
    item.counts.gap,
    item.counts.note,
  ]);
  const names = [
    ...head.map((column) => t(`queue.columns.${column}`)),
    t('severities.danger'),
    t('severities.fault'),
    t('severities.gap'),
    t('severities.note'),
  ];
  const blob = new Blob([csvText([names, ...rows])], { type: 'text/csv;charset=utf-8' });
  const address = URL.createObjectURL(blob);
  const link = document.createElement('a');
  link.href = address;
  link.download = 'review.csv';
  link.click();
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}
