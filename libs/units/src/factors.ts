/**
 * Conversion factors that are exact by definition (international yard and pound 1959, US gallon of 231 cubic inches,
 * conventional gravity), so that a computation need not load a conversion library. Checked against GNU units and against
 * js-quantities in the tests. The unit stands in the name: `paPerPsi` is pascals in one psi.
 */
export const mPerIn = 0.0254;
export const mPerFt = 0.3048;
export const kgPerLb = 0.45359237;
export const newtonPerLbf = kgPerLb * 9.80665;
export const paPerPsi = newtonPerLbf / (mPerIn * mPerIn);
export const m3PerFt3 = mPerFt ** 3;
export const galPerFt3 = 1728 / 231;
export const m3PerGal = m3PerFt3 / galPerFt3;
export const jPerFtLbf = newtonPerLbf * mPerFt;
/** The standard atmosphere, 101 325 Pa by definition, in psi absolute. */
export const standardAtmospherePsia = 101_325 / paPerPsi;
