import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { useRef, type ChangeEvent } from 'react';
import { useTranslation } from 'react-i18next';
import { Thumbnail } from './Thumbnail';

interface Props {
  label: string;
  busy: boolean;
  error: string | null;
  photos: { id: string }[];
  /** The stored bytes of a photograph; null when they are not on this phone. */
  load: (id: string) => Promise<Blob | null>;
  onFiles: (files: File[], source: 'camera' | 'gallery') => void;
  onRemove: (id: string) => void;
}

/** Takes photographs with the camera or from the gallery and shows what has been stored. */
export function PhotoField({ label, busy, error, photos, load, onFiles, onRemove }: Props) {
  const { t } = useTranslation();
  const camera = useRef<HTMLInputElement>(null);
  const gallery = useRef<HTMLInputElement>(null);

  const taken = (source: 'camera' | 'gallery') => (event: ChangeEvent<HTMLInputElement>) => {
    const files = [...(event.target.files ?? [])];
    event.target.value = '';
    if (files.length > 0) onFiles(files, source);
  };

  return (
    <Stack spacing={1.5}>
      <Typography variant="h3" component="h2">
        {label}
      </Typography>
      <input
        ref={camera}
        type="file"
        accept="image/*"
        capture="environment"
        hidden
        aria-label={label}
        data-photo="camera"
        onChange={taken('camera')}
      />
      <input
        ref={gallery}
        type="file"
        accept="image/*"
        multiple
        hidden
        aria-label={label}
        data-photo="gallery"
        onChange={taken('gallery')}
      />
      <Stack direction="row" spacing={2}>
        <Button
          variant="outlined"
          fullWidth
          disabled={busy}
          onClick={() => camera.current?.click()}
          sx={{ minHeight: 96 }}
        >
          {busy ? t('photoStoring') : t('photoTake')}
        </Button>
        <Button
          variant="outlined"
          fullWidth
          disabled={busy}
          onClick={() => gallery.current?.click()}
          sx={{ minHeight: 96 }}
        >
          {t('photoChoose')}
        </Button>
      </Stack>
      {error && (
        <Typography role="alert" sx={{ color: 'error.main', fontWeight: 600 }}>
          {error}
        </Typography>
      )}
      {photos.length > 0 && (
        <Box sx={{ display: 'grid', gridTemplateColumns: 'repeat(2, minmax(0, 1fr))', gap: 2 }}>
          {photos.map((photo, index) => (
            <Box key={photo.id}>
              <Thumbnail id={photo.id} load={load} alt={`${label} ${index + 1}`} />
              <Button fullWidth onClick={() => onRemove(photo.id)}>
                {t('photoRemove')}
              </Button>
            </Box>
          ))}
        </Box>
      )}
    </Stack>
  );
}
