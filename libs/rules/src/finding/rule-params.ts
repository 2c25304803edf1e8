import type { CeilingSource } from '../facts/ceilings';

type OfZone = {
  zoneNumber: number;
  zoneName: string;
};
type OfPart = {
  part: string;
};
type OfDevice = {
  device: string;
};
/** `said`: somebody wrote down that it is so; `not-recorded`: nobody wrote anything. */
type SaidOrNot = {
  how: 'said' | 'not-recorded';
};
/** `late`: done, but after the first air; `never`: not done at all. */
type LateOrNever = {
  how: 'late' | 'never';
};

/** Every rule by its stable id, with the figures that its sentence is made from: US units, the unit in the name. */
export interface RuleParams {
  'air-before-water-off': LateOrNever & OfZone;
  'air-before-relief': LateOrNever & OfZone;
  'air-before-sensitive-part': OfPart;
  'sensitive-part-left': OfPart & { reason: string };
  'sensitive-part-unknown': OfPart & { how: 'not-looked-for' | 'not-found' | 'not-protected' };
  'air-through-backflow': { place: string };
  'connection-not-recorded': Record<never, never>;
  'air-with-backflow-open': { valve: string; how: 'open' | 'not-recorded' };
  'no-zone-open': OfZone;
  'air-never-stopped': OfZone;
  'stop-without-start': Record<never, never>;
  'hose-off-under-pressure': Record<never, never>;
  'close-down-incomplete': { steps: number };
  'visit-cut-short': { why: string; zonesLeft: number };

  'over-ceiling': OfZone & {
    pressurePsi: number;
    ceilingPsi: number;
    overPsi: number;
    airSeconds: number;
    setBy: CeilingSource;
  };
  'regulator-over-ceiling': OfZone & { pressurePsi: number; ceilingPsi: number; setBy: CeilingSource };
  'regulator-not-recorded': Record<never, never>;
  'no-gauge-reading': OfZone;

  'too-few-cycles': OfZone & { cycles: number; wanted: number };
  'zone-without-air': OfZone;
  'zone-skipped': OfZone & { reason: string };
  'never-dry': OfZone & { sign: string };
  'end-sign-missing': OfZone;
  'cycle-too-long': OfZone & { seconds: number; capSeconds: number };
  'air-unattended': OfZone & { seconds: number };
  'rest-too-short': OfZone & { seconds: number; wantedSeconds: number };
  'air-after-dry': OfZone & { seconds: number };
  'order-against-plan': OfZone & { plannedPlace: number; place: number };
  'air-against-water': OfZone & {
    airSeconds: number;
    expectedSeconds: number;
    how: 'too-little' | 'too-much';
  };

  'compressor-not-recorded': Record<never, never>;
  'compressor-too-small': { compressor: string };
  'tank-burst-pattern': OfZone & { cycles: number; seconds: number };

  'valve-not-half-open': { valve: string; position: string };
  'valve-not-recorded': { valve: string };
  'valve-not-worked': { valve: string };
  'drain-left-open': { drain: string; place: string };
  'drain-not-recorded': { drain: string; place: string };
  'drain-not-dry': { drain: string; place: string };
  'plug-not-refitted': SaidOrNot;
  'pump-not-drained': SaidOrNot;
  'controller-still-on': SaidOrNot;

  'part-without-photo': OfPart;
  'backflow-without-photo': Record<never, never>;
  'damage-without-photo': { where: string };
  'defect-without-photo': { where: string };
  'photo-used-twice': { sha256: string; visits: number };
  'photo-far-from-site': { sha256: string; distanceM: number };
  'photo-taken-earlier': { sha256: string; hours: number };
  'photo-from-gallery': { photos: number };
  'part-kept-nowhere': OfPart;
  'correction-ignored': Record<never, never>;

  'clock-set-back': OfDevice & { minutes: number; times: number };
  'clock-changed': OfDevice & { minutes: number };
  'clock-implausible': OfDevice & { entries: number };
  'two-places-at-once': { person: string; elsewhere: string; minutes: number };
  'visit-shorter-than-air': { visitSeconds: number; airSeconds: number };
  'device-gap': OfDevice & { missing: number };
  'chain-broken': OfDevice & { seq: number };

  'interlock-passed': { interlock: string; reason: string };
  'cautions-not-read': Record<never, never>;
  'people-not-clear': LateOrNever;
  'couplings-not-pinned': Record<never, never>;
  'not-signed-off': { person: string };
  'working-alone': { person: string };
}

export type RuleId = keyof RuleParams;
