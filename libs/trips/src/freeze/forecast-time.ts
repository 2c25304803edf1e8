import { dateOfDay, type LocalDate } from '../calendar/local-date';

const shape = /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(?::\d{2}(?:\.\d+)?)?(Z|[+-]\d{2}:\d{2})$/;

/** A moment and the clock on the wall there. */
export interface ZonedTime {
  utcMs: number;
  localMs: number;
}

/**
 * Reads an ISO time that carries its offset, as weather services send it. `utcOffsetMinutes` replaces the written
 * offset where the wall clock of the site is another one. Undefined when the text is not such a time.
 */
export function readZonedTime(timeIso: string, utcOffsetMinutes?: number): ZonedTime | undefined {
  const offset = shape.exec(timeIso)?.[1];
  const utcMs = Date.parse(timeIso);
  if (offset === undefined || Number.isNaN(utcMs)) return undefined;
  const minutes = utcOffsetMinutes ?? writtenOffsetMinutes(offset);
  return { utcMs, localMs: utcMs + minutes * 60_000 };
}

function writtenOffsetMinutes(offset: string): number {
  if (offset === 'Z') return 0;
  const minutes = Number(offset.slice(1, 3)) * 60 + Number(offset.slice(4, 6));
  return offset.startsWith('-') ? -minutes : minutes;
}

/** The calendar day on the wall clock. */
export const localDateOf = (time: ZonedTime): LocalDate => dateOfDay(Math.floor(time.localMs / 86_400_000));
