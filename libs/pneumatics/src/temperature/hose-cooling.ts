import { mPerFt, mPerIn, success, within, type Result } from '@rimeward/units';
import { airSpecificHeatJPerKgK } from '../atmosphere/air';
import { explain, type Assumption, type Explained } from '../explain/explanation';
import { checkHose, type Hose } from '../loss/hose';

/** Heat transfer from a hose to the air around it, W/(m2 K) (assumed). */
export const usualHeatTransferWM2K = 10;
/** A hose is this much wider outside than inside, in (assumed). */
const hoseWallsIn = 0.41;

/** Air at the end of a hose. */
export interface HoseCooling extends Explained {
  /** At the air connection, F. */
  connectionF: number;
  /** Length of this hose at which the air would be at the wanted temperature, ft; null where it never gets there. */
  enoughFt: number | null;
  /** Null where nothing on the way minds heat. */
  wantedF: number | null;
}

/** What cools and by how much. */
export interface HoseAir {
  enteringF: number;
  airTemperatureF: number;
  hose: Hose;
  /** Mass flow of air, kg/s. */
  flowKgS: number;
  heatTransferWM2K?: number;
}

/** With the temperature that would be low enough, F; null where any is. */
export interface HoseCoolingInput extends HoseAir {
  wantedF: number | null;
}

const outsideIn = (hose: Hose): number => hose.outsideDiameterIn ?? hose.insideDiameterIn + hoseWallsIn;

/** Share of the temperature difference that is lost, as an exponent per metre of hose. */
const coolingPerM = ({ hose, flowKgS, heatTransferWM2K = usualHeatTransferWM2K }: HoseAir): number =>
  (heatTransferWM2K * Math.PI * outsideIn(hose) * mPerIn) / (flowKgS * airSpecificHeatJPerKgK);

/** Temperature at the end of a hose, F, without checks: for inputs that have been checked. */
export const hoseEndF = (air: HoseAir): number =>
  air.airTemperatureF +
  (air.enteringF - air.airTemperatureF) * Math.exp(-coolingPerM(air) * air.hose.lengthFt * mPerFt);

/**
 * Cooling along a hose, T(L) = Ta + (T0 - Ta) exp(-U pi D L / (m cp)), and the length that would be enough. U is an assumption, so
 * the result is an estimate. Temperatures -60 to 700 F. Source: worked out here (derived).
 */
export function hoseCooling(input: HoseCoolingInput): Result<HoseCooling> {
  const { enteringF, airTemperatureF, hose, flowKgS, wantedF } = input;
  const transfer = input.heatTransferWM2K ?? usualHeatTransferWM2K;
  const impossible =
    checkHose(hose) ??
    within('enteringF', enteringF, -60, 700) ??
    within('airTemperatureF', airTemperatureF, -60, 130) ??
    within('flowKgS', flowKgS, 1e-5, 10) ??
    within('heatTransferWM2K', transfer, 0, 200);
  if (impossible) return impossible;
  return success({
    connectionF: hoseEndF(input),
    enoughFt:
      wantedF === null
        ? 0
        : enoughFt(enteringF - airTemperatureF, wantedF - airTemperatureF, coolingPerM(input)),
    wantedF,
    why: explain(
      'hose-cooling',
      {
        enteringF,
        airTemperatureF,
        flowKgS,
        wantedF,
        lengthFt: hose.lengthFt,
        outsideDiameterIn: outsideIn(hose),
      },
      assumedOf(input),
    ),
  });
}

function enoughFt(over: number, wantedOver: number, perM: number): number | null {
  if (over <= wantedOver) return 0;
  return wantedOver <= 0 || perM === 0 ? null : Math.log(over / wantedOver) / perM / mPerFt;
}

const usualTransfer: Assumption = {
  field: 'heatTransferWM2K',
  value: usualHeatTransferWM2K,
  why: 'heat-transfer',
};

function assumedOf({ hose, heatTransferWM2K }: HoseCoolingInput): Assumption[] {
  const assumed: Assumption[] = [];
  if (heatTransferWM2K === undefined) assumed.push(usualTransfer);
  if (typeof hose.outsideDiameterIn !== 'number') {
    assumed.push({ field: 'outsideDiameterIn', value: outsideIn(hose), why: 'hose-wall' });
  }
  return assumed;
}
