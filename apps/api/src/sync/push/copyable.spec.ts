import { copyable } from './copyable';

const ask = (text: string): boolean => copyable(Buffer.from(text, 'utf8'));

describe('whether a text can be copied to jsonb', () => {
  it('takes an ordinary entry, a hash that looks like an exponent included', () => {
    expect(ask('{"sha256":"0e12345678","text":"12e500 psi","n":1.5e-7}')).toBe(true);
  });

  it.each([
    '{"a":"\\u0000"}',
    '{"a":"\\ud800"}',
    '{"a":1e400}',
    '{"a":[-1.5e+999]}',
    `{"a":${'1'.repeat(400)}}`,
  ])('leaves out %#', (text) => {
    expect(ask(text)).toBe(false);
  });

  it('leaves out what is nested without end', () => {
    expect(ask('['.repeat(30_000) + ']'.repeat(30_000))).toBe(false);
  });
});
