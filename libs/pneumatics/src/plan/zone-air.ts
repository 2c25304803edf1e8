import { gaugePsi, needs, success, type GaugePsi, type Result } from '@rimeward/units';
import { compressorFit, type CompressorFit } from '../air-demand/compressor-fit';
import type { DisplacementAir } from '../air-demand/displacement';
import { waterPushed, type WaterPushed } from '../air-demand/water-pushed';
import { popsUp } from '../cycles/head-kind';
import { hoseBore, pipeBores } from '../loss/air-path';
import { heldPressure, type HeldPressure } from '../loss/held-pressure';
import { checkHose, usualCouplingFactor } from '../loss/hose';
import { hoseLoss, type HoseLoss } from '../loss/hose-loss';
import type { PipeRun } from '../pipe/pipe-run';
import type { PlanInput, ZoneInput } from './plan-input';
import type { SiteAir } from './site-air';
import { both, follow } from './follow';

/** Flow and pressure of a zone's water, or what of it is missing. */
export interface HeadsWater {
  flowGpm: number;
  designPressurePsi: number;
}

/** Flow and pressure of a zone's water. Needs both. */
export function headsWater({ flowGpm, designPressurePsi }: ZoneInput): Result<HeadsWater> {
  if (flowGpm !== null && designPressurePsi !== null) return success({ flowGpm, designPressurePsi });
  if (flowGpm !== null) return needs('designPressurePsi');
  return designPressurePsi === null ? needs('flowGpm', 'designPressurePsi') : needs('flowGpm');
}

/** What the compressor holds through hose, the whole main in series, laterals and dry heads. */
export function zoneHeld(
  { equipment, company }: PlanInput,
  { around, delivery }: SiteAir,
  heads: Result<HeadsWater>,
  path: readonly PipeRun[],
  planPsi: GaugePsi,
): Result<HeldPressure> {
  if (!equipment.hose) return needs('hose');
  const hose = equipment.hose;
  const impossible = checkHose(hose);
  if (impossible) return impossible;
  return both(heads, around, ({ flowGpm, designPressurePsi }, site) =>
    both(delivery, pipeBores(path), ({ freeAirCfm: deliveredCfm }, bores) => {
      const whole = [hoseBore(hose, company.couplingFactor ?? usualCouplingFactor)].concat(bores);
      return heldPressure(
        { flowGpm, designPressurePsi, deliveredCfm, regulatorPsi: planPsi, path: whole },
        site,
      );
    }),
  );
}

/** Loss along the hose at the flow of the dry heads. */
export function zoneHoseLoss(
  { equipment, company }: PlanInput,
  { around }: SiteAir,
  held: Result<HeldPressure>,
): Result<HoseLoss> {
  if (!equipment.hose) return needs('hose');
  const hose = equipment.hose;
  return both(held, around, ({ freeAirCfm, gaugePsi: inletPsi }, site) =>
    hoseLoss(hose, freeAirCfm, gaugePsi(inletPsi), site, company.couplingFactor),
  );
}

/** How fast the water leaves in front of the air. Needs the zone's flow. */
export function zonePushed(
  { around, delivery }: SiteAir,
  zone: ZoneInput,
  planPsi: GaugePsi,
): Result<WaterPushed> {
  const { flowGpm, designPressurePsi, elevationFt } = zone;
  if (flowGpm === null) return needs('flowGpm');
  return both(around, delivery, ({ atmospherePsia }, { freeAirCfm: deliveredCfm }) =>
    waterPushed(
      { flowGpm, designPressurePsi, elevationFt, deliveredCfm, regulatorPsi: planPsi },
      atmospherePsia,
    ),
  );
}

/** The compressor against the zone. */
export function zoneFit(
  { system, company }: PlanInput,
  { delivery }: SiteAir,
  zone: ZoneInput,
  planPsi: GaugePsi,
  figures: { displacement: Result<DisplacementAir>; pushed: Result<WaterPushed>; held: Result<HeldPressure> },
): Result<CompressorFit> {
  const held = figures.held.ok ? figures.held.value : null;
  return both(figures.displacement, figures.pushed, ({ freeAirCfm: neededCfm }, { liftPsi }) =>
    follow(delivery, ({ freeAirCfm: deliveredCfm }) =>
      success(
        compressorFit(
          {
            deliveredCfm,
            neededCfm,
            planPsi,
            liftPsi,
            headPsi: held?.headPsi ?? null,
            heldBy: held?.limitedBy ?? null,
            headsPopUp: popsUp(zone.headKind),
            largestMainIn: largestIn(system.mainLine),
          },
          company.fit,
        ),
      ),
    ),
  );
}

function largestIn(runs: readonly PipeRun[]): number | null {
  let largest: number | null = null;
  for (const { nominalIn } of runs) if (largest === null || nominalIn > largest) largest = nominalIn;
  return largest;
}
