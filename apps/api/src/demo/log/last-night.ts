import type { INestApplicationContext } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { CompanyContext } from '../../database/company-context';
import { ProjectionService } from '../../projection/projection.service';
import { Visit } from '../../visits/entities/visit.entity';
import { idOf } from '../chance';
import { addDays, instantAt, type Day } from '../local-time';
import { planStops, type PlannedStop } from '../plan';
import { demoCompany } from '../world/company';
import { demoCrews, peopleOfCrew } from '../world/people';
import type { DemoSite } from '../world/sites';
import { deliver, enrol } from './deliver';
import { DemoPhone } from './demo-phone';
import { visitLines, type Slips } from './visit-lines';

const companyId = demoCompany.id;

/** What went wrong yesterday, by crew and stop. */
const slipsOf: Slips[][] = [
  [
    {
      testCocksForgotten: true,
      defect: { where: 'Box 3', what: 'Valve lid is cracked', recommended: 'Replace the lid in spring' },
    },
    { airAfterDryInZone: 2, skippedZone: { number: 3, reason: 'Bed is being dug up, pipe is open' } },
  ],
  [
    {
      oneCycleInZone: 7,
      noPictureOfParts: true,
      note: 'Rows 1 to 6 run long. Gate was locked again at four.',
    },
    { controllerOn: true, waterLeftInZone: 2, note: 'Assembly not found. Blew from the depot wall.' },
  ],
  [{}, { gaugePsi: 88 }],
];

/** Entries of the last crew's last visit that have not left the phone. */
const stillOnThePhone = 14;

/** Brings in what the crews logged on the demo's first day. Begun and broken off, it is finished by the next run. */
export async function writeLastNight(
  app: INestApplicationContext,
  sites: readonly DemoSite[],
): Promise<void> {
  const context = app.get(CompanyContext);
  const day = await context.run(companyId, firstDay);
  const stops = planStops(sites, addDays(day, 1)).filter(({ date }) => date === day);
  if (await context.run(companyId, (manager) => isLogged(manager, stops))) return;
  for (const crew of demoCrews.keys()) {
    const phone = await writtenPhone(
      crew,
      stops.filter((stop) => stop.crew === crew),
      day,
    );
    await enrol(app, phone, instantAt(day, 6 * 60, demoCompany.settings.timeZone));
    await deliver(app, phone, crew === demoCrews.length - 1 ? stillOnThePhone : 0);
  }
  await app.get(ProjectionService, { strict: false }).catchUp(companyId);
}

async function firstDay(manager: EntityManager): Promise<Day> {
  const first = await manager.findOneOrFail(Visit, { where: { companyId }, order: { date: 'ASC' } });
  return first.date;
}

/** All crews have left all sites, but for the one whose phone is still out of reach. */
async function isLogged(manager: EntityManager, stops: readonly PlannedStop[]): Promise<boolean> {
  const rows = await manager.query<unknown[]>(
    `select 1 from log_entries where company_id = $1 and type = 'left' and visit_id = any($2::uuid[])`,
    [companyId, stops.map(({ id }) => id)],
  );
  return rows.length >= stops.length - 1;
}

async function writtenPhone(crew: number, stops: readonly PlannedStop[], day: Day): Promise<DemoPhone> {
  const [lead] = peopleOfCrew(crew);
  if (!lead) throw new Error(`crew ${crew} has nobody`);
  const phone = new DemoPhone(lead);
  for (const [place, stop] of stops.entries()) {
    const from = instantAt(day, (7 + place * 4) * 60 + 40 + crew * 7, demoCompany.settings.timeZone);
    await phone.writeVisit(stop.id, stop.site, visitLines(stop, slipsOf[crew]?.[place] ?? {}), from);
    if (crew === 1 && place === 0) sketch(phone, stop, from);
  }
  return phone;
}

/** An entry of a type that this version of the office does not know: kept, and shown to a person. */
function sketch(phone: DemoPhone, stop: PlannedStop, from: Date): void {
  const at = new Date(from.getTime() + 3 * 3_600_000);
  phone.seal({ visit: stop.id, type: 'sketch-drawn', body: { sketch: idOf('sketch', stop.id) } }, at);
}
