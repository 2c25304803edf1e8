import {
  kelvinFromF,
  paPerPsi,
  success,
  toAbsolute,
  within,
  type GaugePsi,
  type Result,
} from '@rimeward/units';
import { cfmFromKgS, kgSFromCfm, type AirAround } from '../air-demand/open-heads';
import { orificeAreaM2, orificeUpstreamPa } from '../air-demand/orifice';
import { explain, type Explained } from '../explain/explanation';
import { pathInletPa } from './air-path';
import type { Bore } from './isothermal';

/** What the gauge at the compressor says about the heads. A closed end shows the full pressure with nothing flowing. */
export type GaugeMeaning = 'close-to-the-heads' | 'far-above-the-heads';

/** Steady state of a zone whose water is gone. */
export interface HeldPressure extends Explained {
  /** Pressure at the compressor's gauge, psi gauge: never above the ceiling, whatever the hose loses. */
  gaugePsi: number;
  /** Pressure at the heads, psi gauge. */
  headPsi: number;
  /** Lost in hose and pipe, psi. */
  pathLossPsi: number;
  /** Air that flows, ft3/min of free air at the site. */
  freeAirCfm: number;
  /** Whether the compressor's delivery or the regulator's pressure sets the flow. */
  limitedBy: 'compressor' | 'regulator';
  gaugeMeaning: GaugeMeaning;
}

/** What the steady state depends on. */
export interface HeldPressureInput {
  flowGpm: number;
  designPressurePsi: number;
  /** Delivery of the compressor, ft3/min of free air at the site. */
  deliveredCfm: number;
  /** Pressure set at the regulator, psi gauge. */
  regulatorPsi: GaugePsi;
  /** Hose and pipe in the direction of flow. */
  path: readonly Bore[];
}

/**
 * Pressure that a compressor holds through hose, pipe and dry heads: the flow at which the path needs the regulator's pressure, or all
 * that the compressor delivers where that is less. Sources: isothermal Darcy (published), orifice equation (derived).
 */
export function heldPressure(input: HeldPressureInput, around: AirAround): Result<HeldPressure> {
  const { flowGpm, designPressurePsi, deliveredCfm, regulatorPsi, path } = input;
  const impossible =
    within('flowGpm', flowGpm, 0.01, 2_000) ??
    within('designPressurePsi', designPressurePsi, 1, 300) ??
    within('deliveredCfm', deliveredCfm, 0.1, 5_000) ??
    within('regulatorPsi', regulatorPsi, 0.1, 150);
  if (impossible) return impossible;
  const { atmospherePsia, airTemperatureF } = around;
  const temperatureK = kelvinFromF(airTemperatureF);
  const atmospherePa = atmospherePsia * paPerPsi;
  const regulatorPa = toAbsolute(regulatorPsi, atmospherePsia) * paPerPsi;
  const areaM2 = orificeAreaM2(flowGpm, designPressurePsi);
  const headPa = (flowKgS: number): number => orificeUpstreamPa(areaM2, flowKgS, atmospherePa, temperatureK);
  const sourcePa = (flowKgS: number): number => pathInletPa(path, flowKgS, headPa(flowKgS), temperatureK);
  const mostKgS = kgSFromCfm(deliveredCfm, atmospherePa, temperatureK);
  const mostPa = sourcePa(mostKgS);
  const byCompressor = mostPa <= regulatorPa;
  const flowKgS = byCompressor ? mostKgS : flowFor(sourcePa, regulatorPa, mostKgS, mostPa, atmospherePa);
  const gaugePsi = byCompressor ? (mostPa - atmospherePa) / paPerPsi : regulatorPsi;
  const headPsi = (headPa(flowKgS) - atmospherePa) / paPerPsi;
  const pathLossPsi = gaugePsi - headPsi;
  return success({
    gaugePsi,
    headPsi,
    pathLossPsi,
    freeAirCfm: cfmFromKgS(flowKgS, atmospherePa, temperatureK),
    limitedBy: byCompressor ? 'compressor' : 'regulator',
    gaugeMeaning: pathLossPsi > Math.max(5, 0.1 * gaugePsi) ? 'far-above-the-heads' : 'close-to-the-heads',
    why: explain('line-pressure-held', {
      flowGpm,
      designPressurePsi,
      deliveredCfm,
      regulatorPsi,
      atmospherePsia,
      airTemperatureF,
    }),
  });
}

/** Flow that needs `wantedPa` at the source; false position with the Illinois step, to one part in 100 000. */
function flowFor(
  sourcePa: (flowKgS: number) => number,
  wantedPa: number,
  mostKgS: number,
  mostPa: number,
  atmospherePa: number,
): number {
  let [low, high] = [0, mostKgS];
  let [lowGap, highGap] = [atmospherePa - wantedPa, mostPa - wantedPa];
  let side = 0;
  for (let step = 0; step < 60; step += 1) {
    const flow = (low * highGap - high * lowGap) / (highGap - lowGap);
    const gap = sourcePa(flow) - wantedPa;
    if (Math.abs(gap) < 1e-5 * wantedPa) return flow;
    if (gap > 0) {
      [high, highGap] = [flow, gap];
      if (side === 1) lowGap /= 2;
      side = 1;
    } else {
      [low, lowGap] = [flow, gap];
      if (side === -1) highGap /= 2;
      side = -1;
    }
  }
  return low;
}
