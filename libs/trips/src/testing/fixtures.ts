import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { dayOf365 } from '../calendar/local-date';

/** Rows of a CSV fixture by column name. The fixtures hold no quoted fields. */
export function readCsv(name: string): Record<string, string>[] {
  const [head = '', ...lines] = readText(name).trim().split(/\r?\n/);
  const columns = head.split(',');
  return lines.map((line) => {
    const cells = line.split(',');
    return Object.fromEntries(columns.map((column, at) => [column, cells[at] ?? '']));
  });
}

/** Text of a fixture. */
export function readText(name: string): string {
  return readFileSync(join(__dirname, '../../fixtures', name), 'utf8');
}

const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];

/** Day of a 365-day year of a day such as `Oct 8`. */
export function dayOfMonthName(text: string): number {
  const [month = '', day = ''] = text.split(' ');
  return dayOf365(months.indexOf(month) + 1, Number(day));
}

/** A date such as `2026-10-08` as `Oct 8`. */
export const monthName = (date: string): string =>
  `${months[Number(date.slice(5, 7)) - 1]} ${Number(date.slice(8))}`;
