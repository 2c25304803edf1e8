import type { PhotoReference } from '../entry/envelope';
import type { LogEntry } from '../entry/log-entry';
import type { VisitState } from '../visit/visit-state';

/** Lists every photograph of standing entries and ties it to the part or valve that it shows. */
export function attachPhotos(state: VisitState): void {
  for (const { entry, standing } of state.entries) {
    if (standing === 'withdrawn' || entry.photos.length === 0) continue;
    const subject = subjectOf(entry);
    for (const photo of entry.photos) {
      state.photos.push({ photo, entryId: entry.id, subject });
      if (subject === null) continue;
      state.parts[subject]?.photos.push(photo);
      state.valves[subject]?.photos.push(photo);
      if (entry.type === 'photographs-added') addToFault(state, subject, photo);
    }
  }
}

/** Photographs taken later of damage or of a defect name its entry. */
function addToFault(state: VisitState, entryId: string, photo: PhotoReference): void {
  const fault = [...state.damageSeen, ...state.defects].find((one) => one.entryId === entryId);
  fault?.photos.push(photo);
}

function subjectOf(entry: LogEntry): string | null {
  switch (entry.type) {
    case 'part-looked-for':
    case 'part-protected':
      return entry.body.partId;
    case 'valve-set':
      return entry.body.valveId;
    case 'drain-set':
      return entry.body.drainId;
    case 'pump-drained':
      return entry.body.pumpId;
    case 'defect-found':
      return entry.body.zoneId;
    case 'photographs-added':
      return entry.body.subject;
    default:
      return null;
  }
}
