/** A check of one value; true when the value may stand there. */
export type Check = (value: unknown) => boolean;

interface OptionalCheck {
  optional: Check;
}

/** A check for every member of a body: absent members must be allowed to be absent, and no other member may be there. */
export type Shape<Body> = {
  readonly [Key in keyof Body]-?: undefined extends Body[Key] ? OptionalCheck : Check;
};

const uuidPattern =
  /^(?:[0-9a-fA-F]{8}-[0-9a-fA-F]{4}-[1-8][0-9a-fA-F]{3}-[89abAB][0-9a-fA-F]{3}-[0-9a-fA-F]{12}|0{8}-0{4}-0{4}-0{4}-0{12}|f{8}-f{4}-f{4}-f{4}-f{12})$/;

export const uuid: Check = (value) => typeof value === 'string' && uuidPattern.test(value);
export const flag: Check = (value) => typeof value === 'boolean';

export const text =
  (max: number, min = 0): Check =>
  (value) =>
    typeof value === 'string' && value.length >= min && value.length <= max;

export const oneOf =
  (words: readonly string[]): Check =>
  (value) =>
    typeof value === 'string' && words.includes(value);

export const number =
  (min: number, max = Number.MAX_VALUE): Check =>
  (value) =>
    typeof value === 'number' && value >= min && value <= max;

export const wholeNumber =
  (min: number): Check =>
  (value) =>
    Number.isSafeInteger(value) && (value as number) >= min;

export const listOf =
  (each: Check, max: number): Check =>
  (value) =>
    Array.isArray(value) && value.length <= max && value.every((item: unknown) => each(item));

export const orNull =
  (check: Check): Check =>
  (value) =>
    value === null || check(value);

export const orAbsent = (check: Check): OptionalCheck => ({ optional: check });

export const record: Check = (value) => typeof value === 'object' && value !== null && !Array.isArray(value);

export function shaped(shape: Readonly<Record<string, Check | OptionalCheck>>): Check {
  const members = Object.entries(shape);
  const names = new Set(members.map(([name]) => name));
  return (value) => {
    if (!record(value)) return false;
    const body = value as Record<string, unknown>;
    if (!Object.keys(body).every((name) => names.has(name))) return false;
    return members.every(([name, check]) =>
      typeof check === 'function'
        ? check(body[name])
        : body[name] === undefined || check.optional(body[name]),
    );
  };
}
