import { type Failure, type Result, success, within } from '@rimeward/units';
import { firstFailure } from '../explain/first-failure';

/** A place on the ground in degrees, WGS 84; north and east are positive. */
export interface GeoPoint {
  latitude: number;
  longitude: number;
}

/** Mean radius of the earth, m (iugg-mean-radius). */
export const meanEarthRadiusM = 6_371_008.8;

const radiansPerDegree = Math.PI / 180;

/** Refuses a place that is not on the globe; `field` names it in the failure. */
export function checkPoint(field: string, point: GeoPoint): Failure | undefined {
  return firstFailure(
    within(`${field}.latitude`, point.latitude, -90, 90),
    within(`${field}.longitude`, point.longitude, -180, 180),
  );
}

/**
 * Straight distance over the ground between two places, m: haversine on a sphere of the mean radius, within 0.6 % of
 * the distance on the WGS 84 ellipsoid.
 */
export function greatCircleM(from: GeoPoint, to: GeoPoint): Result<number> {
  const refused = checkPoint('from', from) ?? checkPoint('to', to);
  return refused ?? success(haversineM(from, to));
}

/** The haversine distance, m, of two places already known to be on the globe. */
export function haversineM(from: GeoPoint, to: GeoPoint): number {
  const latitudeFrom = from.latitude * radiansPerDegree;
  const latitudeTo = to.latitude * radiansPerDegree;
  const halfRise = Math.sin((latitudeTo - latitudeFrom) / 2);
  const halfTurn = Math.sin(((to.longitude - from.longitude) * radiansPerDegree) / 2);
  const chord = halfRise * halfRise + Math.cos(latitudeFrom) * Math.cos(latitudeTo) * halfTurn * halfTurn;
  return 2 * meanEarthRadiusM * Math.asin(Math.min(1, Math.sqrt(chord)));
}
