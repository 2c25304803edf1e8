import type { LocalDate } from '../calendar/local-date';

/** A visit still to be done this season. */
export interface SeasonVisit {
  id: string;
  /** Minutes of work on site; null when nobody has said. */
  workMinutes: number | null;
  /** Last day on which it still comes before the freeze; null when unknown. */
  finishBy: LocalDate | null;
  /** True where the normals give no freeze at the accepted risk: then it has no last day, and needs none. */
  noFreezeExpected?: boolean;
  /** First day on which it can be done; any day when left out. */
  earliestDate?: LocalDate;
  /** Crews that can do it; every crew when left out. */
  crewIds?: readonly string[];
}

/** A crew's working time on a day. */
export interface CrewDay {
  date: LocalDate;
  minutes: number;
}

/** A crew and the days it works. Days off are simply not listed. */
export interface SeasonCrew {
  id: string;
  days: readonly CrewDay[];
}

/** A season's work and the crews for it. */
export interface CapacityRequest {
  today: LocalDate;
  visits: readonly SeasonVisit[];
  crews: readonly SeasonCrew[];
  /** Driving minutes reckoned for each visit; 20 is assumed. */
  travelMinutesPerVisit?: number;
}
