import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Sent } from '../ports/transport';
import { judgeAnswer } from './judge-answer';
import { readFeedAnswer, readPhotoAnswer, readPushAnswer } from './read-answers';
import { longestRetryAfterMs, readRetryAfter } from './retry-after';

const now = Date.parse('2026-10-15T06:00:00Z');
const sent = (
  status: number,
  contentType: string | null,
  text: string,
  retryAfter: string | null = null,
): Sent => ({
  arrived: true,
  answer: { status, contentType, text, retryAfter },
});

describe('judgeAnswer', () => {
  it.each([
    [
      'JSON that is whole',
      sent(200, 'application/json; charset=utf-8', '{"a":1}'),
      { kind: 'answered', body: { a: 1 } },
    ],
    ['half of it', sent(200, 'application/json', '{"a":'), { reason: 'unreadable-answer' }],
    ['a portal', sent(200, 'text/html', '{"a":1}'), { reason: 'captive-portal' }],
    ['a portal that redirects', sent(302, 'text/html', ''), { reason: 'captive-portal' }],
    ['a portal without a type', sent(200, null, ''), { reason: 'captive-portal' }],
    ['a proxy in trouble', sent(502, 'text/html', '<html>'), { reason: 'server-fault' }],
    [
      'a server in trouble',
      sent(500, 'application/problem+json', '{"code":"internal"}'),
      { reason: 'server-fault', code: 'internal' },
    ],
    [
      'a server that asks to wait',
      sent(503, 'text/html', '', '30'),
      { reason: 'server-busy', retryAfterMs: 30_000 },
    ],
    ['too many requests', sent(429, null, '', '5'), { reason: 'server-busy', retryAfterMs: 5_000 }],
    [
      'a dead credential',
      sent(401, 'application/problem+json', '{"code":"not-signed-in"}'),
      { reason: 'sign-in' },
    ],
    [
      'a revoked device',
      sent(403, 'application/problem+json', '{"code":"device-revoked"}'),
      { reason: 'device-revoked' },
    ],
    ['too much at once', sent(413, 'application/json', '{}'), { reason: 'too-large' }],
    [
      'another refusal',
      sent(422, 'application/json', '{"code":"photo-empty"}'),
      { reason: 'refused', code: 'photo-empty' },
    ],
    ['silence', { arrived: false, why: 'timeout' } as const, { reason: 'timeout' }],
    ['no network', { arrived: false, why: 'no-network' } as const, { reason: 'no-network' }],
  ])('tells %s', (_, answer, expected) => {
    expect(judgeAnswer(answer, now)).toMatchObject(expected);
  });

  it('never throws, and takes only a 2xx in JSON for an answer', () => {
    const anything = fc.record({
      status: fc.integer({ min: 100, max: 599 }),
      contentType: fc.option(fc.oneof(fc.string(), fc.constant('application/json'))),
      retryAfter: fc.option(fc.string()),
      text: fc.oneof(fc.string(), fc.json()),
    });
    fc.assert(
      fc.property(anything, (answer) => {
        const judged = judgeAnswer({ arrived: true, answer }, now);
        const ours = answer.status >= 200 && answer.status < 300 && answer.contentType === 'application/json';
        if (judged.kind === 'answered')
          expect(answer.contentType?.trim().toLowerCase()).toMatch(/^application\/.*json/);
        expect(judged.kind === 'answered' && !(answer.status >= 200 && answer.status < 300)).toBe(false);
        if (!ours) return;
        expect(judged.kind === 'answered' || judged.reason === 'unreadable-answer').toBe(true);
      }),
    );
  });
});

describe('readRetryAfter', () => {
  it('reads seconds and dates as RFC 9110, 10.2.3 writes them, and bounds both', () => {
    expect(readRetryAfter('120', now)).toBe(120_000);
    expect(readRetryAfter('Thu, 15 Oct 2026 06:01:30 GMT', now)).toBe(90_000);
    expect(readRetryAfter('Thu, 15 Oct 2026 05:00:00 GMT', now)).toBe(0);
    expect(readRetryAfter('86400', now)).toBe(longestRetryAfterMs);
    expect(readRetryAfter('soon', now)).toBeNull();
    expect(readRetryAfter(null, now)).toBeNull();
  });
});

describe('the readers of bodies', () => {
  const push = {
    acknowledgedThrough: 3,
    acknowledgedHash: 'h',
    results: [{ seq: 3, result: 'stored' }],
    serverTime: '2026-10-15T06:00:00.000Z',
    receipt: 'r',
    missingPhotos: [],
  };
  const feed = { epoch: 'e', cursor: 3, more: false, items: [], serverTime: '2026-10-15T06:00:00.000Z' };
  const photo = { sha256: 's', state: 'partial', missingParts: [0], hasPreview: false };
  const readers = [
    { name: 'push', whole: push, read: readPushAnswer },
    { name: 'feed', whole: feed, read: readFeedAnswer },
    { name: 'photo', whole: photo, read: readPhotoAnswer },
  ];

  it.each(readers)('take a whole answer of $name, and none that lacks a member', ({ whole, read }) => {
    expect(read(whole)).not.toBeNull();
    for (const missing of Object.keys(whole)) {
      const rest = Object.fromEntries(Object.entries(whole).filter(([key]) => key !== missing));
      expect(read(rest), missing).toBeNull();
    }
  });

  it('never throw, whatever comes', () => {
    fc.assert(
      fc.property(fc.jsonValue(), (body) => {
        for (const { read } of readers) read(body);
      }),
    );
    for (const { read } of readers) expect(read([])).toBeNull();
  });
});
