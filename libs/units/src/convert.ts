import Qty from 'js-quantities';
import { outOfRange, success } from './outcome';
import type { Result } from './result';

const converters = new Map<string, (value: number) => number>();

function converter(from: string, to: string): (value: number) => number {
  const key = `${from}>${to}`;
  const kept = converters.get(key);
  if (kept) return kept;
  // The library's fast converter loses tiny temperatures: those take its slow way.
  const made = from.startsWith('temp')
    ? (value: number): number => Qty(value, from).to(to).scalar
    : (Qty.swiftConverter(from, to) as (value: number) => number);
  converters.set(key, made);
  return made;
}

/**
 * A value in another unit, on js-quantities (unit names are its own: `psi`, `kPa`, `bar`, `ft3/min`, `l/s`, `gallon`,
 * `tempF`, `tempC`). Units are parsed once and kept. Pressure stays what it was, gauge or absolute. Refuses units that are
 * unknown or of different kinds, and a temperature below absolute zero.
 */
export function convert(value: number, from: string, to: string): Result<number> {
  if (!Number.isFinite(value)) return outOfRange('value', 'a finite number');
  try {
    const converted = converter(from, to)(value);
    return Number.isFinite(converted) ? success(converted) : outOfRange('value', 'a possible value');
  } catch (error) {
    return outOfRange('unit', error instanceof Error ? error.message : 'units of the same kind');
  }
}
