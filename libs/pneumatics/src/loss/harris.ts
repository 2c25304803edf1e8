import { absolutePsi, type AbsolutePsi } from '@rimeward/units';

/**
 * Loss by the Harris formula with the inlet pressure, psi: dP = L Q^2 / (2390 P d^5.31). Length ft, free air ft3/min at sea level,
 * absolute psi, bore in. Higher than measured: a conservative second opinion. Source: E. G. Harris (published).
 */
export const harrisLossPsi = (
  standardAirCfm: number,
  insideDiameterIn: number,
  lengthFt: number,
  inletPsia: AbsolutePsi,
): number => (lengthFt * standardAirCfm ** 2) / (2_390 * inletPsia * insideDiameterIn ** 5.31);

/**
 * Outlet pressure by the closed form of Harris, P1^2 - P2^2 = L Q^2 / (34.5^2 d^5.31), psi absolute; null where it leaves nothing.
 */
export function harrisOutletPsia(
  standardAirCfm: number,
  insideDiameterIn: number,
  lengthFt: number,
  inletPsia: AbsolutePsi,
): AbsolutePsi | null {
  const left = inletPsia ** 2 - (lengthFt * standardAirCfm ** 2) / (34.5 ** 2 * insideDiameterIn ** 5.31);
  return left > 0 ? absolutePsi(Math.sqrt(left)) : null;
}
