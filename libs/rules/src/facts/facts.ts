import type {
  AirCycle,
  EntryType,
  FoldedEntry,
  System,
  VisitState,
  Zone,
  ZoneState,
} from '@rimeward/field-log';
import type { RuleContext, RulePlan, RulesInput, RuleSettings } from '../input';
import { thresholdsOf, type Thresholds } from '../thresholds';
import { plainCeiling, type ZoneCeiling } from './ceilings';
import { surelyBefore } from './surely-before';

/** A zone of the record, or one that only the log knows. */
export interface ZoneFacts {
  id: string;
  /** 0 for a zone that is not on record. */
  number: number;
  name: string;
  zone: Zone | null;
  state: ZoneState | null;
  cycles: readonly AirCycle[];
  ceiling: ZoneCeiling;
}

/** A visit prepared once for all rules. */
export interface VisitFacts {
  state: VisitState;
  system: System;
  settings: RuleSettings;
  context: RuleContext;
  plan: RulePlan | null;
  thresholds: Thresholds;
  /** Entries that have not been withdrawn, in the order of the log. */
  standing: readonly FoldedEntry[];
  /** Place of an entry in the log; a later entry has a higher one. */
  placeOf: (entryId: string) => number;
  first: (type: EntryType) => FoldedEntry | null;
  /** Whether one entry came before another beyond the doubt of their clocks. */
  surelyBefore: (one: FoldedEntry, other: FoldedEntry) => boolean;
  /** The entry with which the first air went on; null when there was none. */
  firstAir: FoldedEntry | null;
  /** In the order of their numbers, zones that only the log knows last. */
  zones: readonly ZoneFacts[];
  zoneOf: (zoneId: string) => ZoneFacts;
  /** All cycles, oldest first. */
  cycles: readonly AirCycle[];
  /** The water is to be driven out with air. */
  usesAir: boolean;
  /** What is missing counts as missing: nobody will add it on this visit. */
  atTheEnd: boolean;
}

export function factsOf(input: RulesInput): VisitFacts {
  const { state, system, settings } = input;
  const standing = state.entries.filter((one) => one.standing !== 'withdrawn');
  const places = new Map<string, number>();
  const firsts = new Map<EntryType, FoldedEntry>();
  for (const [place, one] of standing.entries()) {
    places.set(one.entry.id, place);
    if (!firsts.has(one.entry.type)) firsts.set(one.entry.type, one);
  }
  const placeOf = (entryId: string): number => places.get(entryId) ?? -1;
  const zones = zonesOf(input);
  const byId = new Map(zones.map((zone) => [zone.id, zone]));
  const method = state.arrived?.removalMethod ?? system.removalMethod;
  const thresholds = thresholdsOf(settings.thresholds);
  const leftDone = state.left?.outcome === 'done';
  return {
    state,
    system,
    settings,
    context: input.context ?? {},
    plan: input.plan ?? null,
    thresholds,
    standing,
    placeOf,
    first: (type) => firsts.get(type) ?? null,
    surelyBefore: (one, other) => surelyBefore(one, other, thresholds.clockMinutes),
    firstAir: firsts.get('air-started') ?? null,
    zones,
    zoneOf: (zoneId) => byId.get(zoneId) ?? zoneFacts(input, null, zoneId),
    cycles: zones
      .flatMap((zone) => zone.cycles)
      .sort((one, other) => placeOf(one.started.entryId) - placeOf(other.started.entryId)),
    usesAir: method === 'blow-out' || method === 'unknown',
    atTheEnd: leftDone || (input.atTheEnd === true && state.left === null),
  };
}

function zonesOf(input: RulesInput): ZoneFacts[] {
  const known = input.system.zones.map((zone) => zoneFacts(input, zone, zone.id));
  known.sort((one, other) => one.number - other.number);
  const ids = new Set(input.system.zones.map((zone) => zone.id));
  const found = Object.keys(input.state.zones).filter((id) => !ids.has(id));
  return [...known, ...found.map((id) => zoneFacts(input, null, id))];
}

function zoneFacts(input: RulesInput, zone: Zone | null, id: string): ZoneFacts {
  const state = input.state.zones[id] ?? null;
  return {
    id,
    number: zone?.number ?? 0,
    name: zone?.name ?? '',
    zone,
    state,
    cycles: state?.cycles ?? [],
    ceiling: input.ceilingByZone?.[id] ?? plainCeiling(input.system, zone, input.settings.pressureCapPsi),
  };
}

/** The params by which a sentence names a zone. */
export function named(zone: ZoneFacts): { zoneNumber: number; zoneName: string } {
  return { zoneNumber: zone.number, zoneName: zone.name };
}

/** Whole seconds of air in some cycles; running ones count for nothing. */
export function airSeconds(cycles: readonly AirCycle[]): number {
  return Math.round(cycles.reduce((sum, cycle) => sum + (cycle.durationMs ?? 0), 0) / 1_000);
}
