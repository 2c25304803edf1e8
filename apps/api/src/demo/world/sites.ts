import type { System } from '@rimeward/field-log';
import { Chance, idOf } from '../chance';
import * as homes from '../systems/homes';
import * as large from '../systems/large';
import * as odd from '../systems/odd';
import { town } from './company';
import { accessNotes, familyNames, streets } from './words';

export interface DemoSite {
  id: string;
  /** Stable word for the site: what its ids and its chances follow from. */
  key: string;
  customer: { id: string; name: string; phone: string; email: string };
  name: string;
  address: string;
  latitude: number;
  longitude: number;
  elevationFt: number;
  accessNotes: string | null;
  gateCode: string | null;
  system: System;
}

/** A named place that is no house: what it is called and what lies there. */
const places: { name: string; build: homes.Builder; zones: number; customer: string }[] = [
  {
    name: 'Wrenfield Elementary School',
    build: large.school,
    zones: 14,
    customer: 'Wrenfield School District',
  },
  { name: 'Cattail Pond Park', build: large.parkWithPump, zones: 12, customer: 'Town of Wrenfield' },
  { name: 'Creekside Clinic', build: large.clinic, zones: 9, customer: 'Creekside Clinic' },
  { name: 'Old Depot Green', build: odd.unknownSystem, zones: 6, customer: 'Town of Wrenfield' },
  { name: 'Ridge View Row Houses', build: large.clinic, zones: 11, customer: 'Ridge View Association' },
];

/** How often each kind of garden turns up. */
const gardens: { build: homes.Builder; weight: number; most: number }[] = [
  { build: homes.homeWithPvb, weight: 16, most: 6 },
  { build: homes.homeWithDcva, weight: 9, most: 8 },
  { build: homes.homeWithDrip, weight: 7, most: 7 },
  { build: homes.hillsideHome, weight: 6, most: 8 },
  { build: odd.polyethylene, weight: 6, most: 6 },
  { build: homes.homeWithSvb, weight: 4, most: 5 },
  { build: homes.homeWithAvbs, weight: 2, most: 4 },
  { build: odd.manualDrains, weight: 2, most: 4 },
  { build: odd.automaticDrains, weight: 1, most: 5 },
  { build: odd.unknownSystem, weight: 1, most: 5 },
];

/** The site that the first technician has first today: eight zones, everything measured. */
export const firstSiteKey = 'first';

export function demoSites(): DemoSite[] {
  const kinds = shuffled(
    gardens.flatMap(({ weight, ...garden }) => Array.from({ length: weight }, () => garden)),
  );
  const first = garden(firstSiteKey, 0, homes.wellKnownHome, 8);
  const others = kinds.map(({ build, most }, index) => garden(`garden ${index + 1}`, index + 1, build, most));
  return [first, ...places.map(place), ...others];
}

function garden(key: string, index: number, build: homes.Builder, mostZones: number): DemoSite {
  const chance = new Chance(`site ${key}`);
  const family = familyNames[index % familyNames.length] ?? 'Marsh';
  const street = streets[(index * 7) % streets.length] ?? 'Main Street';
  const number = 100 + ((index * 37) % 90) * 4;
  const customer = {
    id: idOf('customer', key),
    name: `${family} family`,
    phone: phone(chance),
    email: `${family.toLowerCase()}${index}@mail.example`,
  };
  return siteOf(key, chance, {
    customer,
    name: `${family}, ${street}`,
    address: `${number} ${street}`,
    system: build(key, chance, chance.whole(3, mostZones)),
  });
}

function place({ name, build, zones, customer }: (typeof places)[number]): DemoSite {
  const chance = new Chance(`site ${name}`);
  const street = chance.pick(streets);
  return siteOf(name, chance, {
    customer: {
      id: idOf('customer', customer),
      name: customer,
      phone: phone(chance),
      email: `grounds@${customer.toLowerCase().replaceAll(/[^a-z]+/g, '-')}.example`,
    },
    name,
    address: `${chance.whole(1, 90) * 10} ${street}`,
    system: build(name, chance, zones),
  });
}

type About = Pick<DemoSite, 'customer' | 'name' | 'address' | 'system'>;

function siteOf(key: string, chance: Chance, about: About): DemoSite {
  const away = (): number => (chance.next() * 2 - 1) * town.reach;
  const gated = chance.often(0.35);
  return {
    id: idOf('site', key),
    key,
    ...about,
    latitude: round(town.latitude + away(), 5),
    longitude: round(town.longitude + away(), 5),
    elevationFt: town.elevationFt + chance.whole(-60, 140),
    accessNotes: chance.often(0.7) ? chance.pick(accessNotes) : null,
    gateCode: gated ? `${chance.whole(1_000, 9_999)}#` : null,
  };
}

/** Numbers of the range that is set aside for invented people: 555-0100 to 555-0199. */
function phone(chance: Chance): string {
  return `(970) 555-01${String(chance.whole(0, 99)).padStart(2, '0')}`;
}

function shuffled<T>(ordered: readonly T[]): T[] {
  const chance = new Chance('order of the gardens');
  return ordered
    .map((one) => ({ one, place: chance.next() }))
    .sort((a, b) => a.place - b.place)
    .map(({ one }) => one);
}

function round(value: number, digits: number): number {
  return Math.round(value * 10 ** digits) / 10 ** digits;
}
