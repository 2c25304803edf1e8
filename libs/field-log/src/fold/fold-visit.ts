import type { LogEntry } from '../entry/log-entry';
import type { FoldedEntry, VisitState } from '../visit/visit-state';
import { applyEntry } from './apply-entry';
import { withCorrections } from './corrections';
import { emptyState } from './empty-state';
import { collectCycleFacts, settleAir } from './fold-air';
import { attachPhotos } from './fold-photos';
import { inLogOrder } from './order';

/**
 * The state of one visit from its entries: a pure function of the set, whatever order they arrived in; an entry given twice
 * changes nothing. Entries must belong to one visit. Never throws.
 */
export function foldVisit(entries: readonly LogEntry[]): VisitState {
  const folded: FoldedEntry[] = withCorrections(inLogOrder(entries));
  const state = emptyState();
  const facts = collectCycleFacts(folded);
  state.entries = folded;
  state.actors = [...new Set(folded.map(({ entry }) => entry.actor))];
  state.devices = [...new Set(folded.map(({ entry }) => entry.device))];
  for (const one of folded) {
    if (one.standing !== 'withdrawn') applyEntry(state, one, facts);
  }
  attachPhotos(state);
  settleAir(state);
  return state;
}
