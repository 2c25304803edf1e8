import { type Failure, outOfRange, within } from '@rimeward/units';
import { isLocalDate } from '../calendar/local-date';
import { firstFailure } from '../explain/first-failure';
import type { CapacityRequest, SeasonCrew, SeasonVisit } from './capacity-request';

const day = 'YYYY-MM-DD';

/** Refuses impossible dates and minutes, doubled ids, and a crew with the same day twice; the failure names which. */
export function checkCapacityRequest(request: CapacityRequest): Failure | undefined {
  return (
    firstFailure(
      isLocalDate(request.today) ? undefined : outOfRange('today', day),
      within('travelMinutesPerVisit', request.travelMinutesPerVisit ?? 0, 0, 480),
      eachOnce(
        'visits',
        request.visits.map((visit) => visit.id),
      ),
      eachOnce(
        'crews',
        request.crews.map((crew) => crew.id),
      ),
    ) ?? firstFailure(...request.visits.map(checkVisit), ...request.crews.map(checkCrew))
  );
}

function eachOnce(field: string, ids: readonly string[]): Failure | undefined {
  return new Set(ids).size === ids.length ? undefined : outOfRange(field, 'each once');
}

function checkVisit({ id, workMinutes, finishBy, earliestDate }: SeasonVisit): Failure | undefined {
  const dated = finishBy === null || isLocalDate(finishBy);
  return firstFailure(
    workMinutes === null ? undefined : within(`visit ${id}: workMinutes`, workMinutes, 1, 10_080),
    dated ? undefined : outOfRange(`visit ${id}: finishBy`, day),
    earliestDate === undefined || isLocalDate(earliestDate)
      ? undefined
      : outOfRange(`visit ${id}: earliestDate`, day),
  );
}

function checkCrew({ id, days }: SeasonCrew): Failure | undefined {
  return (
    eachOnce(
      `crew ${id}: days`,
      days.map(({ date }) => date),
    ) ??
    firstFailure(
      ...days.flatMap(({ date, minutes }) => [
        isLocalDate(date) ? undefined : outOfRange(`crew ${id}: date`, day),
        within(`crew ${id}: minutes on ${date}`, minutes, 0, 1440),
      ]),
    )
  );
}
