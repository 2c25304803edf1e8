import type { EntryBody } from '../entry-types/registry';
import type { PartState, Said, VisitState } from '../visit/visit-state';

export function seePart(state: VisitState, body: EntryBody<'part-looked-for'>, by: Said): void {
  const known = state.parts[body.partId];
  state.parts[body.partId] = {
    ...by,
    partId: body.partId,
    kind: body.kind,
    outcome: body.outcome,
    protection: known?.protection ?? null,
    photos: known?.photos ?? [],
  };
}

/** Protecting a part says that it was found, even when nobody tapped "found". */
export function protectPart(state: VisitState, body: EntryBody<'part-protected'>, by: Said): void {
  const known: PartState = state.parts[body.partId] ?? {
    ...by,
    partId: body.partId,
    kind: body.kind,
    outcome: 'found',
    protection: null,
    photos: [],
  };
  state.parts[body.partId] = { ...known, protection: { ...body, ...by } };
}
