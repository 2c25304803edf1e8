import Box from '@mui/material/Box';
import Typography from '@mui/material/Typography';
import type { DevicesResponse } from '@rimeward/contracts';
import { useQuery } from '@tanstack/react-query';
import { useTranslation } from 'react-i18next';
import { sizeText } from '../../app/format/size-text';
import { useDates } from '../../app/i18n/use-dates';
import { fetchDevices } from './api';
import { AskAgain } from './AskAgain';

type PhoneDevice = DevicesResponse['devices'][number];

/** What is still on a phone, since when, how big: told by the phones themselves with every contact. */
export function PhonesPanel() {
  const { t } = useTranslation('review');
  const phones = useQuery({ queryKey: ['devices'], queryFn: fetchDevices, refetchInterval: 30_000 });
  const waiting = (phones.data?.devices ?? []).filter(
    ({ manifest }) => manifest && (manifest.pendingEntries > 0 || manifest.pendingPhotos > 0),
  );
  return (
    <Box component="section">
      <Typography variant="h2">{t('phones.title')}</Typography>
      {phones.isError && <AskAgain error={phones.error} onAgain={() => void phones.refetch()} />}
      {phones.data && waiting.length === 0 && <Typography>{t('phones.none')}</Typography>}
      {waiting.map((device) => (
        <PhoneLine key={device.id} device={device} />
      ))}
    </Box>
  );
}

function PhoneLine({
  device: { manifest, userName, name, revoked, lastContactAt },
}: {
  device: PhoneDevice;
}) {
  const { t, i18n } = useTranslation('review');
  const dates = useDates();
  if (!manifest) return null;
  const when = (iso: string) => dates.moment(Date.parse(iso));
  return (
    <Box sx={{ borderTop: 1, borderColor: 'divider', py: 1 }}>
      <Typography sx={{ fontWeight: 600 }}>
        {userName === name ? userName : `${userName} · ${name}`}
        {revoked ? ` · ${t('phones.revoked')}` : ''}
      </Typography>
      <Typography variant="body2">
        {t('phones.line', {
          entries: manifest.pendingEntries,
          photos: manifest.pendingPhotos,
          size: sizeText(manifest.pendingBytes, i18n.language),
        })}
      </Typography>
      {manifest.oldestPendingWall && (
        <Typography variant="body2">
          {t('phones.since', { when: when(manifest.oldestPendingWall) })}
        </Typography>
      )}
      {lastContactAt && (
        <Typography variant="body2">{t('phones.contact', { when: when(lastContactAt) })}</Typography>
      )}
    </Box>
  );
}
