import { allowedDecisions, standingOf, type StandingFacts } from './visit-standing';

const question = '018f5b3e-0000-7000-8000-000000000051';

function facts(over: Partial<StandingFacts> = {}): StandingFacts {
  return {
    entries: 3,
    left: true,
    position: 30,
    lastDecision: null,
    answeredQuestionIds: new Set(),
    ...over,
  };
}

describe('where a visit stands', () => {
  it('is planned without entries, under way until the crew has left, then waits for the review', () => {
    expect(standingOf(facts({ entries: 0, left: false }))).toBe('planned');
    expect(standingOf(facts({ left: false }))).toBe('under-way');
    expect(standingOf(facts())).toBe('to-review');
  });

  it('waits for every answer after it was sent back with questions', () => {
    const lastDecision = { decision: 'sent-back' as const, seenPosition: 30, questionIds: [question] };
    expect(standingOf(facts({ lastDecision, position: 31 }))).toBe('sent-back');
    expect(standingOf(facts({ lastDecision, position: 31, answeredQuestionIds: new Set([question]) }))).toBe(
      'answered',
    );
  });

  it('waits for any entry after it was sent back without a question', () => {
    const lastDecision = { decision: 'sent-back' as const, seenPosition: 30, questionIds: [] };
    expect(standingOf(facts({ lastDecision }))).toBe('sent-back');
    expect(standingOf(facts({ lastDecision, position: 31 }))).toBe('answered');
  });

  it('is opened again by what arrives after it was accepted', () => {
    const lastDecision = { decision: 'accepted' as const, seenPosition: 30, questionIds: [] };
    expect(standingOf(facts({ lastDecision }))).toBe('accepted');
    expect(standingOf(facts({ lastDecision, position: 31 }))).toBe('to-review');
  });

  it('is never accepted twice, nor before anything has been done', () => {
    expect(allowedDecisions('accepted')).not.toContain('accepted');
    expect(allowedDecisions('planned')).toEqual([]);
    expect(allowedDecisions('under-way')).not.toContain('accepted');
  });
});
