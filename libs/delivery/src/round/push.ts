import { judgeAnswer } from '../answers/judge-answer';
import { readPushAnswer, type PushAnswer } from '../answers/read-answers';
import { entryHash, noPrevious } from '../chain/entry-hash';
import { readHeader } from '../chain/entry-header';
import { fullBatch, limitsAfter, makeBatch } from '../outbox/make-batch';
import type { DeliveryPorts } from '../ports/ports';
import type { ChainStanding } from '../ports/store';
import { requestLimitsMs } from './limits';
import { settlePush, type PushVerdict } from './settle-push';
import { stepDone, stepFailed, type DeliveryMemory, type StepResult } from './step';
import { withinLimit } from './within-limit';

/**
 * Pushes until the outbox is empty. The first request goes out even with nothing to send: its manifest tells the
 * office what is still here, and its answer tells the phone whether the office still has what it acknowledged.
 */
export async function pushAll(ports: DeliveryPorts, memory: DeliveryMemory): Promise<StepResult> {
  if (memory.forked) return stepFailed('fork', false);
  let progressed = false;
  for (let first = true; ; first = false) {
    const before = await ports.store.standing();
    if (!first && before.head.seq <= before.acknowledged.seq) return stepDone(progressed);
    const step = await pushOnce(ports, memory, before);
    progressed ||= step.progressed;
    if (step.reason !== null) {
      memory.pushFailures += 1;
      return { ...step, progressed };
    }
    memory.pushFailures = 0;
  }
}

async function pushOnce(
  ports: DeliveryPorts,
  memory: DeliveryMemory,
  before: ChainStanding,
): Promise<StepResult> {
  const { store, transport, clock, codec } = ports;
  const kept = await store.entriesAfter(before.acknowledged.seq, fullBatch.entries);
  const batch = makeBatch(kept, limitsAfter(memory.pushFailures), codec);
  if (batch.length === 0 && before.head.seq > before.acknowledged.seq)
    return stepFailed('history-missing', false);
  const request = {
    device: before.device,
    manifest: await store.manifest(),
    entries: batch.map((entry) => entry.text),
  };
  const sentMs = clock.nowMs();
  const sent = await withinLimit(clock, requestLimitsMs.push, (limitMs) => transport.push(request, limitMs));
  const receivedMs = clock.nowMs();
  const judged = judgeAnswer(sent, receivedMs);
  if (judged.kind === 'failed') return stepFailed(judged, false);
  const answer = readPushAnswer(judged.body);
  if (answer === null) return stepFailed('unreadable-answer', false);
  await store.noteContact({ serverTimeMs: answer.serverTimeMs, sentMs, receivedMs });
  const verdict = settlePush({
    before,
    headSeq: (await store.standing()).head.seq,
    sentEntries: batch.length,
    answer,
    ownHash: await ownHashAt(ports, before, answer.acknowledgedThrough),
    receipt: answer.receipt === null ? null : await ports.readReceipt(answer.receipt),
  });
  return carryOut(ports, memory, before, answer, verdict);
}

async function carryOut(
  { store, clock }: DeliveryPorts,
  memory: DeliveryMemory,
  before: ChainStanding,
  answer: PushAnswer,
  verdict: PushVerdict,
): Promise<StepResult> {
  const held = answer.results.flatMap(({ seq, heldReason }) =>
    heldReason === null ? [] : [{ seq, reason: heldReason }],
  );
  switch (verdict.kind) {
    case 'failed':
      return stepFailed(verdict.reason, false);
    case 'fork':
      memory.forked = true;
      await store.noteHeld(held);
      return stepFailed('fork', false);
    case 'rewind': {
      const whole = await store.rewind(before.acknowledged, verdict.to);
      return whole ? stepDone(true) : stepFailed('history-missing', false);
    }
    case 'nothing-new':
      return stepDone(false);
    case 'accept':
      await store.acknowledge({
        through: verdict.through,
        receipt: answer.receipt ?? '',
        receiptVerified: verdict.receiptVerified,
        held,
        atMs: clock.nowMs(),
      });
      if (answer.missingPhotos.length > 0) await store.reopenPhotos(answer.missingPhotos);
      return stepDone(verdict.through.seq > before.acknowledged.seq);
  }
}

/**
 * Hash of what the phone holds, computed from the text itself: after somebody has edited a stored text the office sees
 * that text's hash, and that is a matter for a person there, not another chain.
 */
async function ownHashAt(ports: DeliveryPorts, before: ChainStanding, seq: number): Promise<string | null> {
  if (seq === 0) return noPrevious;
  const text = await ports.store.textAt(seq);
  if (text === null) return seq === before.acknowledged.seq ? before.acknowledged.hash : null;
  const prev = readHeader(text)?.prev ?? noPrevious;
  return entryHash(prev, ports.codec.utf8(text), ports.codec.sha256);
}
