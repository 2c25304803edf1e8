import type { FoldedEntry, VisitState } from '../visit/visit-state';
import { startCycle, stopCycle, zoneState, type CycleFacts } from './fold-air';
import { protectPart, seePart } from './fold-parts';
import { said } from './said';

/** What one standing entry says about the visit. Later entries overrule earlier ones where there is one answer only. */
export function applyEntry(state: VisitState, folded: FoldedEntry, facts: CycleFacts): void {
  const { entry } = folded;
  const by = said(folded);
  switch (entry.type) {
    case 'arrived':
      state.arrived ??= { ...entry.body, ...by };
      break;
    case 'cautions-read':
      state.cautionsRead.push({ ...entry.body, ...by });
      break;
    case 'damage-seen':
      state.damageSeen.push({ ...entry.body, ...by, photos: [...entry.photos] });
      break;
    case 'part-looked-for':
      seePart(state, entry.body, by);
      break;
    case 'part-protected':
      protectPart(state, entry.body, by);
      break;
    case 'water-off':
      state.waterOff = { ...entry.body, ...by };
      break;
    case 'pressure-relieved':
      state.pressureRelieved = { ...entry.body, ...by };
      break;
    case 'valve-set': {
      const valve = (state.valves[entry.body.valveId] ??= {
        valveId: entry.body.valveId,
        beforeAir: null,
        winter: null,
        photos: [],
      });
      valve[entry.body.stage === 'winter' ? 'winter' : 'beforeAir'] = { ...entry.body, ...by };
      break;
    }
    case 'air-connected':
      state.connection = { ...entry.body, ...by };
      break;
    case 'regulator-set':
      state.regulator = { ...entry.body, ...by };
      break;
    case 'people-clear':
      state.peopleClear = { ...entry.body, ...by };
      break;
    case 'interlock-passed':
      state.interlocksPassed.push({ ...entry.body, ...by });
      break;
    case 'zone-opened':
      zoneState(state, entry.body.zoneId).open = true;
      break;
    case 'zone-closed':
      zoneState(state, entry.body.zoneId).open = false;
      break;
    case 'air-started':
      startCycle(state, folded, entry.body, facts);
      break;
    case 'heads-seen':
      zoneState(state, entry.body.zoneId).headsSeen.push({ ...entry.body, ...by });
      break;
    case 'zone-skipped':
      zoneState(state, entry.body.zoneId).skipped = { ...entry.body, ...by };
      break;
    case 'air-closed-down':
      state.closeDown[entry.body.step] = by;
      break;
    case 'drain-set':
      state.drains[entry.body.drainId] = { ...entry.body, ...by };
      break;
    case 'pump-drained':
      state.pump = { ...entry.body, ...by };
      break;
    case 'connection-plugged':
      state.plug = { ...entry.body, ...by };
      break;
    case 'controller-set':
      state.controller = { ...entry.body, ...by };
      break;
    case 'insulated':
      state.insulated.push({ ...entry.body, ...by });
      break;
    case 'defect-found':
      state.defects.push({ ...entry.body, ...by, photos: [...entry.photos] });
      break;
    case 'note-written':
      state.notes.push({ ...entry.body, ...by });
      break;
    case 'left':
      state.left = { ...entry.body, ...by };
      break;
    case 'question-answered':
      state.answers.push({ ...entry.body, ...by });
      break;
    case 'air-stopped':
      stopCycle(state, entry.body.cycleId, facts);
      break;
    case 'end-sign-seen':
    case 'gauge-read':
    case 'photographs-added':
    case 'corrected':
      // Read by cycle, by photograph and by correction before or after this pass.
      break;
  }
}
