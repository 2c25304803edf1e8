import { OnThisPhoneScreen } from '../../features/on-this-phone/OnThisPhoneScreen';
import { addTexts } from '../../app/i18n/i18n';
import en from '../../features/on-this-phone/texts.en';
import es from '../../features/on-this-phone/texts.es';
export { RouteFault as ErrorBoundary } from '../../app/RouteFault';

addTexts('on-this-phone', { en, es });

/** What has not reached the office yet. */
export function Component() {
  return <OnThisPhoneScreen />;
}
