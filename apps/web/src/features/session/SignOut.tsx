import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { useLiveQuery } from 'dexie-react-hooks';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { deliverNow } from '../../phone/delivery/runner';
import { lockOnSignOut, unsentWork } from '../../phone/device/sign-out';
import { downloadBundle } from '../../phone/export/bundle';
import { endSession } from './session-api';

/** Sign-out. Unsent work is never destroyed: the person chooses to keep it here, deliver it, or save a copy. */
export function SignOut() {
  const { t } = useTranslation();
  const unsent = useLiveQuery(() => unsentWork(), []);
  const [asking, setAsking] = useState(false);

  async function leave(): Promise<void> {
    await endSession();
    await lockOnSignOut();
  }

  if (!asking || !unsent) {
    return (
      <Button
        variant="outlined"
        fullWidth
        onClick={() => {
          if (unsent && unsent.entries + unsent.photos > 0) setAsking(true);
          else void leave();
        }}
      >
        {t('signOut.action')}
      </Button>
    );
  }
  return (
    <Box
      role="alertdialog"
      aria-label={t('signOut.action')}
      sx={{ border: 3, borderColor: 'warning.main', p: 2 }}
    >
      <Stack spacing={2}>
        <Typography sx={{ fontWeight: 600 }}>
          {t('signOut.unsent', { entries: unsent.entries, photos: unsent.photos })}
        </Typography>
        <Button
          variant="contained"
          onClick={() => {
            setAsking(false);
            void deliverNow();
          }}
        >
          {t('signOut.deliver')}
        </Button>
        <Button variant="outlined" onClick={() => void downloadBundle()}>
          {t('signOut.export')}
        </Button>
        <Button variant="outlined" onClick={() => void leave()}>
          {t('signOut.keep')}
        </Button>
      </Stack>
    </Box>
  );
}
