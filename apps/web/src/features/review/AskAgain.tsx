import Alert from '@mui/material/Alert';
import Button from '@mui/material/Button';
import { useTranslation } from 'react-i18next';

/** The office did not answer: said plainly, with the way to ask again. */
export function AskAgain({ onAgain }: { onAgain: () => void }) {
  const { t } = useTranslation('review');
  return (
    <Alert
      severity="error"
      icon={false}
      variant="filled"
      sx={{ my: 2, fontSize: 18 }}
      action={
        <Button color="inherit" onClick={onAgain}>
          {t('again')}
        </Button>
      }
    >
      {t('failed')}
    </Alert>
  );
}
