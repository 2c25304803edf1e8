import { addTexts } from '../app/i18n/i18n';
import { useSession } from '../features/session/session-context';
import { SignOut } from '../features/session/SignOut';
import { SettingsScreen } from '../features/settings/SettingsScreen';
import en from '../features/settings/texts.en';
import es from '../features/settings/texts.es';
export { RouteFault as ErrorBoundary } from '../app/RouteFault';

addTexts('settings', { en, es });

/** Settings of this browser, and sign-out. */
export function Component() {
  const { enrolment } = useSession();
  if (!enrolment) return null;
  const person = { name: enrolment.user.name, company: enrolment.company.name };
  return (
    <SettingsScreen person={person} back="/">
      <SignOut />
    </SettingsScreen>
  );
}
