import { judgeAnswer, type Failure } from '../answers/judge-answer';
import { readPhotoAnswer } from '../answers/read-answers';
import type { DeliveryPorts } from '../ports/ports';
import type { PhotoToSend } from '../ports/transport';
import { partBytes, partsAtOnce, requestLimitsMs } from './limits';
import { stepDone, stepFailed, type StepResult } from './step';
import { withinLimit } from './within-limit';

/** Answers that are about this one photograph: the office will never take it, so it waits for a person. */
const refusals: readonly string[] = ['photo-type-refused', 'photo-too-large', 'photo-empty'];

/**
 * Sends the missing parts of one photograph, a few at once, and asks the office to join them. It counts as being there
 * only when the office has checked the hash of the whole.
 */
export async function sendOriginal(
  ports: DeliveryPorts,
  photo: PhotoToSend,
  missingParts: readonly number[],
): Promise<StepResult> {
  const parts = await sendParts(ports, photo, missingParts);
  if (parts.kind === 'damaged') {
    await ports.store.settlePhoto(photo.sha256, 'damaged', null);
    return stepDone(true);
  }
  if (parts.kind === 'failed') return settleFailure(ports, photo, parts.failure, parts.sentAny);
  const sent = await withinLimit(ports.clock, requestLimitsMs.complete, (limitMs) =>
    ports.transport.complete(photo.sha256, limitMs),
  );
  const judged = judgeAnswer(sent, ports.clock.nowMs());
  if (judged.kind === 'failed') return settleFailure(ports, photo, judged, parts.sentAny);
  const answer = readPhotoAnswer(judged.body);
  if (answer === null || answer.sha256 !== photo.sha256)
    return stepFailed('unreadable-answer', parts.sentAny);
  if (answer.state === 'partial') return notJoined(ports, photo, parts.sentAny);
  await ports.store.settlePhoto(photo.sha256, answer.state, answer.refusedBecause);
  return stepDone(true);
}

type PartsOutcome =
  | { kind: 'sent'; sentAny: boolean }
  | { kind: 'damaged' }
  | { kind: 'failed'; failure: Failure; sentAny: boolean };

async function sendParts(
  { store, transport, clock }: DeliveryPorts,
  photo: PhotoToSend,
  missingParts: readonly number[],
): Promise<PartsOutcome> {
  const queue = [...missingParts];
  let sentAny = false;
  let failure: Failure | null = null;
  let damaged = false;
  const worker = async (): Promise<void> => {
    for (let part = queue.shift(); part !== undefined; part = queue.shift()) {
      const bytes = await store.readPart(photo.sha256, part, partBytes);
      if (bytes === null) damaged = true;
      if (bytes === null || failure !== null) return;
      const number = part;
      const sent = await withinLimit(clock, requestLimitsMs.part, (limitMs) =>
        transport.sendPart(photo.sha256, number, bytes, limitMs),
      );
      const judged = judgeAnswer(sent, clock.nowMs());
      if (judged.kind === 'answered') sentAny = true;
      else failure ??= judged;
      if (failure !== null) return;
    }
  };
  await Promise.all(Array.from({ length: partsAtOnce }, worker));
  if (damaged) return { kind: 'damaged' };
  return failure === null ? { kind: 'sent', sentAny } : { kind: 'failed', failure, sentAny };
}

async function settleFailure(
  ports: DeliveryPorts,
  photo: PhotoToSend,
  failure: Failure,
  sentAny: boolean,
): Promise<StepResult> {
  if (failure.code !== null && refusals.includes(failure.code)) {
    await ports.store.settlePhoto(photo.sha256, 'refused', failure.code);
    return stepDone(true);
  }
  if (failure.code === 'photo-hash-mismatch') return notJoined(ports, photo, sentAny);
  return stepFailed(failure, sentAny);
}

/** The parts made no whole: either the phone's bytes have rotted, or the office starts this one again. */
async function notJoined(ports: DeliveryPorts, photo: PhotoToSend, sentAny: boolean): Promise<StepResult> {
  if (await ports.store.photoIsWhole(photo.sha256)) return stepFailed('photo-not-joined', sentAny);
  await ports.store.settlePhoto(photo.sha256, 'damaged', null);
  return stepDone(true);
}
