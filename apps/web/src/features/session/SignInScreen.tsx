import Alert from '@mui/material/Alert';
import Box from '@mui/material/Box';
import Button from '@mui/material/Button';
import Stack from '@mui/material/Stack';
import Typography from '@mui/material/Typography';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { chooseLanguage } from '../../app/i18n/i18n';
import { FormTextField } from '../../components/FormTextField';
import { MainAction } from '../../components/MainAction';
import { signIn, type SignInFault } from './session-api';

/** Sign-in, in both languages from the first word on. A failed attempt keeps what was typed. */
export function SignInScreen({ onDone }: { onDone: () => void }) {
  const { t, i18n } = useTranslation();
  const [fault, setFault] = useState<SignInFault | null>(null);
  const [shown, setShown] = useState(false);
  const form = useForm({ defaultValues: { email: '', password: '' } });
  const busy = form.formState.isSubmitting;
  const other = i18n.language.startsWith('es') ? 'en' : 'es';

  const submit = form.handleSubmit(async ({ email, password }) => {
    setFault(null);
    const found = await signIn({ email: email.trim(), password });
    setFault(found);
    if (found === null) onDone();
  });

  return (
    <Box
      sx={{
        maxWidth: 480,
        mx: 'auto',
        p: 3,
        minHeight: '100dvh',
        display: 'grid',
        alignContent: 'center',
        gap: 4,
      }}
    >
      <Stack direction="row" sx={{ justifyContent: 'space-between', alignItems: 'center' }}>
        <Box>
          <Typography variant="h1" sx={{ fontSize: 40, color: 'primary.main' }}>
            Rimeward
          </Typography>
          <Typography>{t('signIn.lead')}</Typography>
        </Box>
        <Button variant="outlined" lang={other} onClick={() => void chooseLanguage(other)}>
          {other === 'es' ? 'Español' : 'English'}
        </Button>
      </Stack>
      <Stack component="form" spacing={3} noValidate onSubmit={(event) => void submit(event)}>
        <FormTextField
          control={form.control}
          name="email"
          type="email"
          label={t('signIn.email')}
          required={t('signIn.emailMissing')}
          autoComplete="username"
        />
        <FormTextField
          control={form.control}
          name="password"
          type={shown ? 'text' : 'password'}
          label={t('signIn.password')}
          required={t('signIn.passwordMissing')}
          autoComplete="current-password"
        />
        <Button onClick={() => setShown(!shown)}>{t(shown ? 'signIn.hide' : 'signIn.show')}</Button>
        {fault && (
          <Alert severity="error" icon={false} variant="filled" sx={{ fontSize: 18 }}>
            {faultText(fault)}
          </Alert>
        )}
        <MainAction type="submit" disabled={busy}>
          {busy ? t('signIn.working') : t('signIn.submit')}
        </MainAction>
      </Stack>
      <Typography variant="body2">{t('signIn.offlineKeeps')}</Typography>
    </Box>
  );

  function faultText(found: SignInFault): string {
    if (found === 'no-office') return t('noOffice');
    if (found === 'enrol-refused') return t('signIn.enrolRefused');
    return t(`problems.${found}`);
  }
}
