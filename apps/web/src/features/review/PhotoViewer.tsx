import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import Typography from '@mui/material/Typography';
import type { VisitRecord } from '@rimeward/contracts';
import { useTranslation } from 'react-i18next';
import { sizeText } from '../../app/format/size-text';

interface Props {
  photos: VisitRecord['photos'];
  onClose: () => void;
}

/** One photograph large, or two side by side, with the facts of the file below each. */
export function PhotoViewer({ photos, onClose }: Props) {
  const { t } = useTranslation('review');
  return (
    <Dialog open fullScreen onClose={onClose} aria-label={t('record.photos')}>
      <Box sx={{ display: 'grid', gridTemplateRows: 'auto 1fr', height: '100%', p: 2, gap: 2 }}>
        <Button variant="outlined" onClick={onClose} autoFocus sx={{ justifySelf: 'end' }}>
          {t('record.close')}
        </Button>
        <Box
          sx={{
            display: 'grid',
            gap: 2,
            minHeight: 0,
            gridTemplateColumns: { xs: '1fr', md: `repeat(${photos.length}, minmax(0, 1fr))` },
          }}
        >
          {photos.map((photo) => (
            <PhotoLarge key={photo.sha256} photo={photo} />
          ))}
        </Box>
      </Box>
    </Dialog>
  );
}

function PhotoLarge({ photo }: { photo: Props['photos'][number] }) {
  const { t, i18n } = useTranslation('review');
  const facts = Object.entries(photo.exif ?? {})
    .filter(([, value]) => typeof value === 'string' || typeof value === 'number')
    .slice(0, 8);
  return (
    <Box sx={{ display: 'grid', gridTemplateRows: 'minmax(0, 1fr) auto', minHeight: 0, gap: 1 }}>
      <img
        src={`/api/photos/${photo.sha256}/preview`}
        alt={t('record.photoAlt', { number: 1 })}
        style={{ width: '100%', height: '100%', objectFit: 'contain' }}
      />
      <Box>
        <Typography variant="body2">
          {t('record.bytes', { size: sizeText(photo.bytes, i18n.language), hash: photo.sha256.slice(0, 16) })}
        </Typography>
        {facts.length > 0 && (
          <Typography variant="body2">
            {facts.map(([name, value]) => `${name}: ${String(value)}`).join(' · ')}
          </Typography>
        )}
        <Button href={`/api/photos/${photo.sha256}/original`} target="_blank" rel="noreferrer">
          {t('record.original')}
        </Button>
      </Box>
    </Box>
  );
}
