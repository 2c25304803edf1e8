import type { PhotoReference, PhotoRole } from '@rimeward/field-log';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { PhotoField } from '../../../components/PhotoField';
import { closeIntent, openIntent } from '../../../phone/intents';
import { storePhoto, type PhotoFault } from '../../../phone/photos/intake';
import { positionNow } from '../../../phone/photos/position';
import { readPhoto } from '../../../phone/photos/read-photo';
import { useNoUpdates } from './use-no-updates';
import { useVisitLog } from './visit-log';

interface Props {
  /** Name of the field within the visit, for the draft and for the intent that survives a killed page. */
  field: string;
  role: PhotoRole;
  label: string;
  photos: PhotoReference[];
  onChange: (photos: PhotoReference[]) => void;
}

/** Photographs of one entry that is being written: each is stored and checked on this phone before it shows here. */
export function VisitPhotos({ field, role, label, photos, onChange }: Props) {
  const { t } = useTranslation('visit');
  const { visit } = useVisitLog();
  const [fault, setFault] = useState<PhotoFault | null>(null);
  const [busy, setBusy] = useState(false);
  useNoUpdates(busy);

  async function take(files: File[], source: 'camera' | 'gallery'): Promise<void> {
    setBusy(true);
    setFault(null);
    const intent = await openIntent({ visit: visit.id, field });
    const takenAt = source === 'camera' ? await positionNow() : null;
    let all = photos;
    for (const file of files) {
      const stored = await storePhoto(file, { role, takenAt, source });
      if (!stored.ok) {
        setFault(stored.fault);
        continue;
      }
      if (all.some((photo) => photo.sha256 === stored.photo.sha256)) continue;
      all = [...all, stored.photo];
      onChange(all);
    }
    await closeIntent(intent);
    setBusy(false);
  }

  return (
    <PhotoField
      label={label}
      busy={busy}
      error={fault ? t(`photoFaults.${fault}`) : null}
      photos={photos.map((photo) => ({ id: photo.sha256 }))}
      load={(id) => readPhoto(id)}
      onFiles={(files, source) => void take(files, source)}
      onRemove={(id) => onChange(photos.filter((photo) => photo.sha256 !== id))}
    />
  );
}
