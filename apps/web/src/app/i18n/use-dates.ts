import { useMemo } from 'react';
import { useTranslation } from 'react-i18next';

export interface Dates {
  /** "Tuesday, November 3": the month as a word, so that nobody turns day and month round. */
  day: (isoDay: string) => string;
  time: (ms: number) => string;
  /** Day and time. */
  moment: (ms: number) => string;
}

/** Dates and times in the reader's language and this device's time zone. */
export function useDates(): Dates {
  const { i18n } = useTranslation();
  const locale = i18n.language.startsWith('es') ? 'es-US' : 'en-US';
  return useMemo(() => {
    const day = new Intl.DateTimeFormat(locale, {
      weekday: 'long',
      month: 'long',
      day: 'numeric',
      timeZone: 'UTC',
    });
    const time = new Intl.DateTimeFormat(locale, { hour: 'numeric', minute: '2-digit' });
    const moment = new Intl.DateTimeFormat(locale, {
      month: 'short',
      day: 'numeric',
      hour: 'numeric',
      minute: '2-digit',
    });
    return {
      day: (isoDay) => day.format(Date.parse(`${isoDay}T12:00:00Z`)),
      time: (ms) => time.format(ms),
      moment: (ms) => moment.format(ms),
    };
  }, [locale]);
}
