/**
 * How far a source can be leaned on: published and read; quoted by somebody else; common practice
 * without a publication; or written from memory.
 */
export type SourceStatus = 'published' | 'second-hand' | 'common-practice' | 'from-memory';

/** A source that an explanation can name. */
export interface Source {
  title: string;
  status: SourceStatus;
}

/** Every source used by this library, by its stable id. */
export const sources = {
  'ncei-normals-1991-2020': {
    title:
      'NOAA NCEI, U.S. Climate Normals 1991-2020, description of the by-variable and by-station files (PRBFST, TnnFPmm, measurement flags)',
    status: 'published',
  },
  'ncei-supplemental-1981-2010': {
    title: 'NOAA NCEI, Supplemental Climate Normals 1981-2010, readme-supp.txt (definitions, special values)',
    status: 'published',
  },
  'nws-frost-freeze-maps': {
    title:
      'National Weather Service, weather.gov/jan/frostfreeze: first frost 36 F, freeze 32 F, hard freeze 28 F',
    status: 'published',
  },
  'nws-warning-criteria': {
    title:
      'National Weather Service Blacksburg, 2007: freeze warning at 32 F or less in 12 to 36 h, frost advisory 33 to 36 F',
    status: 'published',
  },
  'nws-hourly-forecast': {
    title: 'National Weather Service API documentation: hourly periods with start time and temperature',
    status: 'published',
  },
  'cold-season-august': {
    title:
      'Cold season counted from August 1 to July 31, as in the freeze probabilities of the climate normals',
    status: 'from-memory',
  },
  'act-at-32f': {
    title:
      'An above-ground brass assembly may freeze before pipe in a building does, so the trade acts at 32 F',
    status: 'common-practice',
  },
  'one-year-in-ten': {
    title: 'Plan to the date by which one autumn in ten has had its first freeze',
    status: 'common-practice',
  },
  'iugg-mean-radius': {
    title: 'Mean earth radius 6371008.8 m of WGS 84 (IUGG R1); haversine formula',
    status: 'published',
  },
  'road-factor': {
    title: 'Road distance over straight distance, 1.2 to 1.4 in built-up North America',
    status: 'common-practice',
  },
  'town-speed': {
    title: 'Average speed of a truck with a towed compressor between stops in town',
    status: 'common-practice',
  },
  'held-karp-1962': {
    title: 'M. Held and R. M. Karp, A dynamic programming approach to sequencing problems, 1962',
    status: 'published',
  },
  'croes-1958': {
    title: 'G. A. Croes, A method for solving traveling-salesman problems, 1958 (2-opt)',
    status: 'published',
  },
  'or-1976': {
    title: 'I. Or, Traveling salesman-type combinatorial problems, 1976 (moving up to three neighbours)',
    status: 'published',
  },
  'earliest-due-date': {
    title:
      'J. R. Jackson, Scheduling a production line to minimize maximum tardiness, 1955 (earliest due date first)',
    status: 'published',
  },
} as const satisfies Record<string, Source>;

/** Stable id of a source. */
export type SourceId = keyof typeof sources;
