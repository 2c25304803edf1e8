import { standardAtmospherePsia } from './factors';

declare const reference: unique symbol;

/** Pressure over the surrounding air, psi. What a gauge shows; the product's pressures are gauge unless named otherwise. */
export type GaugePsi = number & { readonly [reference]: 'gauge' };

/** Pressure over vacuum, psi. What gas laws need. */
export type AbsolutePsi = number & { readonly [reference]: 'absolute' };

/** Marks a plain number as a gauge pressure. No check: the function that uses it names its own range. */
export const gaugePsi = (pressurePsi: number): GaugePsi => pressurePsi as GaugePsi;

/** Marks a plain number as an absolute pressure. */
export const absolutePsi = (pressurePsia: number): AbsolutePsi => pressurePsia as AbsolutePsi;

/** The standard atmosphere at sea level, 14.6959 psi absolute. */
export const seaLevelPsia: AbsolutePsi = absolutePsi(standardAtmospherePsia);

/** Absolute from gauge: adds the pressure of the air around the gauge. */
export const toAbsolute = (pressurePsi: GaugePsi, atmospherePsia: AbsolutePsi): AbsolutePsi =>
  (pressurePsi + atmospherePsia) as AbsolutePsi;

/** Gauge from absolute: takes the pressure of the air around the gauge away. Negative under vacuum. */
export const toGauge = (pressurePsia: AbsolutePsi, atmospherePsia: AbsolutePsi): GaugePsi =>
  (pressurePsia - atmospherePsia) as GaugePsi;
