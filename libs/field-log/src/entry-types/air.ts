import { z } from 'zod';
import { closeDownSteps, connectionPlaces, endSigns } from '../words/words';

const gaugePsi = z.number().min(0).max(500);

export const airConnectedBody = z.strictObject({
  place: z.enum(connectionPlaces),
  downstreamOfBackflow: z.boolean(),
  couplingsPinned: z.boolean(),
});

export const regulatorSetBody = z.strictObject({ pressurePsi: gaugePsi });

/** Nobody stands at heads, hose or fittings; eyes and ears are protected. */
export const peopleClearBody = z.strictObject({ areaClear: z.boolean(), eyesAndEars: z.boolean() });

/** An interlock was passed by choice. Interlocks that protect people cannot be passed. */
export const interlockPassedBody = z.strictObject({
  interlock: z.string().max(60),
  reason: z.string().min(3).max(1_000),
});

export const zoneOpenedBody = z.strictObject({ zoneId: z.uuid() });
export const zoneClosedBody = z.strictObject({ zoneId: z.uuid() });

/** Air goes into a zone; the zone valve counts as open from here on. */
export const airStartedBody = z.strictObject({
  cycleId: z.uuid(),
  zoneId: z.uuid(),
  gaugePsi: gaugePsi.nullable(),
});

/** `elapsedMs` is the phone's own steady clock when the page lived through the cycle, else null. */
export const airStoppedBody = z.strictObject({
  cycleId: z.uuid(),
  elapsedMs: z.number().int().min(0).nullable(),
});

export const endSignSeenBody = z.strictObject({ cycleId: z.uuid(), sign: z.enum(endSigns) });

export const gaugeReadBody = z.strictObject({ cycleId: z.uuid().nullable(), pressurePsi: gaugePsi });

export const headsSeenBody = z.strictObject({ zoneId: z.uuid(), what: z.string().min(1).max(1_000) });

export const zoneSkippedBody = z.strictObject({ zoneId: z.uuid(), reason: z.string().min(3).max(1_000) });

/** Compressor off, then hose pressure bled, then hose off: one entry each, in any order that happened. */
export const airClosedDownBody = z.strictObject({
  step: z.enum(closeDownSteps),
});
