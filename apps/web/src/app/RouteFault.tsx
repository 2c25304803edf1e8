import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { useTranslation } from 'react-i18next';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';

/** Shown in place of a screen that failed. What was saved is in the database of this phone, not in the screen. */
export function RouteFault() {
  const { t } = useTranslation();
  const error = useRouteError();
  const missing = isRouteErrorResponse(error) && error.status === 404;
  if (!missing) console.error(error);
  return (
    <Box sx={{ maxWidth: 640, mx: 'auto', p: 3 }}>
      <Stack spacing={2}>
        <Typography variant="h1">{t(missing ? 'fault.notFound' : 'fault.title')}</Typography>
        {!missing && <Typography>{t('fault.text')}</Typography>}
        <Button variant="contained" onClick={() => window.location.reload()}>
          {t('database.reload')}
        </Button>
        <Button variant="outlined" href="/">
          {t('fault.home')}
        </Button>
        <Button href="/rescue.html">{t('database.rescue')}</Button>
      </Stack>
    </Box>
  );
}
