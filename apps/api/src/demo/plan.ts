import { Chance, idOf } from './chance';
import { addDays, type Day } from './local-time';
import { demoCrews } from './world/people';
import { firstSiteKey, type DemoSite } from './world/sites';
import { planNotes } from './world/words';

export interface PlannedStop {
  id: string;
  site: DemoSite;
  date: Day;
  sequence: number;
  crew: number;
  note: string | null;
}

/** Stops of each crew on each day from yesterday on; yesterday's are the ones that the review finds in the morning. */
const stopsADay = [2, 5, 5, 4, 4] as const;

/**
 * Who goes where from yesterday on. Each site once; the first crew begins today at the site that is known best. Ids follow
 * from day and place in the day, so that planning the same day twice gives the same stops.
 */
export function planStops(sites: readonly DemoSite[], today: Day): PlannedStop[] {
  const crews = demoCrews.map((_, crew) => routeOf(sites, crew));
  return crews.flatMap((route, crew) => {
    const left = [...route];
    return stopsADay.flatMap((count, index) => {
      const date = addDays(today, index - 1);
      return left.splice(0, count).map((site, place) => stopAt(site, date, place + 1, crew));
    });
  });
}

function stopAt(site: DemoSite, date: Day, sequence: number, crew: number): PlannedStop {
  const chance = new Chance(`stop ${site.key}`);
  return {
    id: idOf('visit', date, crew, sequence),
    site,
    date,
    sequence,
    crew,
    note: chance.often(0.45) ? chance.pick(planNotes) : null,
  };
}

/** Each third site, the named ones spread over the crews; the best known one comes right after yesterday's two. */
function routeOf(sites: readonly DemoSite[], crew: number): DemoSite[] {
  const rest = sites.filter(({ key }) => key !== firstSiteKey);
  const own = rest.filter((_, index) => (index + 1) % demoCrews.length === crew);
  const first = sites.find(({ key }) => key === firstSiteKey);
  return crew === 0 && first ? [...own.slice(0, 2), first, ...own.slice(2)] : own;
}
