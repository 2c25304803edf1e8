import { judgeAnswer } from '../answers/judge-answer';
import { readFeedAnswer, type FeedAnswer } from '../answers/read-answers';
import type { DeliveryPorts } from '../ports/ports';
import type { FeedPlace } from '../ports/transport';
import { feedPageItems, requestLimitsMs } from './limits';
import { stepDone, stepFailed, type StepResult } from './step';
import { withinLimit } from './within-limit';

/**
 * Reads the company's feed to its end. Every page and its cursor are stored together, and only if nobody else has moved
 * the cursor meanwhile; another epoch drops what was read, and nothing else, and begins at 0.
 */
export async function pullAll(ports: DeliveryPorts): Promise<StepResult> {
  const { store, transport, clock } = ports;
  let progressed = false;
  let renewed = false;
  let refusedAt: FeedPlace | null = null;
  for (;;) {
    const place = await store.feedPlace();
    // The store takes no page although nobody has moved the cursor: this reader has been replaced.
    if (refusedAt !== null && samePlace(refusedAt, place)) return stepDone(progressed);
    const sentMs = clock.nowMs();
    const sent = await withinLimit(clock, requestLimitsMs.pull, (limitMs) =>
      transport.pull(place, feedPageItems, limitMs),
    );
    const receivedMs = clock.nowMs();
    const judged = judgeAnswer(sent, receivedMs);
    if (judged.kind === 'failed') {
      if (judged.reason !== 'sign-in' || renewed) return stepFailed(judged, progressed);
      renewed = true;
      const renewal = await transport.renewSession();
      if (renewal === 'renewed') continue;
      return stepFailed(renewal === 'sign-in' ? 'sign-in' : 'no-network', progressed);
    }
    const answer = readFeedAnswer(judged.body);
    if (answer === null) return stepFailed('unreadable-answer', progressed);
    await store.noteContact({ serverTimeMs: answer.serverTimeMs, sentMs, receivedMs });
    const step = await takePage(ports, place, answer);
    progressed ||= step.progressed;
    if (step.reason !== null || !step.more) return { ...step, progressed };
    refusedAt = step.refused ? place : null;
  }
}

interface PageResult extends StepResult {
  more: boolean;
  /** The store did not take the page: somebody else has moved the cursor meanwhile. */
  refused: boolean;
}

async function takePage({ store }: DeliveryPorts, place: FeedPlace, answer: FeedAnswer): Promise<PageResult> {
  if (place.epoch !== null && place.epoch !== answer.epoch) {
    const dropped = await store.restartFeed(place, answer.epoch);
    return { ...stepDone(dropped), more: true, refused: !dropped };
  }
  if (answer.cursor < place.cursor)
    return { ...stepFailed('unreadable-answer', false), more: false, refused: false };
  if (answer.cursor === place.cursor && answer.more)
    return { ...stepFailed('no-progress', false), more: false, refused: false };
  const news = answer.cursor > place.cursor || place.epoch === null;
  const applied = news ? await store.applyFeed(place, answer) : true;
  return { ...stepDone(news && applied), more: answer.more || !applied, refused: !applied };
}

function samePlace(a: FeedPlace, b: FeedPlace): boolean {
  return a.epoch === b.epoch && a.cursor === b.cursor;
}
