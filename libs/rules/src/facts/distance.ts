interface Place {
  latitude: number;
  longitude: number;
}

/** Mean radius of the earth, m (IUGG). */
const earthRadiusM = 6_371_008.8;

/** Distance along the sphere by the haversine formula, m; within 0.6 % of the ellipsoid. */
export function distanceM(from: Place, to: Place): number {
  const radians = Math.PI / 180;
  const northing = Math.sin(((to.latitude - from.latitude) * radians) / 2);
  const easting = Math.sin(((to.longitude - from.longitude) * radians) / 2);
  const half =
    northing ** 2 + Math.cos(from.latitude * radians) * Math.cos(to.latitude * radians) * easting ** 2;
  return 2 * earthRadiusM * Math.asin(Math.min(1, Math.sqrt(half)));
}
