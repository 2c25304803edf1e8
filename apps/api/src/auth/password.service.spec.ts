import { ProblemException } from '../common/problem.exception';
import { PasswordService } from './password.service';

describe('passwords', () => {
  const passwords = new PasswordService();

  it('are hashed with argon2id, 19 MiB, two passes and one lane, with a salt of their own', async () => {
    const [one, other] = [await passwords.hash('the same words'), await passwords.hash('the same words')];
    expect(one).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
    expect(one).not.toBe(other);
  });

  it('are checked as the reference implementation of argon2id has it (its published test of "password" and "somesalt")', async () => {
    const published =
      '$argon2id$v=19$m=65536,t=2,p=1$c29tZXNhbHQ$CTFhFdXPJO1aFaMaO6Mm5c8y7cJHAph8ArZWb2GRPPc';
    expect(await passwords.matches(published, 'password')).toBe(true);
    expect(await passwords.matches(published, 'Password')).toBe(false);
  });

  it('may be 64 characters with blanks and ñ, and are told apart to the last one', async () => {
    const phrase = 'una mañana fría de octubre el agua sale de las tuberías del señor';
    expect(phrase.length).toBeGreaterThanOrEqual(64);
    const stored = await passwords.hash(phrase);
    expect(await passwords.matches(stored, phrase)).toBe(true);
    expect(await passwords.matches(stored, phrase.slice(0, -1))).toBe(false);
    expect(await passwords.matches(stored, `${phrase} `)).toBe(false);
  });

  it('are the same whichever way a keyboard writes an accent', async () => {
    const stored = await passwords.hash('señal de frío'.normalize('NFC'));
    expect(await passwords.matches(stored, 'señal de frío'.normalize('NFD'))).toBe(true);
  });

  it('never match for somebody who is not there, not even the stand-in', async () => {
    expect(await passwords.matches(null, 'nobody has this password')).toBe(false);
  });

  it('are not all hashed at once: past the queue people are told to come again', async () => {
    const stored = await passwords.hash('a long queue at dawn');
    const before = process.memoryUsage().rss;
    const answers = await Promise.allSettled(
      Array.from({ length: 200 }, () => passwords.matches(stored, 'a long queue at dawn')),
    );
    const kept = answers.filter(({ status }) => status === 'fulfilled');
    const refused = answers.flatMap((one) =>
      one.status === 'rejected' ? [one.reason as ProblemException] : [],
    );
    expect(kept).toHaveLength(64);
    expect(refused.map(({ code }) => code)).toEqual(Array(136).fill('too-many-requests'));
    expect((process.memoryUsage().rss - before) / 1_048_576).toBeLessThan(300);
    expect(await passwords.matches(stored, 'a long queue at dawn')).toBe(true);
  }, 60_000);
});
