const beyondJsonb = /\\u0000|\\ud[89a-f]|[:,[]\s*-?[\d.]+e[+-]?\d{3}|\d{300}/i;

/** More brackets than any entry of ours has; nesting can be no deeper than their number. */
const mostBrackets = 2_000;

/**
 * Whether PostgreSQL takes this valid JSON text as `jsonb`. Its type has no NUL character, no lone surrogate and a limit on
 * digits and nesting; such a text keeps its exact bytes and goes without the copy.
 */
export function copyable(bytes: Buffer): boolean {
  const text = bytes.toString('utf8');
  return !beyondJsonb.test(text) && (text.match(/[[{]/g)?.length ?? 0) < mostBrackets;
}
