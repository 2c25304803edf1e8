import { createContext, useContext } from 'react';
import type { Enrolment } from '../../phone/device/enrolment';

export interface SessionState {
  /** Who works with this browser; null before sign-in and after sign-out. It holds without an office, too. */
  enrolment: Enrolment | null;
}

export const SessionContext = createContext<SessionState>({ enrolment: null });

export function useSession(): SessionState {
  return useContext(SessionContext);
}
