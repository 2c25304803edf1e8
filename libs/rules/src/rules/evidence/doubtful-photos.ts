import { distanceM } from '../../facts/distance';
import { ownRecord, type Rule } from '../../finding/rule';

/** The very same picture, byte for byte, was used on another visit. */
export const photoUsedTwice: Rule<'photo-used-twice'> = {
  id: 'photo-used-twice',
  severity: 'fault',
  basis: ownRecord,
  find({ state, context }, report) {
    const elsewhere = context.photosElsewhere;
    if (!elsewhere) return;
    const entriesOf = new Map<string, string[]>();
    for (const { photo, entryId } of state.photos) {
      if ((elsewhere[photo.sha256]?.length ?? 0) === 0) continue;
      const entryIds = entriesOf.get(photo.sha256);
      if (entryIds) entryIds.push(entryId);
      else entriesOf.set(photo.sha256, [entryId]);
    }
    for (const [sha256, entryIds] of entriesOf) {
      report(entryIds, { sha256, visits: elsewhere[sha256]?.length ?? 0 });
    }
  },
};

/** The phone's own position at the moment of capture lies away from the site. A claim, not a proof. */
export const photoFarFromSite: Rule<'photo-far-from-site'> = {
  id: 'photo-far-from-site',
  severity: 'gap',
  basis: ownRecord,
  find({ state, context, thresholds }, report) {
    const { site } = context;
    if (!site) return;
    const seen = new Set<string>();
    for (const { photo, entryId } of state.photos) {
      if (!photo.takenAt || seen.has(photo.sha256)) continue;
      seen.add(photo.sha256);
      const away = distanceM(site, photo.takenAt);
      if (away - photo.takenAt.accuracyM <= thresholds.photoDistanceM) continue;
      report([entryId], { sha256: photo.sha256, distanceM: Math.round(away) });
    }
  },
};

/** The file says that the picture was taken long before it was logged. A fact about the file, not a proof. */
export const photoTakenEarlier: Rule<'photo-taken-earlier'> = {
  id: 'photo-taken-earlier',
  severity: 'gap',
  basis: ownRecord,
  find({ state, context, standing, placeOf, thresholds }, report) {
    const times = context.photoTakenMs;
    if (!times) return;
    for (const { photo, entryId } of state.photos) {
      const takenMs = times[photo.sha256];
      const loggedMs = standing[placeOf(entryId)]?.atMs;
      if (takenMs === undefined || loggedMs === undefined) continue;
      const hours = (loggedMs - takenMs) / 3_600_000;
      if (hours > thresholds.photoAgeHours) {
        report([entryId], { sha256: photo.sha256, hours: Math.round(hours) });
      }
    }
  },
};

/** Pictures came from the phone's gallery instead of the camera: nobody can tell when they were taken. */
export const photoFromGallery: Rule<'photo-from-gallery'> = {
  id: 'photo-from-gallery',
  severity: 'note',
  basis: ownRecord,
  find({ state }, report) {
    const stored = state.photos.filter(({ photo }) => photo.source === 'gallery');
    if (stored.length > 0) {
      report([...new Set(stored.map(({ entryId }) => entryId))], { photos: stored.length });
    }
  },
};
