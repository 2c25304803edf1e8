import { outOfRange, success, within, type Failure, type Result } from '@rimeward/units';
import { explain, type Assumption, type Explained } from '../explain/explanation';
import type { OrderedZoneInput } from './ordered-zone';
import { reasonOf, type PlaceReason } from './place-reason';
import { spanOf } from './span';

/** How much height and distance count; their sum need not be 1. */
export interface OrderWeights {
  elevationWeight: number;
  distanceWeight: number;
}

/** Height counts more: water that stays above runs back down (common practice; the figures are ours). */
export const usualOrderWeights: OrderWeights = { elevationWeight: 0.6, distanceWeight: 0.4 };

/** A zone's place. */
export interface ZonePlace {
  zoneId: string;
  /** From 1. */
  place: number;
  /** 0 to 1; null where neither height nor distance is known. */
  scoreRatio: number | null;
  reason: PlaceReason;
}

/** Order of a system's zones. */
export interface ZoneOrder extends Explained {
  places: readonly ZonePlace[];
}

/** A zone with its standing among the others, 0 to 1; half where a figure is missing. */
interface Scored {
  zone: OrderedZoneInput;
  score: number | null;
}

/**
 * Highest and farthest zone first, then back towards the air connection: score = weighted mean of elevation and distance, each from 0 to 1 over
 * the zones of the system. A missing figure counts as the middle and is named; a zone without either goes last. Ties go to the farther zone,
 * then to the lower number. Refuses doubled ids. Source: highest-farthest-first (common practice).
 */
export function zoneOrder(
  zones: readonly OrderedZoneInput[],
  weights: OrderWeights = usualOrderWeights,
): Result<ZoneOrder> {
  const impossible = check(zones, weights);
  if (impossible) return impossible;
  const elevations = spanOf(zones.map((zone) => zone.elevationFt));
  const distances = spanOf(zones.map((zone) => zone.distanceFt));
  const { elevationWeight, distanceWeight } = weights;
  const scored = zones.map((zone): Scored => {
    if (zone.elevationFt === null && zone.distanceFt === null) return { zone, score: null };
    const weighted =
      elevationWeight * elevations.share(zone.elevationFt) +
      distanceWeight * distances.share(zone.distanceFt);
    return { zone, score: weighted / (elevationWeight + distanceWeight) };
  });
  scored.sort(before);
  const places = scored.map(({ zone, score }, at): ZonePlace => {
    const previous = scored[at - 1];
    const tied = previous !== undefined && score !== null && previous.score === score;
    return {
      zoneId: zone.id,
      place: at + 1,
      scoreRatio: score,
      reason: reasonOf(zone, {
        elevations,
        distances,
        tied,
        first: at === 0,
        last: at === scored.length - 1,
      }),
    };
  });
  const missing = zones.flatMap((zone) => [
    ...(zone.elevationFt === null ? [`${zone.id}.elevationFt`] : []),
    ...(zone.distanceFt === null ? [`${zone.id}.distanceFt`] : []),
  ]);
  return success({
    places,
    why: explain(
      'zone-order',
      { zones: zones.length, elevationWeight, distanceWeight },
      middle(missing),
      missing,
    ),
  });
}

const middle = (missing: readonly string[]): Assumption[] =>
  missing.map((field) => ({ field, value: null, why: 'middle-of-the-range' }));

function before(a: Scored, b: Scored): number {
  if (a.score === null || b.score === null) {
    if (a.score !== b.score) return a.score === null ? 1 : -1;
    return a.zone.number - b.zone.number;
  }
  return (
    b.score - a.score ||
    (b.zone.distanceFt ?? 0) - (a.zone.distanceFt ?? 0) ||
    a.zone.number - b.zone.number ||
    (a.zone.id < b.zone.id ? -1 : 1)
  );
}

function check(zones: readonly OrderedZoneInput[], weights: OrderWeights): Failure | null {
  if (new Set(zones.map((zone) => zone.id)).size !== zones.length) return outOfRange('zones', 'each id once');
  const sum = weights.elevationWeight + weights.distanceWeight;
  const failure =
    within('elevationWeight', weights.elevationWeight, 0, 100) ??
    within('distanceWeight', weights.distanceWeight, 0, 100) ??
    within('weights', sum, 1e-9, 200);
  if (failure) return failure;
  for (const { id, elevationFt, distanceFt } of zones) {
    const impossible =
      (elevationFt === null ? null : within(`${id}.elevationFt`, elevationFt, -500, 500)) ??
      (distanceFt === null ? null : within(`${id}.distanceFt`, distanceFt, 0, 20_000));
    if (impossible) return impossible;
  }
  return null;
}
