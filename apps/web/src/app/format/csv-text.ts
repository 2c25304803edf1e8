/**
 * Rows as CSV (RFC 4180) with a byte order mark, so that spreadsheets read it as UTF-8. A text that a spreadsheet would take
 * for a formula gets an apostrophe before it.
 */
export function csvText(rows: readonly (readonly (string | number)[])[]): string {
  return `\uFEFF${rows.map((row) => row.map(cell).join(',')).join('\r\n')}\r\n`;
}

function cell(value: string | number): string {
  if (typeof value === 'number') return String(value);
  const safe = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
