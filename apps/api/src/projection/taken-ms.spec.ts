import { takenMs } from './taken-ms';

describe('when a picture was taken', () => {
  it('is told with its own offset', () => {
    const facts = { DateTimeOriginal: '2026:10:12 08:03:05', OffsetTimeOriginal: '-06:00' };
    expect(takenMs(facts, 'UTC')).toBe(Date.parse('2026-10-12T14:03:05Z'));
  });

  it('is taken by the company’s zone without one, in summer and in winter time', () => {
    expect(takenMs({ DateTimeOriginal: '2026:10:12 08:03:05' }, 'America/Denver')).toBe(
      Date.parse('2026-10-12T14:03:05Z'),
    );
    expect(takenMs({ DateTimeOriginal: '2026:12:12 08:03:05' }, 'America/Denver')).toBe(
      Date.parse('2026-12-12T15:03:05Z'),
    );
  });

  it.each([
    {},
    { DateTimeOriginal: 7 },
    { DateTimeOriginal: '0000:00:00 00:00:00' },
    { DateTimeOriginal: 'noon' },
  ])('is unknown from %j', (facts) => {
    expect(takenMs(facts, 'UTC')).toBeNull();
  });
});
