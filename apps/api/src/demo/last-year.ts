import type { VisitSummary } from '../visits/entities/visit-summary.entity';
import { Chance, idOf } from './chance';
import { addDays, type Day } from './local-time';
import { demoPeople } from './world/people';
import type { DemoSite } from './world/sites';
import { lastYearNotes } from './world/words';

const partWords: Record<string, string> = {
  'flow-sensor': 'Flow sensor, blank fitted',
  'flow-meter': 'Flow meter, spool fitted',
  submeter: 'Submeter, spool fitted',
  pump: 'Pump, drained in place',
  'pressure-regulator': 'Pressure regulator, bypassed',
  filter: 'Filter element',
};

/** What last year's crew left for this year's. A few sites are new and have nothing. */
export function lastYearOf(site: DemoSite, today: Day): Omit<VisitSummary, 'companyId'> | null {
  const chance = new Chance(`last year ${site.key}`);
  if (chance.often(0.12)) return null;
  const crew = chance.whole(0, 2);
  const notes = [chance.pick(lastYearNotes), chance.pick(lastYearNotes)];
  return {
    id: idOf('summary', site.key),
    systemId: site.system.id,
    date: addDays(today, -365 + chance.whole(-9, 12)),
    technicians: demoPeople.filter((one) => one.crew === crew).map(({ name }) => name),
    notes: [...new Set(notes)],
    partsTakenOut: site.system.sensitiveParts.map(
      ({ kind, place }) => `${partWords[kind] ?? kind}: ${place.toLowerCase()}`,
    ),
  };
}
