import { type Result, success } from '@rimeward/units';
import type { LocalDate } from '../calendar/local-date';
import type { Explanation } from '../explain/explanation';
import type { CapacityRequest } from './capacity-request';
import { checkCapacityRequest } from './check-request';
import { hoursByDate, minutesBetween, type HoursByDate } from './hours-by-date';
import { placeVisits, type PlaceableVisit, type PlacedVisit } from './place-visits';
import { reasonLeft, type LeftVisit } from './reason-left';

/** A season's work against its crews. */
export interface SeasonCapacity {
  /** True when every visit has its day. */
  fits: boolean;
  placed: PlacedVisit[];
  /** Visits without a day, each with the reason. */
  left: LeftVisit[];
  byDate: HoursByDate[];
  minutesNeeded: number;
  minutesAvailable: number;
  /** Least crew time that is missing whatever the plan: the worst date's lack; 0 when none is provable. */
  minutesShort: number;
  /** Least number of further crew days, as long as the longest one listed, that could make up for it; null without any. */
  crewDaysShort: number | null;
  explanation: Explanation;
}

/**
 * Sets the visits left against the crews' days until each site's freeze. Visits whose minutes or last day are unknown
 * are not guessed: they stay without a day and say what they need. A visit whose last day has passed stays without a
 * day too and is not counted in the hours.
 */
export function seasonCapacity(request: CapacityRequest): Result<SeasonCapacity> {
  const refused = checkCapacityRequest(request);
  if (refused) return refused;
  const { today, visits, crews } = request;
  const travelMinutes = request.travelMinutesPerVisit ?? 20;
  const left: LeftVisit[] = [];
  const known: PlaceableVisit[] = [];
  for (const { id, workMinutes, finishBy, noFreezeExpected, earliestDate, crewIds } of visits) {
    if (workMinutes === null) left.push({ visitId: id, reason: 'needs-work-minutes' });
    else if (finishBy === null && !noFreezeExpected) left.push({ visitId: id, reason: 'needs-finish-by' });
    else if (finishBy !== null && finishBy < today) left.push({ visitId: id, reason: 'freeze-date-passed' });
    else
      known.push({
        id,
        minutes: workMinutes + travelMinutes,
        lastDate: finishBy,
        earliestDate: earliestDate ?? null,
        crewIds: crewIds ?? null,
      });
  }
  const placed = placeVisits(known, crews, today);
  const done = new Set(placed.map((visit) => visit.visitId));
  for (const visit of known) if (!done.has(visit.id)) left.push(reasonLeft(visit, crews, today));
  const byDate = hoursByDate(known, crews, today);
  const minutesShort = Math.max(0, ...byDate.map((date) => -date.minutesToSpare));
  const longestDay = longestCrewDay(request, today);
  return success({
    fits: left.length === 0,
    placed,
    left,
    byDate,
    minutesNeeded: known.reduce((sum, visit) => sum + visit.minutes, 0),
    minutesAvailable: minutesBetween(crews, today, null),
    minutesShort,
    crewDaysShort: longestDay === 0 ? null : Math.ceil(minutesShort / longestDay),
    explanation: explain(request, travelMinutes, left),
  });
}

function longestCrewDay({ crews }: CapacityRequest, today: LocalDate): number {
  return Math.max(
    0,
    ...crews.flatMap((crew) => crew.days.filter((day) => day.date >= today).map((day) => day.minutes)),
  );
}

function explain(request: CapacityRequest, travelMinutes: number, left: readonly LeftVisit[]): Explanation {
  const missing = left.flatMap(({ visitId, reason }) => {
    if (reason === 'needs-work-minutes') return [`visit ${visitId}: workMinutes`];
    return reason === 'needs-finish-by' ? [`visit ${visitId}: finishBy`] : [];
  });
  return {
    inputs: {
      today: request.today,
      visits: request.visits.length,
      crews: request.crews.length,
      travelMinutesPerVisit: travelMinutes,
    },
    assumed:
      request.travelMinutesPerVisit === undefined
        ? [{ field: 'travelMinutesPerVisit', value: travelMinutes, why: 'neighbouring stops in town' }]
        : [],
    missing,
    formulaId: 'season-capacity-earliest-date-first',
    sourceIds: ['earliest-due-date'],
  };
}
