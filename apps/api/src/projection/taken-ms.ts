const exifTime = /^(\d{4}):(\d{2}):(\d{2}) (\d{2}):(\d{2}):(\d{2})/;
const exifOffset = /^([+-])(\d{2}):(\d{2})$/;

/**
 * When a picture says it was taken, ms since the epoch; null when it does not say. EXIF tells local time (CIPA DC-008,
 * DateTimeOriginal) and only sometimes its offset; without one the company's zone is taken.
 */
export function takenMs(facts: Readonly<Record<string, unknown>>, timeZone: string): number | null {
  const said = exifTime.exec(textOf(facts.DateTimeOriginal));
  if (said === null) return null;
  const [year, month, day, hour, minute, second] = said.slice(1).map(Number) as [
    number,
    number,
    number,
    number,
    number,
    number,
  ];
  const asUtc = Date.UTC(year, month - 1, day, hour, minute, second);
  if (Number.isNaN(asUtc) || year < 1990) return null;
  const offset = exifOffset.exec(textOf(facts.OffsetTimeOriginal));
  if (offset === null) return asUtc - zoneOffsetMs(asUtc, timeZone);
  const minutes = Number(offset[2]) * 60 + Number(offset[3]);
  return asUtc - (offset[1] === '-' ? -minutes : minutes) * 60_000;
}

function textOf(value: unknown): string {
  return typeof value === 'string' ? value : '';
}

/** How far a zone is ahead of UTC; an hour off for the hour in which clocks change, which no rule can notice. */
function zoneOffsetMs(ms: number, timeZone: string): number {
  const name = new Intl.DateTimeFormat('en', { timeZone, timeZoneName: 'longOffset' })
    .formatToParts(ms)
    .find(({ type }) => type === 'timeZoneName')?.value;
  const offset = /GMT([+-])(\d{2}):(\d{2})/.exec(name ?? '');
  if (offset === null) return 0;
  const minutes = Number(offset[2]) * 60 + Number(offset[3]);
  return (offset[1] === '-' ? -minutes : minutes) * 60_000;
}
