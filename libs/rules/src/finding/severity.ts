/**
 * How much a finding matters, worst first. `danger`: somebody could be hurt, or drinking water spoilt, or a pipe burst.
 * `fault`: done wrongly, or left so that frost can harm it. `gap`: not recorded, so nobody can tell. `note`: worth knowing.
 */
export const severities = ['danger', 'fault', 'gap', 'note'] as const;
export type Severity = (typeof severities)[number];
