import canonicalize from 'canonicalize';

/** The value has no canonical form: not JSON, not finite, or text with half a character in it. */
export class CanonicalFormError extends Error {
  override readonly name = 'CanonicalFormError';
}

/**
 * The one text of a value under RFC 8785 (JSON Canonicalization Scheme): keys sorted by UTF-16 units, numbers as
 * ECMAScript writes them, no white space. Members that are `undefined` are left out.
 *
 * @throws CanonicalFormError for NaN, infinities, values outside JSON, and lone surrogates (RFC 8785, 3.2.2.2).
 */
export function canonicalText(value: unknown): string {
  let text: string | undefined;
  try {
    text = canonicalize(value);
  } catch (error) {
    throw new CanonicalFormError(error instanceof Error ? error.message : 'not JSON');
  }
  if (text === undefined) throw new CanonicalFormError('not JSON');
  if (escapedLoneSurrogate.test(text) && hasLoneSurrogate(value))
    throw new CanonicalFormError('lone surrogate');
  return text;
}

// JSON.stringify writes a lone surrogate, and nothing else in this range, as an escape.
const escapedLoneSurrogate = /\\ud[89a-f][0-9a-f]{2}/;
const loneSurrogate = /\p{Surrogate}/u;

function hasLoneSurrogate(value: unknown): boolean {
  if (typeof value === 'string') return loneSurrogate.test(value);
  if (typeof value !== 'object' || value === null) return false;
  return Object.entries(value).some(([key, member]) => loneSurrogate.test(key) || hasLoneSurrogate(member));
}
