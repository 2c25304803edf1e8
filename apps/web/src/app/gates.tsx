import type { Role } from '@rimeward/contracts';
import { Navigate, Outlet, useLocation } from 'react-router-dom';
import { useSession } from '../features/session/session-context';

function startOf(role: Role): string {
  return role === 'technician' ? '/today' : '/review';
}

/** From the bare address to the first screen of the person's role. */
export function StartRedirect() {
  const { enrolment } = useSession();
  return <Navigate to={enrolment ? startOf(enrolment.user.role) : '/sign-in'} replace />;
}

/**
 * The sign-in screen; whoever has signed in goes on to where he wanted to be. With `?again` it also opens for somebody whose
 * session at the office has ended while his phone still knows him.
 */
export function SignedOutGate() {
  const { enrolment } = useSession();
  const location = useLocation();
  const wanted = (location.state as { wanted?: string } | null)?.wanted;
  if (!enrolment || new URLSearchParams(location.search).has('again')) return <Outlet />;
  return <Navigate to={wanted ?? startOf(enrolment.user.role)} replace />;
}

/** Screens of some roles. The office checks again with every request; this only keeps people from dead ends. */
export function RoleGate({ roles }: { roles: Role[] }) {
  const { enrolment } = useSession();
  const { pathname, search } = useLocation();
  if (!enrolment) return <Navigate to="/sign-in" state={{ wanted: pathname + search }} replace />;
  if (!roles.includes(enrolment.user.role)) return <Navigate to={startOf(enrolment.user.role)} replace />;
  return <Outlet />;
}
