import type { Severity, VisitStanding } from '@rimeward/contracts';

export type SeverityCounts = Record<Severity, number>;

/** What waits for a decision comes first, what needs none last. */
const urgency: Record<VisitStanding, number> = {
  answered: 4,
  'to-review': 4,
  'under-way': 3,
  'sent-back': 2,
  planned: 1,
  'return-visit': 0,
  accepted: 0,
};

const capped = (count: number): number => Math.min(count, 99);

/**
 * Place of a visit in the review's queue, larger first: by what has to be decided, then by the worst that was found, then by
 * how much of it. One number, so that the order is one index.
 */
export function queueRank(standing: VisitStanding, counts: SeverityCounts): number {
  const worst = counts.danger > 0 ? 3 : counts.fault > 0 ? 2 : counts.gap > 0 ? 1 : 0;
  return (
    urgency[standing] * 10_000_000 +
    worst * 1_000_000 +
    capped(counts.danger) * 10_000 +
    capped(counts.fault) * 100 +
    capped(counts.gap)
  );
}
