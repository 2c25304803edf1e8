import { mPerFt, paPerPsi, type UnitChoice } from '@rimeward/units';

/** How a reader wants figures and names: the company's units, and who a person is. */
export interface Reader extends UnitChoice {
  /** The name of a person by id; without it the sentence says "somebody". */
  nameOf?: (personId: string) => string | undefined;
}

/** Words that sentences share, in one language. */
export interface Words {
  seconds: (seconds: number) => string;
  minutes: (minutes: number) => string;
  hours: (hours: number) => string;
  decimal: string;
  somebody: string;
  unnamedZone: string;
  zone: (number: number, name: string) => string;
  valve: (role: string, number: string) => string | undefined;
  parts: Readonly<Record<string, string>>;
  drains: Readonly<Record<string, string>>;
  ceilings: Readonly<Record<string, string>>;
  positions: Readonly<Record<string, string>>;
  signs: Readonly<Record<string, string>>;
  locks: Readonly<Record<string, string>>;
  whys: Readonly<Record<string, string>>;
}

/** What a sentence is made with: figures in the reader's units, names in the reader's language. */
export interface Say {
  pressure: (psi: number) => string;
  distance: (metres: number) => string;
  time: (seconds: number) => string;
  minutes: (minutes: number) => string;
  hours: (hours: number) => string;
  person: (id: string) => string;
  zone: (params: { zoneNumber: number; zoneName: string }) => string;
  valve: (name: string) => string;
  part: (kind: string) => string;
  drain: (kind: string, place: string) => string;
  ceiling: (setBy: string) => string;
  position: (position: string) => string;
  sign: (sign: string) => string;
  lock: (id: string) => string;
  why: (why: string) => string;
}

export function sayIn(words: Words, reader: Reader): Say {
  const figure = (value: number, digits: number): string =>
    value.toFixed(digits).replace(/\.0+$/, '').replace('.', words.decimal);
  const pressure = (psi: number): string => {
    if (reader.units === 'us') return `${figure(psi, 1)} psi`;
    const pascals = psi * paPerPsi;
    return reader.metricPressure === 'bar'
      ? `${figure(pascals / 1e5, 1)} bar`
      : `${figure(pascals / 1e3, 0)} kPa`;
  };
  const distance = (metres: number): string =>
    reader.units === 'us' ? `${figure(metres / mPerFt, 0)} ft` : `${figure(metres, 0)} m`;
  const from =
    (list: Readonly<Record<string, string>>) =>
    (word: string): string =>
      (Object.hasOwn(list, word) ? list[word] : undefined) ?? word;
  return {
    pressure,
    distance,
    time: words.seconds,
    minutes: words.minutes,
    hours: words.hours,
    person: (id) => reader.nameOf?.(id) ?? words.somebody,
    zone: ({ zoneNumber, zoneName }) =>
      zoneNumber === 0 ? words.unnamedZone : words.zone(zoneNumber, zoneName),
    valve: (name) => {
      const [, role, number] = /^(shutoff|test-cock|vent-screw)-(\d)$/.exec(name) ?? [];
      return (role && number && words.valve(role, number)) || name;
    },
    part: from(words.parts),
    drain: (kind, place) => (place ? `${from(words.drains)(kind)} (${place})` : from(words.drains)(kind)),
    ceiling: from(words.ceilings),
    position: from(words.positions),
    sign: from(words.signs),
    lock: from(words.locks),
    why: from(words.whys),
  };
}
