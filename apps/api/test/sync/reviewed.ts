import { randomUUID } from 'node:crypto';
import type {
  DecideRequest,
  ProblemDetails,
  QueueItem,
  QueueResponse,
  Review,
  VisitRecord,
} from '@rimeward/contracts';
import type { Desk } from './desk';
import { crewOfOne, type Office } from './office';
import type { TestCompany } from './seed';
import type { Answer, TestPhone } from './test-phone';

/** A crew with a visit, and a supervisor at his desk. */
export interface Setting {
  company: TestCompany;
  technician: string;
  phone: TestPhone;
  visit: string;
  desk: Desk;
}

export async function reviewed(office: Office): Promise<Setting> {
  const crew = await crewOfOne(office);
  return { ...crew, desk: await office.desk(await office.person(crew.company, 'supervisor')) };
}

/** Logs a short visit to its end and delivers it. */
export async function work({
  phone,
  visit,
  company,
}: Pick<Setting, 'phone' | 'visit' | 'company'>): Promise<void> {
  const [zoneId] = company.zones;
  const cycleId = randomUUID();
  phone.write(visit, 'water-off', { kind: 'shutoff-closed' });
  phone.write(visit, 'air-started', { cycleId, zoneId: zoneId!, gaugePsi: 45 });
  phone.write(visit, 'air-stopped', { cycleId, elapsedMs: 90_000 });
  phone.write(visit, 'end-sign-seen', { cycleId, sign: 'mist' });
  phone.write(visit, 'left', { outcome: 'done', why: null, present: 'nobody-present' });
  expect((await phone.push()).status).toBe(200);
}

export async function queueItem(desk: Desk, visit: string): Promise<QueueItem> {
  const answer = await desk.get<QueueResponse>('/review/visits');
  const item = answer.body.items.find(({ visitId }) => visitId === visit);
  if (item === undefined) throw new Error('the visit is not in the queue');
  return item;
}

export async function decide(
  desk: Desk,
  visit: string,
  over: Partial<DecideRequest>,
): Promise<Answer<Review & ProblemDetails>> {
  const { body } = await desk.get<VisitRecord>(`/review/visits/${visit}`);
  return desk.post(`/review/visits/${visit}/decisions`, {
    decision: 'accepted',
    remark: null,
    questions: [],
    expectedNumber: body.reviews.length,
    seenPosition: body.position,
    ...over,
  });
}

export const codeOf = ({ status, body }: Answer<ProblemDetails>): [number, string] => [status, body.code];
