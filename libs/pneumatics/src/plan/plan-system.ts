import { zoneOrder } from '../order/zone-order';
import type { PlanInput, ZoneInput } from './plan-input';
import { planZoneIn } from './plan-zone';
import { siteAir } from './site-air';
import { planCautions, type SystemPlan } from './zone-plan';

/**
 * Everything computed for a system: delivery at the site, order of the zones, and a plan for each in that order, the first of which
 * clears the main line. Plain data in and out; works without signal on a phone.
 */
export function planSystem(input: PlanInput): SystemPlan {
  const air = siteAir(input);
  const order = zoneOrder(input.system.zones, input.company.orderWeights);
  const inOrder = order.ok ? arranged(input.system.zones, order.value.places) : input.system.zones;
  return {
    delivery: air.delivery,
    order,
    zones: inOrder.map((zone, at) => planZoneIn(input, air, zone, at === 0)),
    cautions: planCautions,
  };
}

function arranged(zones: readonly ZoneInput[], places: readonly { zoneId: string }[]): ZoneInput[] {
  const byId = new Map(zones.map((zone) => [zone.id, zone]));
  return places.flatMap(({ zoneId }) => byId.get(zoneId) ?? []);
}
