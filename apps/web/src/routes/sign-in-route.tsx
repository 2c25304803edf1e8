import { SignInScreen } from '../features/session/SignInScreen';
export { RouteFault as ErrorBoundary } from '../app/RouteFault';

export function Component() {
  return <SignInScreen />;
}
