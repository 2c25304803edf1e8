import { gaugePsi, kelvinFromF, needs, paPerPsi, success, type Result } from '@rimeward/units';
import { kgSFromCfm } from '../air-demand/open-heads';
import { checkHose } from '../loss/hose';
import { dischargeTemperature, type Discharge } from '../temperature/discharge';
import type { HoseAir } from '../temperature/hose-cooling';
import type { PlanInput } from './plan-input';
import type { SiteAir } from './site-air';

/** Air at the compressor's outlet, at its rated pressure (the hottest). Needs compressor, altitude, air temperature. */
export function zoneDischarge({ conditions }: PlanInput, { around, compressor }: SiteAir): Result<Discharge> {
  if (!compressor.ok) return compressor;
  if (!around.ok) return around;
  const pressure = gaugePsi(compressor.value.maxPressurePsi);
  return dischargeTemperature(
    compressor.value,
    conditions.airTemperatureF,
    pressure,
    around.value.atmospherePsia,
  );
}

/** Air in the hose at the compressor's full delivery, which cools it least. Needs a hose too. */
export function airInHose(
  { equipment, conditions, company }: PlanInput,
  { around, delivery }: SiteAir,
  discharge: Result<Discharge>,
): Result<HoseAir> {
  if (!discharge.ok) return discharge;
  if (!around.ok) return around;
  if (!delivery.ok) return delivery;
  if (!equipment.hose) return needs('hose');
  if (conditions.airTemperatureF === null) return needs('airTemperatureF');
  const impossible = checkHose(equipment.hose);
  if (impossible) return impossible;
  const { atmospherePsia, airTemperatureF } = around.value;
  return success({
    enteringF: discharge.value.leavingF,
    airTemperatureF: conditions.airTemperatureF,
    hose: equipment.hose,
    flowKgS: kgSFromCfm(delivery.value.freeAirCfm, atmospherePsia * paPerPsi, kelvinFromF(airTemperatureF)),
    heatTransferWM2K: company.heatTransferWM2K,
  });
}
