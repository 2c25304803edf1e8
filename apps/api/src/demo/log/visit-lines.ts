import type { System, Zone } from '@rimeward/field-log';
import { Chance, idOf } from '../chance';
import type { PlannedStop } from '../plan';
import { demoCompressors, demoHoses } from '../world/equipment';
import { peopleOfCrew } from '../world/people';
import { line, type Line } from './line';

/** What went wrong on a demo visit; each is something that the rules find. */
export interface Slips {
  gaugePsi?: number;
  /** Number of the zone that got one cycle only, and of the one that still ran water at the end. */
  oneCycleInZone?: number;
  waterLeftInZone?: number;
  airAfterDryInZone?: number;
  noPictureOfParts?: boolean;
  testCocksForgotten?: boolean;
  controllerOn?: boolean;
  skippedZone?: { number: number; reason: string };
  defect?: { where: string; what: string; recommended: string };
  note?: string;
}

/** A whole visit to this stop, from the truck to the truck. */
export function visitLines(stop: PlannedStop, slips: Slips): Line[] {
  const { system } = stop.site;
  return [
    ...arrival(stop),
    ...walkThrough(system, slips),
    ...waterOff(system),
    ...connection(system, slips),
    ...air(stop, slips),
    ...winter(system, slips),
    ...leaving(slips),
  ];
}

function arrival(stop: PlannedStop): Line[] {
  const { latitude, longitude, system } = stop.site;
  const arrived = line(
    'arrived',
    {
      position: { latitude, longitude, accuracyM: 8 },
      airTemperatureF: 41,
      sky: 'cloudy',
      crew: peopleOfCrew(stop.crew).map(({ id }) => id),
      compressorId: demoCompressors[stop.crew]?.id ?? null,
      hoseId: demoHoses[2]?.id ?? null,
      removalMethod: system.removalMethod === 'unknown' ? 'blow-out' : system.removalMethod,
    },
    { pictures: ['site'] },
  );
  return [arrived, line('cautions-read', { card: 'before-first-air', language: 'en' })];
}

function walkThrough(system: System, { noPictureOfParts = false }: Slips): Line[] {
  return system.sensitiveParts.flatMap(({ id: partId, kind, hasBypass }) => [
    line('part-looked-for', { partId, kind, outcome: 'found' }, { afterSeconds: 150 }),
    line(
      'part-protected',
      {
        partId,
        kind,
        how: hasBypass || kind === 'pump' ? 'bypassed' : 'removed-blank',
        keptWhere: hasBypass || kind === 'pump' ? null : 'controller',
      },
      { afterSeconds: 240, pictures: noPictureOfParts ? [] : ['sensitive-part'] },
    ),
  ]);
}

function waterOff(system: System): Line[] {
  const shutoffs = system.backflow.valves.filter(({ role }) => role === 'shutoff');
  return [
    line('water-off', { kind: 'shutoff-closed' }, { afterSeconds: 120 }),
    line('pressure-relieved', { zoneId: system.zones[0]?.id ?? null }, { afterSeconds: 90 }),
    ...shutoffs.map(({ id: valveId }) =>
      line('valve-set', { valveId, stage: 'before-air', position: 'closed', workedThrough: false }),
    ),
  ];
}

function connection(system: System, { gaugePsi = 45 }: Slips): Line[] {
  const known = system.airConnection.kind;
  return [
    line(
      'air-connected',
      {
        place: known === 'unknown' ? 'other' : known,
        downstreamOfBackflow: true,
        couplingsPinned: true,
      },
      { afterSeconds: 240, pictures: ['air-connection'] },
    ),
    line('regulator-set', { pressurePsi: gaugePsi }, { afterSeconds: 60 }),
    line('people-clear', { areaClear: true, eyesAndEars: true }),
  ];
}

/** Two rounds through all zones, the second drier than the first; a zone rests while the others have their turn. */
function air(stop: PlannedStop, slips: Slips): Line[] {
  const { zones } = stop.site.system;
  const blown = zones.filter(({ number }) => number !== slips.skippedZone?.number);
  const skipped = zones.find(({ number }) => number === slips.skippedZone?.number);
  const rounds = [1, 2].flatMap((round) =>
    blown
      .filter(({ number }) => round === 1 || number !== slips.oneCycleInZone)
      .flatMap((zone) => cycle(stop, zone, round, slips)),
  );
  const extra = blown.filter(({ number }) => number === slips.airAfterDryInZone);
  return [
    ...rounds,
    ...extra.flatMap((zone) => cycle(stop, zone, 3, slips)),
    ...(skipped && slips.skippedZone
      ? [line('zone-skipped', { zoneId: skipped.id, reason: slips.skippedZone.reason })]
      : []),
    line('air-closed-down', { step: 'compressor-off' }),
    line('air-closed-down', { step: 'hose-bled' }, { afterSeconds: 70 }),
    line('air-closed-down', { step: 'hose-off' }),
  ];
}

function cycle(stop: PlannedStop, zone: Zone, round: number, slips: Slips): Line[] {
  const chance = new Chance(`cycle ${stop.site.key} ${zone.number} ${round}`);
  const cycleId = idOf('cycle', stop.id, zone.number, round);
  const seconds = round === 1 ? chance.whole(70, 115) : chance.whole(45, 80);
  const pressurePsi = (slips.gaugePsi ?? 45) - chance.whole(0, 3);
  return [
    line(
      'air-started',
      { cycleId, zoneId: zone.id, gaugePsi: pressurePsi },
      { afterSeconds: chance.whole(25, 45) },
    ),
    line('air-stopped', { cycleId, elapsedMs: seconds * 1_000 }, { afterSeconds: seconds }),
    line('end-sign-seen', { cycleId, sign: signOf(zone, round, slips) }, { afterSeconds: 6 }),
  ];
}

function signOf({ number }: Zone, round: number, slips: Slips): 'water' | 'spitting' | 'mist' | 'dry' {
  if (number === slips.waterLeftInZone) return round === 1 ? 'water' : 'spitting';
  if (number === slips.airAfterDryInZone) return round === 1 ? 'mist' : 'dry';
  return round === 1 ? 'spitting' : 'mist';
}

function winter(system: System, slips: Slips): Line[] {
  const valves = system.backflow.valves.filter(({ role }) => role === 'shutoff' || !slips.testCocksForgotten);
  return [
    ...valves.map(({ id: valveId }, index) =>
      line(
        'valve-set',
        { valveId, stage: 'winter', position: 'half-open', workedThrough: true },
        { pictures: index === 0 ? ['backflow-valve'] : [] },
      ),
    ),
    ...system.drains.map(({ id: drainId, kind }) =>
      line('drain-set', { drainId, ranDry: kind !== 'automatic', position: 'closed' }, { afterSeconds: 120 }),
    ),
    ...(system.pump
      ? [line('pump-drained', { pumpId: system.pump.id, drained: true }, { pictures: ['drain'] })]
      : []),
    line('connection-plugged', { plugged: true }),
    line('controller-set', { mode: slips.controllerOn ? 'still-on' : 'off' }, { afterSeconds: 120 }),
  ];
}

function leaving({ defect, note }: Slips): Line[] {
  return [
    ...(defect ? [line('defect-found', { zoneId: null, ...defect }, { pictures: ['defect'] })] : []),
    ...(note === undefined ? [] : [line('note-written', { text: note })]),
    line('left', { outcome: 'done', why: null, present: 'nobody-present' }, { afterSeconds: 180 }),
  ];
}
