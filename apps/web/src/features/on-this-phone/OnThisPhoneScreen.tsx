import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useLiveQuery } from 'dexie-react-hooks';
import { useTranslation } from 'react-i18next';
import { Link } from 'react-router-dom';
import { useDates } from '../../app/i18n/use-dates';
import { MainAction } from '../../components/MainAction';
import { PhoneScreen } from '../../components/PhoneScreen';
import { deliverNow } from '../../phone/delivery/runner';
import { deliveryStatus, type DeliveryStatus } from '../../phone/delivery/status';
import { downloadBundle } from '../../phone/export/bundle';
import { outboxItems } from '../../phone/queries/outbox';
import { OutboxRow } from './OutboxRow';
import { sizeText } from '../../app/format/size-text';
import { StorageLine } from './StorageLine';

/** What has not reached the office, why, how big; deliver by hand; save a copy. */
export function OnThisPhoneScreen() {
  const { t } = useTranslation('on-this-phone');
  const status = useLiveQuery(() => deliveryStatus(), []);
  const items = useLiveQuery(() => outboxItems(500), []) ?? [];
  return (
    <PhoneScreen
      title={t('title')}
      back="/today"
      action={
        <MainAction disabled={status?.phase === 'sending'} onClick={() => void deliverNow()}>
          {status?.phase === 'sending' ? t('delivering') : t('deliverNow')}
        </MainAction>
      }
    >
      {status && <Summary status={status} />}
      {status?.reason === 'sign-in' && (
        <Button component={Link} to="/sign-in?again=/on-this-phone" variant="contained" fullWidth>
          {t('signInAgain')}
        </Button>
      )}
      <Box component="ul" sx={{ listStyle: 'none', p: 0, m: 0 }}>
        {items.map((item) => (
          <OutboxRow key={item.id} item={item} />
        ))}
      </Box>
      <StorageLine />
      <Button variant="outlined" fullWidth onClick={() => void downloadBundle()}>
        {t('exportAll')}
      </Button>
    </PhoneScreen>
  );
}

function Summary({ status }: { status: DeliveryStatus }) {
  const { t, i18n } = useTranslation('on-this-phone');
  const dates = useDates();
  const waiting = status.pendingEntries > 0 || status.pendingPhotos > 0;
  return (
    <Box>
      <Typography variant="h2">
        {waiting
          ? t('waiting', {
              entries: status.pendingEntries,
              photos: status.pendingPhotos,
              size: sizeText(status.pendingBytes, i18n.resolvedLanguage ?? 'en'),
            })
          : t('nothing')}
      </Typography>
      {status.oldestPendingMs !== null && (
        <Typography>{t('since', { when: dates.moment(status.oldestPendingMs) })}</Typography>
      )}
      {status.reason && (
        <Typography role="status" sx={{ fontWeight: 600 }}>
          {t(`reasons.${status.reason}`, { defaultValue: t('reasons.unknown') })}
        </Typography>
      )}
      <Typography>
        {status.lastContactMs === null
          ? t('neverContact')
          : t('lastContact', { when: dates.moment(status.lastContactMs) })}
      </Typography>
    </Box>
  );
}
