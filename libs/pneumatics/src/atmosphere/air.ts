/** Specific gas constant of dry air, J/(kg K) (US Standard Atmosphere 1976, published). */
export const airGasConstantJPerKgK = 287.05287;
/** Ratio of the specific heats of air. */
export const airHeatRatio = 1.4;
/** Specific heat of air at constant pressure, J/(kg K). */
export const airSpecificHeatJPerKgK = 1005;
/** Density of water, 62.4 lb/ft3, kg/m3. */
export const waterDensityKgM3 = (62.4 * 0.45359237) / 0.3048 ** 3;
/** Pressure of a foot of water, psi: 62.4 / 144. */
export const psiPerFtOfWater = 62.4 / 144;

/** Density of air, kg/m3, ideal gas. */
export const airDensityKgM3 = (pressurePa: number, temperatureK: number): number =>
  pressurePa / (airGasConstantJPerKgK * temperatureK);

/**
 * Dynamic viscosity of air, Pa s, by Sutherland's formula with the constants of the US Standard Atmosphere 1976 (published).
 */
export const airViscosityPaS = (temperatureK: number): number =>
  (1.458e-6 * temperatureK * Math.sqrt(temperatureK)) / (temperatureK + 110.4);
