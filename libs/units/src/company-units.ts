import { convert } from './convert';
import type { Result } from './result';

/** Kinds of figure that a screen shows, and the unit each has inside the product. */
const usUnits = {
  pressure: 'psi',
  freeAir: 'ft3/min',
  waterFlow: 'gallon/min',
  volume: 'gallon',
  length: 'foot',
  diameter: 'inch',
  temperature: 'tempF',
} as const;

/** Kind of figure. */
export type FigureKind = keyof typeof usUnits;

/** A company's choice of units. */
export interface UnitChoice {
  units: 'us' | 'metric';
  /** Pressure unit under metric. */
  metricPressure: 'kPa' | 'bar';
}

function metricUnit(kind: FigureKind, metricPressure: 'kPa' | 'bar'): string {
  switch (kind) {
    case 'pressure':
      return metricPressure;
    case 'freeAir':
    case 'waterFlow':
      return 'l/s';
    case 'volume':
      return 'l';
    case 'length':
      return 'm';
    case 'diameter':
      return 'mm';
    case 'temperature':
      return 'tempC';
  }
}

const unitOf = (kind: FigureKind, choice: UnitChoice): string =>
  choice.units === 'us' ? usUnits[kind] : metricUnit(kind, choice.metricPressure);

/** A figure of the product (US customary) as a number in the company's unit. */
export const toCompanyUnit = (kind: FigureKind, value: number, choice: UnitChoice): Result<number> =>
  convert(value, usUnits[kind], unitOf(kind, choice));

/** A figure typed in the company's unit, as the product keeps it (US customary). */
export const fromCompanyUnit = (kind: FigureKind, value: number, choice: UnitChoice): Result<number> =>
  convert(value, unitOf(kind, choice), usUnits[kind]);
