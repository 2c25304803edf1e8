import Typography from '@mui/material/Typography';
import { useTranslation } from 'react-i18next';
import { chooseLanguage, languages } from '../../app/i18n/i18n';
import { displayModes } from '../../app/theme/modes';
import { usePreferences } from '../../app/theme/preferences';
import { ChoiceTiles } from '../../components/ChoiceTiles';
import { PhoneScreen } from '../../components/PhoneScreen';
import type { ReactNode } from 'react';

interface Props {
  person: { name: string; company: string };
  back: string;
  /** What the route adds below: sign-out. */
  children: ReactNode;
}

/** Language, display mode and keys of this browser. */
export function SettingsScreen({ person, back, children }: Props) {
  const { t, i18n } = useTranslation('settings');
  const [preferences, change] = usePreferences();
  return (
    <PhoneScreen title={t('title')} subtitle={t('signedIn', person)} back={back}>
      <ChoiceTiles
        label={t('language')}
        options={languages.map((value) => ({ value, label: value === 'en' ? 'English' : 'Español' }))}
        value={i18n.language.startsWith('es') ? 'es' : 'en'}
        onChange={(language) => void chooseLanguage(language)}
      />
      <ChoiceTiles
        label={t('mode')}
        options={displayModes.map((value) => ({ value, label: t(`modes.${value}`) }))}
        value={preferences.mode}
        onChange={(mode) => change({ mode })}
      />
      <ChoiceTiles
        label={t('keys')}
        options={[
          { value: 'on', label: t('keysOn') },
          { value: 'off', label: t('keysOff') },
        ]}
        value={preferences.keys ? 'on' : 'off'}
        onChange={(choice) => change({ keys: choice === 'on' })}
      />
      <Typography variant="body2">Rimeward</Typography>
      {children}
    </PhoneScreen>
  );
}
