import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import type { VisitRecord } from '@rimeward/contracts';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { PhotoViewer } from './PhotoViewer';

/** The visit's photographs; one tap enlarges, two marked ones are compared side by side. */
export function PhotosPanel({ record }: { record: VisitRecord }) {
  const { t } = useTranslation('review');
  const [marked, setMarked] = useState<string[]>([]);
  const [shown, setShown] = useState<string[]>([]);
  const { photos } = record;

  function mark(sha256: string): void {
    setMarked(
      marked.includes(sha256) ? marked.filter((one) => one !== sha256) : [...marked, sha256].slice(-2),
    );
  }

  return (
    <Box component="section">
      <Typography variant="h2">{`${t('record.photos')} (${photos.length})`}</Typography>
      {photos.length === 0 && <Typography>{t('record.noPhotos')}</Typography>}
      {photos.length > 1 && (
        <Box sx={{ display: 'flex', gap: 2, alignItems: 'center', my: 1 }}>
          <Button variant="outlined" disabled={marked.length !== 2} onClick={() => setShown(marked)}>
            {t('record.compare')}
          </Button>
          <Typography variant="body2">{t('record.compareHint')}</Typography>
        </Box>
      )}
      <Box sx={{ display: 'grid', gridTemplateColumns: 'repeat(2, minmax(0, 1fr))', gap: 2 }}>
        {photos.map((photo, index) => (
          <Box key={photo.sha256}>
            {photo.complete ? (
              <Box
                component="button"
                onClick={() => setShown([photo.sha256])}
                sx={{
                  p: 0,
                  border: 0,
                  width: '100%',
                  aspectRatio: '4 / 3',
                  bgcolor: 'divider',
                  cursor: 'zoom-in',
                  display: 'block',
                }}
              >
                <img
                  src={`/api/photos/${photo.sha256}/preview`}
                  alt={t('record.photoAlt', { number: index + 1 })}
                  loading="lazy"
                  style={{ width: '100%', height: '100%', objectFit: 'cover', display: 'block' }}
                />
              </Box>
            ) : (
              <Box
                sx={{ aspectRatio: '4 / 3', border: 2, borderStyle: 'dashed', borderColor: 'divider', p: 1 }}
              >
                <Typography>{t('record.photoMissing')}</Typography>
              </Box>
            )}
            <Button
              fullWidth
              disabled={!photo.complete}
              aria-pressed={marked.includes(photo.sha256)}
              onClick={() => mark(photo.sha256)}
            >
              {`${marked.includes(photo.sha256) ? '✓ ' : ''}${t('record.compare')}`}
            </Button>
            {photo.alsoOnVisits.length > 0 && (
              <Typography
                sx={{ color: 'error.main', fontWeight: 600 }}
              >{`▲ ${t('record.reused')}`}</Typography>
            )}
          </Box>
        ))}
      </Box>
      {shown.length > 0 && (
        <PhotoViewer
          photos={photos.filter(({ sha256 }) => shown.includes(sha256))}
          onClose={() => setShown([])}
        />
      )}
    </Box>
  );
}
