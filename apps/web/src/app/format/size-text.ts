/** Bytes as KB or MB (powers of ten) with the reader's decimal sign. */
export function sizeText(bytes: number, language: string): string {
  const mega = bytes >= 1_000_000;
  const value = mega ? bytes / 1_000_000 : bytes / 1_000;
  const digits = mega ? 1 : 0;
  const number = new Intl.NumberFormat(language, {
    maximumFractionDigits: digits,
    minimumFractionDigits: digits,
  });
  return `${number.format(value)} ${mega ? 'MB' : 'KB'}`;
}
