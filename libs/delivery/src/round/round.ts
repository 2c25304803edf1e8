import { isUnreachable, type StuckReason } from '../answers/stuck-reason';
import type { DeliveryPorts } from '../ports/ports';
import { announcePhotos, type Announced } from './announce';
import { pullAll } from './pull';
import { pushAll } from './push';
import { sendOriginal } from './send-original';
import type { DeliveryMemory, StepResult } from './step';

/** How a whole round went: the first reason that something is still here, if anything is. */
export interface RoundReport extends StepResult {
  /** The office has answered at least once. */
  contact: boolean;
}

/**
 * One round: entries, then small previews, then the feed, then original photographs one by one. Entries saved meanwhile
 * go before the next photograph. A dead session stops the feed only: entries and photographs have their own credential.
 */
export async function runRound(ports: DeliveryPorts, memory: DeliveryMemory): Promise<RoundReport> {
  const round = new Tally();
  const push = round.add(await pushAll(ports, memory));
  if (round.over(push)) return round.report();
  let wanted: Announced['wanted'] = [];
  if (push.reason === null) {
    const announced = round.add(await announcePhotos(ports));
    if (round.over(announced)) return round.report();
    wanted = announced.wanted;
  }
  if (round.over(round.add(await pullAll(ports)))) return round.report();
  while (wanted.length > 0) {
    if (!(await sendOriginals(ports, memory, round, wanted))) break;
    wanted = round.add(await announcePhotos(ports)).wanted;
  }
  return round.report();
}

/** False when the round is to end, or when a photograph did not make it: it is tried again in the next round. */
async function sendOriginals(
  ports: DeliveryPorts,
  memory: DeliveryMemory,
  round: Tally,
  wanted: Announced['wanted'],
): Promise<boolean> {
  let allSettled = true;
  for (const { photo, missingParts } of wanted) {
    const { head, acknowledged } = await ports.store.standing();
    if (head.seq > acknowledged.seq && round.over(round.add(await pushAll(ports, memory)))) return false;
    const sent = round.add(await sendOriginal(ports, photo, missingParts));
    if (round.over(sent)) return false;
    allSettled &&= sent.reason === null;
  }
  return allSettled;
}

const endsRound: readonly StuckReason[] = ['server-busy', 'server-fault'];

class Tally {
  private reason: StuckReason | null = null;
  private retryAfterMs: number | null = null;
  private progressed = false;
  private contact = false;

  add<T extends StepResult>(step: T): T {
    this.reason ??= step.reason;
    if (step.retryAfterMs !== null) this.retryAfterMs = Math.max(this.retryAfterMs ?? 0, step.retryAfterMs);
    this.progressed ||= step.progressed;
    this.contact ||= step.reason === null || !isUnreachable(step.reason);
    return step;
  }

  /** Whether the office cannot or will not take anything more now. */
  over({ reason }: StepResult): boolean {
    return reason !== null && (isUnreachable(reason) || endsRound.includes(reason));
  }

  report(): RoundReport {
    const { reason, retryAfterMs, progressed, contact } = this;
    return { reason, retryAfterMs, progressed, contact };
  }
}
