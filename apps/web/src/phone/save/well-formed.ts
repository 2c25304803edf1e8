const loneSurrogate = /\p{Surrogate}/gu;

/**
 * The same value with every half character (a lone surrogate, such as a keyboard leaves when it cuts an emoji) replaced
 * by U+FFFD: no text that somebody typed may be impossible to save.
 */
export function wellFormed<T>(value: T): T {
  if (typeof value === 'string') return value.replace(loneSurrogate, '\ufffd') as T;
  if (Array.isArray(value)) return value.map((element) => wellFormed<unknown>(element)) as T;
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).map(([key, member]) => [wellFormed(key), wellFormed<unknown>(member)]),
  ) as T;
}
