const pairs = Array.from({ length: 256 }, (_, value) => value.toString(16).padStart(2, '0'));

/** Lower-case hexadecimal digits of bytes. */
export function toHex(bytes: Uint8Array): string {
  let text = '';
  for (const byte of bytes) text += pairs[byte];
  return text;
}

/** Bytes of lower- or upper-case hexadecimal digits; null when the text is anything else. */
export function fromHex(text: string): Uint8Array | null {
  if (text.length % 2 !== 0 || !/^[0-9a-f]*$/i.test(text)) return null;
  const bytes = new Uint8Array(text.length / 2);
  for (let index = 0; index < bytes.length; index += 1) {
    bytes[index] = Number.parseInt(text.slice(index * 2, index * 2 + 2), 16);
  }
  return bytes;
}
