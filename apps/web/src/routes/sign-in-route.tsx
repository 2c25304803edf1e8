import { useNavigate, useSearchParams } from 'react-router-dom';
import { SignInScreen } from '../features/session/SignInScreen';
export { RouteFault as ErrorBoundary } from '../app/RouteFault';

/** Sign-in, and back to the screen that asked for it. */
export function Component() {
  const navigate = useNavigate();
  const [search] = useSearchParams();
  const again = search.get('again');
  // Only addresses within the application: "/today", never "//elsewhere".
  const target = again && /^\/(?![/\\])/.test(again) ? again : '/';
  return <SignInScreen onDone={() => void navigate(target, { replace: true })} />;
}
