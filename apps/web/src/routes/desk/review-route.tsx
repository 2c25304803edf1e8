import { QueueScreen } from '../../features/review/QueueScreen';
export { RouteFault as ErrorBoundary } from '../../app/RouteFault';

export function Component() {
  return <QueueScreen />;
}
