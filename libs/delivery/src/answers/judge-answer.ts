import type { HttpAnswer, Sent } from '../ports/transport';
import { readRetryAfter } from './retry-after';
import type { StuckReason } from './stuck-reason';

export interface Failure {
  kind: 'failed';
  reason: StuckReason;
  retryAfterMs: number | null;
  /** Stable code of the office's problem details, when it sent one. */
  code: string | null;
}

export type Judged = { kind: 'answered'; body: unknown } | Failure;

/**
 * Tells an answer of the office from everything else that can come back. Only a 2xx answer in JSON that can be read
 * to its end counts; a page in HTML is a captive portal unless it comes with a server's fault.
 */
export function judgeAnswer(sent: Sent, nowMs: number): Judged {
  if (!sent.arrived) return failed(sent.why);
  const { answer } = sent;
  const retryAfterMs = readRetryAfter(answer.retryAfter, nowMs);
  if (answer.status >= 500) {
    return failed(answer.status === 503 ? 'server-busy' : 'server-fault', retryAfterMs, codeOf(answer));
  }
  if (!isJson(answer)) return failed(answer.status === 429 ? 'server-busy' : 'captive-portal', retryAfterMs);
  const parsed = parse(answer.text);
  if (answer.status >= 200 && answer.status < 300) {
    return parsed.ok ? { kind: 'answered', body: parsed.value } : failed('unreadable-answer');
  }
  return failed(reasonOfRefusal(answer.status, codeOf(answer)), retryAfterMs, codeOf(answer));
}

function reasonOfRefusal(status: number, code: string | null): StuckReason {
  if (code === 'device-revoked') return 'device-revoked';
  if (status === 401) return 'sign-in';
  if (status === 408) return 'timeout';
  if (status === 413) return 'too-large';
  if (status === 429) return 'server-busy';
  return 'refused';
}

function failed(
  reason: StuckReason,
  retryAfterMs: number | null = null,
  code: string | null = null,
): Failure {
  return { kind: 'failed', reason, retryAfterMs, code };
}

function isJson(answer: HttpAnswer): boolean {
  return /^application\/(?:[\w.-]+\+)?json\b/i.test(answer.contentType?.trim() ?? '');
}

function codeOf(answer: HttpAnswer): string | null {
  const parsed = isJson(answer) ? parse(answer.text) : { ok: false as const };
  if (!parsed.ok || typeof parsed.value !== 'object' || parsed.value === null) return null;
  const { code } = parsed.value as Record<string, unknown>;
  return typeof code === 'string' ? code : null;
}

function parse(text: string): { ok: true; value: unknown } | { ok: false } {
  try {
    return { ok: true, value: JSON.parse(text) as unknown };
  } catch {
    return { ok: false };
  }
}
