/**
 * Why something is still on the phone. The words for it, and the button beside it, are the screen's.
 *
 * - `no-network`, `timeout`: nothing came back · `captive-portal`: something else than the office answered
 * - `server-busy`: asked to wait · `server-fault`: the office failed · `unreadable-answer`: half an answer, or not ours
 * - `sign-in`: the credential is not taken any more · `device-revoked`: this device may not deliver
 * - `refused`: another refusal of the request as such · `too-large`: not even one entry passes
 * - `fork`: the office has other entries of this device under the same numbers (storage copied or restored)
 * - `history-missing`: entries that the office asks for are no longer on the phone
 * - `no-progress`: the office answered and took nothing · `photo-not-joined`: parts arrived and made no whole
 * - `phone-storage`: the phone's own database failed
 */
export const stuckReasons = [
  'no-network',
  'timeout',
  'captive-portal',
  'server-busy',
  'server-fault',
  'unreadable-answer',
  'sign-in',
  'device-revoked',
  'refused',
  'too-large',
  'fork',
  'history-missing',
  'no-progress',
  'photo-not-joined',
  'phone-storage',
] as const;

export type StuckReason = (typeof stuckReasons)[number];

const unreachable: readonly StuckReason[] = ['no-network', 'timeout', 'captive-portal'];

/** Whether the office can be taken to have said nothing at all. */
export function isUnreachable(reason: StuckReason): boolean {
  return unreachable.includes(reason);
}
