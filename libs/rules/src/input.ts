import type { System, VisitState } from '@rimeward/field-log';
import type { ZoneCeiling } from './facts/ceilings';
import type { ThresholdChoices } from './thresholds';

/** What a company has chosen, as far as the rules care. The API's company settings fit. */
export interface RuleSettings {
  pressureCapPsi: number | null;
  forbidsWorkingAlone: boolean;
  thresholds?: ThresholdChoices;
}

/** A stay of the same person somewhere else. */
export interface OtherStay {
  visitId: string;
  siteName: string;
  actor: string;
  fromMs: number;
  toMs: number;
}

/**
 * What the log of this visit alone cannot tell. Everything is optional: a phone knows less than the office, and a rule without
 * its facts says nothing.
 */
export interface RuleContext {
  /** Other visits that a photograph of this one was used on, by its SHA-256. */
  photosElsewhere?: Readonly<Record<string, readonly string[]>>;
  /** When a photograph says it was taken (read from the file), ms since the epoch, by its SHA-256. */
  photoTakenMs?: Readonly<Record<string, number>>;
  site?: { latitude: number; longitude: number } | null;
  /** Who is signed off for blow-out work; whoever is not listed is not judged. */
  signedOff?: Readonly<Record<string, boolean>>;
  otherStays?: readonly OtherStay[];
  /** Runs of a device's sequence that have not arrived. */
  deviceGaps?: readonly { device: string; fromSeq: number; toSeq: number }[];
  brokenChains?: readonly { device: string; seq: number; entryId: string }[];
}

/** What was worked out for this system before the air went on. */
export interface RulePlan {
  /** Zone ids in the proposed order. */
  order: readonly string[];
  /** Air time expected until mist, all cycles of a zone together, s; null where it could not be worked out. */
  airSecondsByZone: Readonly<Record<string, number | null>>;
  /** Longest cycle of a zone, s. */
  capSecondsByZone?: Readonly<Record<string, number>>;
  compressor?: { name: string; verdict: 'suitable' | 'slow' | 'too-small' };
}

export interface RulesInput {
  state: VisitState;
  system: System;
  settings: RuleSettings;
  /** Ceilings worked out with temperature and ratings; the plain 80 and 50 psi hold where there is none. */
  ceilingByZone?: Readonly<Record<string, ZoneCeiling>>;
  plan?: RulePlan;
  context?: RuleContext;
  /**
   * True to judge what is still missing although nobody has left yet (the phone asks before leaving, the office the next
   * morning). Without it, missing things count once the visit has been left as done.
   */
  atTheEnd?: boolean;
}
