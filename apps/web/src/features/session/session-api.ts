import type { ProblemCode, Session, SignInRequest } from '@rimeward/contracts';
import { enterAs } from '../../phone/device/enrol';
import { rememberSession } from '../../phone/device/enrolment';
import { apiFetch, jsonBody } from '../../phone/session/api-fetch';

export type SignInFault = ProblemCode | 'no-office' | 'enrol-refused';

/** Signs in and makes this browser the person's; the fault says what to tell him. */
export async function signIn(request: SignInRequest): Promise<SignInFault | null> {
  const response = await apiFetch('/api/auth/sign-in', { method: 'POST', body: JSON.stringify(request) });
  if (response === null) return 'no-office';
  const answer = await jsonBody(response);
  if (!response.ok) return (answer?.['code'] as ProblemCode | undefined) ?? 'unavailable';
  const entered = await enterAs(answer as unknown as Session);
  if (entered.ok) return null;
  return entered.fault === 'unreachable' ? 'no-office' : 'enrol-refused';
}

/** Asks the office who is signed in; newer names, role and settings go into the phone. Quiet without an office. */
export async function readSession(): Promise<void> {
  const response = await apiFetch('/api/auth/session');
  if (!response?.ok) return;
  const session = await jsonBody(response);
  if (session) await rememberSession(session as unknown as Session);
}

/** Ends the session at the office when it can be reached; the phone is locked by the caller either way. */
export async function endSession(): Promise<void> {
  await apiFetch('/api/auth/sign-out', { method: 'POST', body: '{}' });
}
