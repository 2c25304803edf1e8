import { gaugePsi, needs, success, type GaugePsi } from '@rimeward/units';
import { displacementAir } from '../air-demand/displacement';
import { openHeadsAir } from '../air-demand/open-heads';
import type { RatedPart } from '../ceiling/candidate';
import { pressureCeiling, type PressureCeiling } from '../ceiling/pressure-ceiling';
import { airCycles } from '../cycles/air-cycles';
import { storedEnergy } from '../energy/stored-energy';
import { waterHeld } from '../pipe/water-held';
import { hoseCooling, hoseEndF } from '../temperature/hose-cooling';
import { hottestWithoutLowering } from '../temperature/wanted-temperature';
import type { PlanInput, ZoneInput } from './plan-input';
import { siteAir, type SiteAir } from './site-air';
import { both, follow } from './follow';
import { headsWater, zoneFit, zoneHeld, zoneHoseLoss, zonePushed } from './zone-air';
import { airInHose, zoneDischarge } from './zone-heat';
import type { ZonePlan } from './zone-plan';

/**
 * Everything computed for one zone. `clearsMain` for the zone that is blown first: its water and time include the main line. Figures that
 * lack an input say which; the others are there. Plain data in and out, no clock, no randomness.
 */
export const planZone = (input: PlanInput, zone: ZoneInput, clearsMain: boolean): ZonePlan =>
  planZoneIn(input, siteAir(input), zone, clearsMain);

/** As `planZone`, with what the zones of a system share already worked out. */
export function planZoneIn(input: PlanInput, air: SiteAir, zone: ZoneInput, clearsMain: boolean): ZonePlan {
  const { system, conditions, company } = input;
  const { around } = air;
  const path = system.mainLine.concat(zone.laterals);

  const discharge = zoneDischarge(input, air);
  const hoseAir = airInHose(input, air, discharge);
  const ceiling = pressureCeiling({
    runs: path,
    parts: partsOnTheWay(input, zone),
    policyId: company.policyId,
    companyCapPsi: company.pressureCapPsi,
    airTemperatureF: conditions.connectionTemperatureF ?? (hoseAir.ok ? hoseEndF(hoseAir.value) : null),
  });
  const cooling = both(ceiling, hoseAir, ({ coldPressurePsi }, hose) =>
    hoseCooling({
      enteringF: hose.enteringF,
      airTemperatureF: hose.airTemperatureF,
      hose: hose.hose,
      flowKgS: hose.flowKgS,
      wantedF: hottestWithoutLowering(path, coldPressurePsi),
      heatTransferWM2K: hose.heatTransferWM2K,
    }),
  );
  const plan = follow(ceiling, (limit) => success(planPressure(limit)));

  const heads = headsWater(zone);
  const displacement = both(plan, around, (planPsi, { atmospherePsia }) =>
    zone.flowGpm === null ? needs('flowGpm') : displacementAir(zone.flowGpm, planPsi, atmospherePsia),
  );
  const openHeads = both(plan, around, (planPsi, site) =>
    follow(heads, ({ flowGpm, designPressurePsi }) =>
      openHeadsAir(flowGpm, designPressurePsi, planPsi, site),
    ),
  );
  const held = follow(plan, (planPsi) => zoneHeld(input, air, heads, path, planPsi));
  const pushed = follow(plan, (planPsi) => zonePushed(air, zone, planPsi));
  const water = waterHeld(clearsMain ? path : zone.laterals);
  return {
    zoneId: zone.id,
    clearsMain,
    ceiling,
    displacement,
    openHeads,
    held,
    hoseLoss: zoneHoseLoss(input, air, held),
    discharge,
    cooling,
    pushed,
    water,
    cycles: both(water, pushed, ({ totalGal }, { flowGpm }) =>
      airCycles({
        volumeGal: totalGal,
        pushedGpm: flowGpm,
        headKind: zone.headKind,
        timeFactor: company.timeFactor,
        capSeconds: company.capSeconds?.[zone.headKind],
        restSeconds: company.restSeconds,
      }),
    ),
    fit: follow(plan, (planPsi) => zoneFit(input, air, zone, planPsi, { displacement, pushed, held })),
    energy: both(plan, around, (planPsi, { atmospherePsia }) =>
      follow(clearsMain ? water : waterHeld(path), ({ totalGal }) =>
        storedEnergy(totalGal, planPsi, atmospherePsia),
      ),
    ),
  };
}

/** The pressure that the other figures are worked out at: the ceiling, or what it is once the air has been cooled. */
const planPressure = (limit: PressureCeiling): GaugePsi =>
  gaugePsi(limit.pressurePsi > 0 ? limit.pressurePsi : limit.coldPressurePsi);

function partsOnTheWay({ system, equipment }: PlanInput, zone: ZoneInput): readonly RatedPart[] {
  const hosePsi = equipment.hose?.ratedPsi;
  if (!zone.lowestRatedPart && typeof hosePsi !== 'number') return system.parts;
  return [
    ...system.parts,
    ...(zone.lowestRatedPart ? [zone.lowestRatedPart] : []),
    ...(typeof hosePsi === 'number' ? [{ name: 'hose', ratedPsi: hosePsi }] : []),
  ];
}
