import type { CompanyDocument } from '@rimeward/contracts';
import type {
  EntryBody,
  EntryType,
  PhotoReference,
  System,
  VisitState,
  VisitStep,
} from '@rimeward/field-log';
import { createContext, useContext } from 'react';
import type { VisitTexts } from '../texts.en';
import type { PhoneVisit } from '../../../phone/queries/visits';

/** The highest gauge pressure of a zone today, and the part that sets it. */
export interface ZoneCeiling {
  pressurePsi: number;
  setBy: keyof VisitTexts['ceilingSetBy'];
  /** Name of the part when it is the weakest one on the path. */
  partName: string | null;
}

/** One visit as its screens see it: what is known, what has been written down, and the way to write more. */
export interface VisitLog {
  visit: PhoneVisit;
  system: System;
  company: CompanyDocument | null;
  state: VisitState;
  steps: VisitStep[];
  ceilings: Record<string, ZoneCeiling>;
  /** Lowest ceiling of all zones: what the regulator may not pass. Null without zones. */
  lowestCeiling: ZoneCeiling | null;
  me: { userId: string; blowOutSignedOff: boolean };
  /** Resolves to true only when the entry is committed on this phone; a fault is shown to the person by itself. */
  save: <T extends EntryType>(type: T, body: EntryBody<T>, photos?: PhotoReference[]) => Promise<boolean>;
  /** Corrects the entry to nothing, with a reason. */
  withdraw: (entryId: string, reason: string) => Promise<boolean>;
  nameOf: (userId: string) => string;
}

export const VisitLogContext = createContext<VisitLog | null>(null);

/** The visit of the screen. Only used below the visit route, which provides it. */
export function useVisitLog(): VisitLog {
  const log = useContext(VisitLogContext);
  if (!log) throw new Error('useVisitLog is used outside the visit route');
  return log;
}
