import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useLiveQuery } from 'dexie-react-hooks';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { useDates } from '../../app/i18n/use-dates';
import { deliveryStatus, type DeliveryStatus } from '../../phone/delivery/status';

/** One line at the top of every phone screen: what is still here, and when the office was last reached. In words. */
export function ConnectionLine() {
  const { t } = useTranslation();
  const dates = useDates();
  const status = useLiveQuery(() => deliveryStatus(), []);
  if (!status) return null;
  const contact =
    status.lastContactMs === null
      ? t('connection.noContact')
      : t('connection.contact', { when: dates.time(status.lastContactMs) });
  return (
    <Box sx={{ bgcolor: 'background.paper', borderBottom: 1, borderColor: 'divider' }}>
      <Button
        component={Link}
        to="/on-this-phone"
        fullWidth
        sx={{ minHeight: 56, py: 0.5 }}
        data-connection={status.phase}
      >
        <Typography variant="body2" component="span" sx={{ fontWeight: 600 }}>
          {`${standing(status)} · ${contact}`}
        </Typography>
      </Button>
    </Box>
  );

  function standing({ phase, pendingEntries, pendingPhotos, held, reason }: DeliveryStatus): string {
    if (reason === 'sign-in') return t('connection.signInAgain');
    if (pendingEntries > 0 || pendingPhotos > 0) {
      if (phase === 'sending') return t('connection.sending');
      return pendingEntries > 0
        ? t('connection.waiting', { count: pendingEntries })
        : t('connection.photos', { count: pendingPhotos });
    }
    return held > 0 ? t('connection.held', { count: held }) : t('connection.delivered');
  }
}
