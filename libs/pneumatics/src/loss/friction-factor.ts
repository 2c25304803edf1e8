/** Below this Reynolds number the flow is taken as laminar. */
export const laminarReynoldsNumber = 2_040;

/** Reynolds number of a flow in a round bore. */
export const reynoldsNumber = (flowKgS: number, diameterM: number, viscosityPaS: number): number =>
  (4 * flowKgS) / (Math.PI * diameterM * viscosityPaS);

/**
 * Darcy friction factor: 64 / Re when laminar, Colebrook's equation otherwise, solved by Newton's method on 1/sqrt(f). Source: C. F.
 * Colebrook 1939; checked against python3-fluids (published).
 */
export function darcyFrictionFactor(reynolds: number, relativeRoughness: number): number {
  if (reynolds < laminarReynoldsNumber) return 64 / reynolds;
  const rough = relativeRoughness / 3.7;
  const smooth = 2.51 / reynolds;
  // Haaland's explicit formula starts within 2 %.
  let root = -1.8 * Math.log10(rough ** 1.11 + 6.9 / reynolds);
  for (let step = 0; step < 2; step += 1) {
    const inside = rough + smooth * root;
    const error = root + 2 * Math.log10(inside);
    root -= error / (1 + (2 * smooth) / (Math.LN10 * inside));
  }
  return 1 / (root * root);
}
