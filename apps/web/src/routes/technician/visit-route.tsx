import { useNavigate, useParams } from 'react-router-dom';
import { useSession } from '../../features/session/session-context';
import { AirScreen } from '../../features/visit/air/AirScreen';
import { LogScreen } from '../../features/visit/log/LogScreen';
import { VisitLogProvider } from '../../features/visit/log/VisitLogProvider';
import { SiteScreen } from '../../features/visit/site/SiteScreen';
import { ArriveStep } from '../../features/visit/steps/ArriveStep';
import { CloseDownStep } from '../../features/visit/steps/CloseDownStep';
import { ConnectStep, PeopleClearStep, RegulatorStep } from '../../features/visit/steps/ConnectStep';
import { DefectsStep } from '../../features/visit/steps/DefectsStep';
import { LeaveStep } from '../../features/visit/steps/LeaveStep';
import { ValvesStep } from '../../features/visit/steps/ValvesStep';
import { WalkThroughStep } from '../../features/visit/steps/WalkThroughStep';
import { WaterStep } from '../../features/visit/steps/WaterStep';
import { WinterStep } from '../../features/visit/steps/WinterStep';
import { VisitHome } from '../../features/visit/VisitHome';
import { addTexts } from '../../app/i18n/i18n';
import logEn from '../../app/log-words/texts.en';
import logEs from '../../app/log-words/texts.es';
import en from '../../features/visit/texts.en';
import es from '../../features/visit/texts.es';
export { RouteFault as ErrorBoundary } from '../../app/RouteFault';

addTexts('visit', { en, es });
addTexts('log', { en: logEn, es: logEs });

/** One visit on the phone: the list of work, or one step of it. Everything below reads the same visit log. */
export function Component() {
  const { visitId = '', step } = useParams();
  const { enrolment } = useSession();
  if (!enrolment) return null;
  return (
    <VisitLogProvider key={visitId} visitId={visitId} enrolment={enrolment}>
      <VisitScreen visitId={visitId} step={step} />
    </VisitLogProvider>
  );
}

function VisitScreen({ visitId, step }: { visitId: string; step: string | undefined }) {
  const navigate = useNavigate();
  const home = () => void navigate(`/visit/${visitId}`);
  switch (step) {
    case 'arrive':
      return <ArriveStep onDone={home} />;
    case 'walk-through':
      return <WalkThroughStep onDone={home} />;
    case 'water-off':
    case 'relief':
      return <WaterStep onDone={home} />;
    case 'backflow-before-air':
      return <ValvesStep stage="before-air" onDone={home} />;
    case 'connect':
      return <ConnectStep onDone={home} />;
    case 'regulator':
      return <RegulatorStep onDone={home} />;
    case 'people-clear':
      return <PeopleClearStep onDone={home} />;
    case 'air':
      return <AirScreen onDone={home} />;
    case 'close-down':
      return <CloseDownStep onDone={home} />;
    case 'backflow-winter':
      return <ValvesStep stage="winter" onDone={home} />;
    case 'drains':
    case 'pump':
    case 'plug':
    case 'controller':
      return <WinterStep step={step} onDone={home} />;
    case 'leave':
      return <LeaveStep onDone={home} />;
    case 'defects':
      return <DefectsStep />;
    case 'log':
      return <LogScreen />;
    case 'site':
      return <SiteScreen />;
    default:
      return <VisitHome />;
  }
}
