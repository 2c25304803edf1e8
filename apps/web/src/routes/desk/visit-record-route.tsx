import { useParams } from 'react-router-dom';
import { RecordScreen } from '../../features/review/RecordScreen';
export { RouteFault as ErrorBoundary } from '../../app/RouteFault';

export function Component() {
  const { visitId = '' } = useParams();
  return <RecordScreen key={visitId} visitId={visitId} />;
}
