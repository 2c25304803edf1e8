import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import { useEffect, useState, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { onDatabaseNotice } from '../phone/database/database';
import type { DatabaseFault } from '../phone/database/faults';
import { openPhone } from '../phone/database/open-phone';

/** Opens the phone's database before anything is shown; when it cannot, the way to save what is in it. */
export function DatabaseGate({ children }: { children: ReactNode }) {
  const { t } = useTranslation();
  const [open, setOpen] = useState(false);
  const [fault, setFault] = useState<DatabaseFault | null>(null);
  const [reloadNeeded, setReloadNeeded] = useState(false);

  useEffect(() => {
    const off = onDatabaseNotice((notice) => {
      if (notice === 'reload-needed') setReloadNeeded(true);
      if (notice === 'blocked') setFault('database-blocked');
    });
    void openPhone().then((opened) => {
      if (opened.ok) {
        setFault(null);
        setOpen(true);
      } else setFault(opened.fault);
    });
    return off;
  }, []);

  if (fault || reloadNeeded) {
    return (
      <Box sx={{ maxWidth: 640, mx: 'auto', p: 3 }}>
        <Stack spacing={2}>
          <Alert severity="error" icon={false} variant="filled" sx={{ fontSize: 18 }}>
            {fault ? t(`database.${fault}`) : t('database.reloadNeeded')}
          </Alert>
          <Button variant="contained" onClick={() => window.location.reload()}>
            {t('database.reload')}
          </Button>
          {fault && <Button href="/rescue.html">{t('database.rescue')}</Button>}
        </Stack>
      </Box>
    );
  }
  return open ? children : null;
}
