import type { GeoPoint } from '@rimeward/field-log';

/**
 * Where the phone is now, from its own sensor; null when that is refused, unknown or takes longer than the limit. It never
 * rejects: a photograph without a place is still a photograph.
 */
export function positionNow(limitMs = 3_000): Promise<GeoPoint | null> {
  if (typeof navigator === 'undefined' || navigator.geolocation === undefined) return Promise.resolve(null);
  return new Promise((resolve) => {
    const late = setTimeout(() => resolve(null), limitMs);
    const answer = (point: GeoPoint | null): void => {
      clearTimeout(late);
      resolve(point);
    };
    navigator.geolocation.getCurrentPosition(
      ({ coords: { latitude, longitude, accuracy } }) => answer({ latitude, longitude, accuracyM: accuracy }),
      () => answer(null),
      { enableHighAccuracy: true, timeout: limitMs, maximumAge: 30_000 },
    );
  });
}
