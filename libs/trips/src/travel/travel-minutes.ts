import { type Result, success, within } from '@rimeward/units';
import type { Assumption, Explanation } from '../explain/explanation';
import { firstFailure } from '../explain/first-failure';
import { checkPoint, haversineM, type GeoPoint } from './great-circle';

/** How straight distance becomes driving time. What is left out is assumed and listed in the explanation. */
export interface TravelOptions {
  /** Road distance over straight distance; 1.3 is assumed. */
  roadFactor?: number;
  /** Average speed between stops, mph; 30 is assumed. */
  speedMph?: number;
}

/** Options with nothing left out. */
export interface SettledTravel {
  roadFactor: number;
  speedMph: number;
  assumed: Assumption[];
}

/** Driving between two places. */
export interface Travel {
  straightMi: number;
  roadMi: number;
  minutes: number;
  explanation: Explanation;
}

/** Metres in an international mile. */
export const metresPerMile = 1609.344;

/** Fills in road factor and speed, and refuses values outside 1 to 3 and 1 to 80 mph. */
export function settleTravel(options: TravelOptions): Result<SettledTravel> {
  const roadFactor = options.roadFactor ?? 1.3;
  const speedMph = options.speedMph ?? 30;
  const assumed: Assumption[] = [];
  if (options.roadFactor === undefined)
    assumed.push({
      field: 'roadFactor',
      value: roadFactor,
      why: 'roads are about a third longer than the straight line',
    });
  if (options.speedMph === undefined)
    assumed.push({ field: 'speedMph', value: speedMph, why: 'a truck with a towed compressor in town' });
  const refused = firstFailure(within('roadFactor', roadFactor, 1, 3), within('speedMph', speedMph, 1, 80));
  return refused ?? success({ roadFactor, speedMph, assumed });
}

/** Minutes to drive `straightM` metres as the crow flies. */
export function minutesForDistance(straightM: number, travel: SettledTravel): number {
  return ((straightM / metresPerMile) * travel.roadFactor * 60) / travel.speedMph;
}

/** Driving distance and minutes between two places, from straight distance, road factor and speed. */
export function travelBetween(from: GeoPoint, to: GeoPoint, options: TravelOptions = {}): Result<Travel> {
  const settled = settleTravel(options);
  if (!settled.ok) return settled;
  const refused = checkPoint('from', from) ?? checkPoint('to', to);
  if (refused) return refused;
  const { roadFactor, speedMph, assumed } = settled.value;
  const straightM = haversineM(from, to);
  return success({
    straightMi: straightM / metresPerMile,
    roadMi: (straightM / metresPerMile) * roadFactor,
    minutes: minutesForDistance(straightM, settled.value),
    explanation: {
      inputs: {
        fromLatitude: from.latitude,
        fromLongitude: from.longitude,
        toLatitude: to.latitude,
        toLongitude: to.longitude,
        roadFactor,
        speedMph,
      },
      assumed,
      missing: [],
      formulaId: 'travel-great-circle-road-factor',
      sourceIds: ['iugg-mean-radius', 'road-factor', 'town-speed'],
    },
  });
}
