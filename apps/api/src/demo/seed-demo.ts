import type { INestApplicationContext } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { PasswordService } from '../auth/password.service';
import { CompanyContext } from '../database/company-context';
import { FeedService } from '../sync/feed/feed.service';
import { Company } from '../companies/entities/company.entity';
import { Visit } from '../visits/entities/visit.entity';
import { writeAccounts } from './accounts';
import { dayIn, type Day } from './local-time';
import { writeLastNight } from './log/last-night';
import { planStops, type PlannedStop } from './plan';
import { demoCompany } from './world/company';
import { demoSites, type DemoSite } from './world/sites';
import { hashPasswords, writeCompany, writeSites, writeStops } from './write-records';

/** Fills an empty database with the demo company; later runs plan the days that have come since, and change nothing else. */
export async function seedDemo(
  app: INestApplicationContext,
  { now, dataDir }: { now: Date; dataDir: string },
): Promise<void> {
  const context = app.get(CompanyContext);
  const sites = demoSites();
  const today = dayIn(demoCompany.settings.timeZone, now);
  const exists = await context.run(demoCompany.id, (manager) =>
    manager.existsBy(Company, { id: demoCompany.id }),
  );
  if (!exists) await found(app, sites, today);
  else await planAhead(app, sites, today);
  await writeLastNight(app, sites);
  writeAccounts(dataDir);
}

async function found(app: INestApplicationContext, sites: readonly DemoSite[], today: Day): Promise<void> {
  const hashes = await hashPasswords(app.get(PasswordService));
  const feed = app.get(FeedService, { strict: false });
  await app.get(CompanyContext).run(demoCompany.id, async (manager) => {
    await writeCompany(manager, hashes);
    await writeSites(manager, sites, today);
    await tell(manager, feed, await writeStops(manager, planStops(sites, today)));
  });
}

/** A demo that is opened again next week has stops on those days too; days that have any are left alone. */
async function planAhead(
  app: INestApplicationContext,
  sites: readonly DemoSite[],
  today: Day,
): Promise<void> {
  const feed = app.get(FeedService, { strict: false });
  await app.get(CompanyContext).run(demoCompany.id, async (manager) => {
    const missing: PlannedStop[] = [];
    for (const stop of planStops(sites, today).filter(({ date }) => date >= today)) {
      if (!(await manager.existsBy(Visit, { companyId: demoCompany.id, date: stop.date })))
        missing.push(stop);
    }
    if (missing.length > 0) await tell(manager, feed, await writeStops(manager, missing));
  });
}

async function tell(manager: EntityManager, feed: FeedService, visitIds: readonly string[]): Promise<void> {
  await feed.touch(manager, { kind: 'company' }, ...visitIds.map((id) => ({ kind: 'visit' as const, id })));
}
