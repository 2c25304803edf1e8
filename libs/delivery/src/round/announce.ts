import { judgeAnswer, type Judged } from '../answers/judge-answer';
import { readAnnounceAnswer, type PhotoAnswer } from '../answers/read-answers';
import type { DeliveryPorts } from '../ports/ports';
import type { PhotoToSend } from '../ports/transport';
import { requestLimitsMs } from './limits';
import { stepDone, stepFailed, type StepResult } from './step';
import { withinLimit } from './within-limit';

/** Photographs in one announcement. */
const announcedAtOnce = 100;

export interface Announced extends StepResult {
  /** Photographs of which the office lacks parts. */
  wanted: { photo: PhotoToSend; missingParts: number[] }[];
}

/**
 * Tells the office which photographs are here and brings it every preview that it lacks: small pictures of everything
 * come before the first large one.
 */
export async function announcePhotos(ports: DeliveryPorts): Promise<Announced> {
  const { store, transport, clock } = ports;
  const pending = await store.pendingPhotos(announcedAtOnce);
  if (pending.length === 0) return { ...stepDone(false), wanted: [] };
  const sent = await withinLimit(clock, requestLimitsMs.announce, (limitMs) =>
    transport.announce(pending, limitMs),
  );
  const judged = judgeAnswer(sent, clock.nowMs());
  if (judged.kind === 'failed') return { ...stepFailed(judged, false), wanted: [] };
  const answers = readAnnounceAnswer(judged.body);
  if (answers === null) return { ...stepFailed('unreadable-answer', false), wanted: [] };

  const wanted: Announced['wanted'] = [];
  let progressed = false;
  for (const answer of answers) {
    const photo = pending.find(({ sha256 }) => sha256 === answer.sha256);
    if (photo === undefined) continue;
    if (answer.state !== 'partial') {
      await store.settlePhoto(photo.sha256, answer.state, answer.refusedBecause);
      progressed = true;
      continue;
    }
    wanted.push({ photo, missingParts: answer.missingParts });
  }
  for (const answer of answers) {
    if (answer.hasPreview || answer.state === 'refused') continue;
    const judgedPreview = await bringPreview(ports, answer);
    if (judgedPreview === null) continue;
    if (judgedPreview.kind === 'answered') progressed = true;
    else if (judgedPreview.reason !== 'refused' && judgedPreview.reason !== 'too-large') {
      return { ...stepFailed(judgedPreview, progressed), wanted: [] };
    }
  }
  return { ...stepDone(progressed), wanted };
}

/** A preview that cannot be read or is refused is no loss: the office makes its own from the original. */
async function bringPreview(
  { store, transport, clock }: DeliveryPorts,
  answer: PhotoAnswer,
): Promise<Judged | null> {
  const preview = await store.readPreview(answer.sha256);
  if (preview === null) return null;
  const sent = await withinLimit(clock, requestLimitsMs.preview, (limitMs) =>
    transport.sendPreview(answer.sha256, preview, limitMs),
  );
  return judgeAnswer(sent, clock.nowMs());
}
