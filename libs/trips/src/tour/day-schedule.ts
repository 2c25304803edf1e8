import { costOf } from './cost-matrix';
import type { TourStop } from './day-request';
import type { TimedDay } from './timed/timed-day';

/** One stop of a day in order. Minutes of the clock are minutes since local midnight, and may pass 1440. */
export interface ScheduledStop {
  stopId: string;
  travelMinutes: number;
  arriveMinute: number;
  /** Minutes spent waiting for the window to open. */
  waitMinutes: number;
  startMinute: number;
  leaveMinute: number;
  /** Minutes by which work begins after the window has closed; 0 when it is kept. */
  lateMinutes: number;
}

/** The hours of a day. */
export interface DaySchedule {
  schedule: ScheduledStop[];
  travelMinutes: number;
  serviceMinutes: number;
  waitMinutes: number;
  lateMinutes: number;
  /** When the day ends: back at the yard, at its other end, or when the last stop is done. */
  finishMinute: number;
}

/** Walks through a day in an order of places and writes down its hours. */
export function scheduleOf(day: TimedDay, order: readonly number[], stops: readonly TourStop[]): DaySchedule {
  const schedule: ScheduledStop[] = [];
  let minute = day.departMinute;
  let here = 0;
  for (const place of order) {
    const travelMinutes = costOf(day.costs, here, place);
    const arriveMinute = minute + travelMinutes;
    const startMinute = Math.max(arriveMinute, day.opensMinute[place] as number);
    minute = startMinute + (day.serviceMinutes[place] as number);
    here = place;
    schedule.push({
      stopId: stops[place - 1]?.id ?? '',
      travelMinutes,
      arriveMinute,
      waitMinutes: startMinute - arriveMinute,
      startMinute,
      leaveMinute: minute,
      lateMinutes: Math.max(0, startMinute - (day.closesMinute[place] as number)),
    });
  }
  const sum = (field: 'travelMinutes' | 'waitMinutes' | 'lateMinutes'): number =>
    schedule.reduce((total, stop) => total + stop[field], 0);
  const closing = order.length === 0 ? 0 : day.closing(here);
  return {
    schedule,
    travelMinutes: sum('travelMinutes') + closing,
    serviceMinutes: order.reduce((total, place) => total + (day.serviceMinutes[place] as number), 0),
    waitMinutes: sum('waitMinutes'),
    lateMinutes: sum('lateMinutes'),
    finishMinute: minute + closing,
  };
}
