/**
 * The closed word lists of the log and of the system record. They stand apart from the schemas, so that a screen can list
 * them, and the fold can check a body, without loading the schemas.
 */

/** How water is taken out of a system; a system that nobody knows is treated as blow-out. */
export const removalMethods = ['blow-out', 'manual-drain', 'automatic-drain', 'unknown'] as const;
export type RemovalMethod = (typeof removalMethods)[number];

/** Parts that air must not reach. */
export const sensitivePartKinds = [
  'flow-sensor',
  'flow-meter',
  'submeter',
  'pump',
  'pressure-regulator',
  'filter',
] as const;
export type SensitivePartKind = (typeof sensitivePartKinds)[number];

export const partOutcomes = ['found', 'none', 'not-found'] as const;
export const partProtections = ['removed-blank', 'removed-spool', 'bypassed', 'left'] as const;
export const keepingPlaces = ['truck', 'controller', 'customer', 'on-site', 'nowhere'] as const;

export const skies = ['clear', 'cloudy', 'rain', 'snow'] as const;
export const cardLanguages = ['en', 'es'] as const;

export const waterOffKinds = ['shutoff-closed', 'was-closed', 'street-closed'] as const;
export const valveStages = ['before-air', 'winter'] as const;
export const valvePositions = ['closed', 'half-open', 'open', 'other'] as const;

export const connectionPlaces = [
  'blow-out-fitting',
  'quick-coupler',
  'hose-bib',
  'test-cock',
  'other',
] as const;
export const closeDownSteps = ['compressor-off', 'hose-bled', 'hose-off'] as const;

/** What leaves the heads when a cycle ends, from most water to none. */
export const endSigns = ['water', 'spitting', 'mist', 'dry'] as const;

export const drainPositions = ['open', 'closed'] as const;
export const controllerModes = ['off', 'rain', 'still-on'] as const;
export const insulatedThings = ['backflow', 'pump', 'pipe'] as const;

export const visitOutcomes = ['done', 'cut-short'] as const;
export const cutShortReasons = ['no-access', 'no-shutoff', 'broken-pipe', 'weather', 'other'] as const;
export const presences = ['signed', 'nobody-present'] as const;
