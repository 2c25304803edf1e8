import Alert from '@mui/material/Alert';
import Button from '@mui/material/Button';
import { useTranslation } from 'react-i18next';
import { Link, useLocation } from 'react-router-dom';
import { ReviewFault } from './api';

/** The office did not answer: said plainly, with the way to ask again. */
export function AskAgain({ error, onAgain }: { error: Error | null; onAgain: () => void }) {
  const { t } = useTranslation('review');
  const { t: shell } = useTranslation();
  const { pathname, search } = useLocation();
  const code = error instanceof ReviewFault ? error.code : 'no-office';
  const signedOut = code === 'not-signed-in' || code === 'session-ended';
  return (
    <Alert
      severity="error"
      icon={false}
      variant="filled"
      sx={{ my: 2, fontSize: 18 }}
      action={
        signedOut ? (
          <Button
            color="inherit"
            component={Link}
            to={`/sign-in?again=${encodeURIComponent(pathname + search)}`}
          >
            {t('signIn')}
          </Button>
        ) : (
          <Button color="inherit" onClick={onAgain}>
            {t('again')}
          </Button>
        )
      }
    >
      {code === 'no-office' ? t('failed') : shell(`problems.${code}`)}
    </Alert>
  );
}
