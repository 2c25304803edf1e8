import type {
  DecideRequest,
  DevicesResponse,
  HeldResponse,
  ProblemCode,
  QueueResponse,
  VisitRecord,
} from '@rimeward/contracts';
import { apiFetch, jsonBody } from '../../phone/session/api-fetch';

/** An answer of the office that is not a success; `no-office` when none came. */
export class ReviewFault extends Error {
  constructor(readonly code: ProblemCode | 'no-office') {
    super(code);
  }
}

async function ask<T>(path: string, body?: unknown): Promise<T> {
  const init = body === undefined ? {} : { method: 'POST', body: JSON.stringify(body) };
  const response = await apiFetch(path, init);
  if (response === null) throw new ReviewFault('no-office');
  if (response.status === 204) return undefined as T;
  const answer = await jsonBody(response);
  if (!response.ok || answer === null)
    throw new ReviewFault((answer?.['code'] as ProblemCode | undefined) ?? 'unavailable');
  return answer as T;
}

export const fetchQueue = (query: string): Promise<QueueResponse> => ask(`/api/review/visits?${query}`);
export const fetchRecord = (visitId: string): Promise<VisitRecord> => ask(`/api/review/visits/${visitId}`);
export const fetchDevices = (): Promise<DevicesResponse> => ask('/api/review/devices');
export const fetchHeld = (): Promise<HeldResponse> => ask('/api/review/held');
export const decide = (visitId: string, request: DecideRequest): Promise<unknown> =>
  ask(`/api/review/visits/${visitId}/decisions`, request);
export const settleHeld = (id: string, note: string): Promise<void> =>
  ask(`/api/review/held/${id}/settle`, { note });
