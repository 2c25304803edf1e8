import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Typography from '@mui/material/Typography';
import { useEffect, useState } from 'react';
import { useTranslation } from 'react-i18next';
import { Workbox } from 'workbox-window';
import { workerAddress } from './worker-address';
import { useQuietMoment } from './quiet-moment';

/** Registers the service worker, and offers a waiting version only in a quiet moment: no draft, no camera, no air. */
export function UpdatePrompt() {
  const { t } = useTranslation();
  const [worker, setWorker] = useState<Workbox | null>(null);
  const quiet = useQuietMoment();

  useEffect(() => {
    if (!('serviceWorker' in navigator) || import.meta.env.DEV) return;
    const workbox = new Workbox(workerAddress());
    workbox.addEventListener('waiting', () => setWorker(workbox));
    let reloading = false;
    workbox.addEventListener('controlling', (event) => {
      if (!event.isUpdate || reloading) return;
      reloading = true;
      window.location.reload();
    });
    void workbox.register();
  }, []);

  if (!worker || !quiet) return null;
  return (
    <Box
      role="status"
      sx={{ bgcolor: 'background.paper', borderBottom: 2, borderColor: 'primary.main', p: 2 }}
    >
      <Typography>{t('update.ready')}</Typography>
      <Button variant="contained" onClick={() => worker.messageSkipWaiting()}>
        {t('update.take')}
      </Button>
    </Box>
  );
}
