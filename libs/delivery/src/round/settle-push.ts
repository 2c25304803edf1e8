import type { PushAnswer } from '../answers/read-answers';
import type { StuckReason } from '../answers/stuck-reason';
import type { ChainHead } from '../chain/seal-entry';
import type { ReceiptReading } from '../ports/ports';
import type { ChainStanding } from '../ports/store';

export interface PushFacts {
  /** Standing before the request left. */
  before: ChainStanding;
  /** Newest entry on the phone after the answer came. */
  headSeq: number;
  sentEntries: number;
  answer: PushAnswer;
  /** Hash of the phone's own entry at `answer.acknowledgedThrough`; null when it is not kept any more. */
  ownHash: string | null;
  receipt: ReceiptReading | null;
}

export type PushVerdict =
  | { kind: 'accept'; through: ChainHead; receiptVerified: boolean }
  | { kind: 'nothing-new' }
  | { kind: 'rewind'; to: ChainHead }
  | { kind: 'fork' }
  | { kind: 'failed'; reason: StuckReason };

/** What an answer to a push means for the phone. Decides only; the caller acts. */
export function settlePush(facts: PushFacts): PushVerdict {
  const { before, answer } = facts;
  const through = answer.acknowledgedThrough;
  const hash = answer.acknowledgedHash;
  if (answer.results.some((result) => result.heldReason === 'fork')) return { kind: 'fork' };
  if (through > facts.headSeq) return { kind: 'fork' };
  if (through > 0 && facts.ownHash !== null && hash !== facts.ownHash) return { kind: 'fork' };
  if (through < before.acknowledged.seq) {
    return { kind: 'rewind', to: { seq: through, hash: hash ?? before.acknowledged.hash } };
  }
  if (through === before.acknowledged.seq && facts.sentEntries > 0)
    return { kind: 'failed', reason: 'no-progress' };
  if (through === 0) return { kind: 'nothing-new' };
  if (hash === null || !covers(facts.receipt, before.device, { seq: through, hash })) {
    return { kind: 'failed', reason: 'unreadable-answer' };
  }
  return {
    kind: 'accept',
    through: { seq: through, hash },
    receiptVerified: facts.receipt?.verified ?? false,
  };
}

function covers(receipt: ReceiptReading | null, device: string, through: ChainHead): boolean {
  return (
    receipt !== null &&
    receipt.device === device &&
    receipt.acknowledgedThrough === through.seq &&
    receipt.hash === through.hash
  );
}
