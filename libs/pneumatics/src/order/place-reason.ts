import type { OrderedZoneInput } from './ordered-zone';
import type { Span } from './span';

/** Why a zone has its place, as a code that a screen turns into a sentence, with the figures for it. */
export interface PlaceReason {
  code:
    | 'highest-and-farthest'
    | 'highest'
    | 'farthest'
    | 'by-height-and-distance'
    | 'lowest-and-nearest'
    | 'tied'
    | 'height-missing'
    | 'distance-missing'
    | 'nothing-known'
    | 'only-zone';
  params: Readonly<{ elevationFt: number | null; distanceFt: number | null; number: number }>;
}

interface Standing {
  elevations: Span;
  distances: Span;
  tied: boolean;
  first: boolean;
  last: boolean;
}

/** The most telling reason for a place. */
export function reasonOf(zone: OrderedZoneInput, standing: Standing): PlaceReason {
  const { elevationFt, distanceFt, number } = zone;
  return { code: codeOf(zone, standing), params: { elevationFt, distanceFt, number } };
}

function codeOf({ elevationFt, distanceFt }: OrderedZoneInput, standing: Standing): PlaceReason['code'] {
  const { elevations, distances, tied, first, last } = standing;
  if (elevationFt === null && distanceFt === null) return 'nothing-known';
  if (first && last) return 'only-zone';
  if (elevationFt === null) return 'height-missing';
  if (distanceFt === null) return 'distance-missing';
  if (tied) return 'tied';
  const highest = elevationFt === elevations.most && elevations.most > elevations.least;
  const farthest = distanceFt === distances.most && distances.most > distances.least;
  if (highest && farthest) return 'highest-and-farthest';
  if (highest) return 'highest';
  if (farthest) return 'farthest';
  if (last && elevationFt === elevations.least && distanceFt === distances.least) return 'lowest-and-nearest';
  return 'by-height-and-distance';
}
