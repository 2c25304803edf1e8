import { useParams } from 'react-router-dom';
import { useSession } from '../../features/session/session-context';
import { dayIn } from '../../features/today/day';
import { TodayScreen } from '../../features/today/TodayScreen';
import { addTexts } from '../../app/i18n/i18n';
import en from '../../features/today/texts.en';
import es from '../../features/today/texts.es';
export { RouteFault as ErrorBoundary } from '../../app/RouteFault';

addTexts('today', { en, es });

/** The technician's first screen: today, or another day of the same stops. */
export function Component() {
  const { day } = useParams();
  const { enrolment } = useSession();
  if (!enrolment) return null;
  const today = dayIn(enrolment.company.settings.timeZone, Date.now());
  return <TodayScreen key={day ?? today} day={day ?? today} today={today} />;
}
