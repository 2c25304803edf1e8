import type { Rule } from './finding/rule';
import type { RuleId } from './finding/rule-params';
import * as againstPlan from './rules/cycles/against-plan';
import * as cycleCount from './rules/cycles/count';
import * as endSigns from './rules/cycles/end-signs';
import * as cycleTimes from './rules/cycles/times';
import * as compressor from './rules/equipment/compressor';
import * as doubtfulPhotos from './rules/evidence/doubtful-photos';
import * as missingPhotos from './rules/evidence/missing-photos';
import * as records from './rules/evidence/records';
import * as airBefore from './rules/order/air-before';
import * as airEnds from './rules/order/air-ends';
import * as backflow from './rules/order/backflow';
import { noZoneOpen } from './rules/order/no-zone-open';
import * as sensitiveParts from './rules/order/sensitive-parts';
import * as crew from './rules/people/crew';
import * as safety from './rules/people/safety';
import * as ceiling from './rules/pressure/ceiling';
import * as readings from './rules/pressure/readings';
import * as chain from './rules/time/chain';
import * as clocks from './rules/time/clocks';
import * as presence from './rules/time/presence';
import * as closeUp from './rules/winter/close-up';
import * as drains from './rules/winter/drains';
import * as valves from './rules/winter/valves';

/**
 * Version of the whole set, kept with every judged visit: raised whenever a rule, a threshold or a severity changes. The date of
 * the change and a number within the day.
 */
export const RULES_VERSION = '2026-12-01.1';

type Registry = { readonly [T in RuleId]: Rule<T> };

/** Every rule by its id, in the order in which findings of one severity are told: as the work goes. */
export const rulesById: Registry = {
  'people-not-clear': safety.peopleNotClear,
  'couplings-not-pinned': safety.couplingsNotPinned,
  'cautions-not-read': safety.cautionsNotRead,
  'interlock-passed': safety.interlockPassed,
  'air-before-water-off': airBefore.airBeforeWaterOff,
  'air-before-relief': airBefore.airBeforeRelief,
  'air-before-sensitive-part': sensitiveParts.airBeforeSensitivePart,
  'sensitive-part-left': sensitiveParts.sensitivePartLeft,
  'sensitive-part-unknown': sensitiveParts.sensitivePartUnknown,
  'air-through-backflow': backflow.airThroughBackflow,
  'air-with-backflow-open': backflow.airWithBackflowOpen,
  'connection-not-recorded': backflow.connectionNotRecorded,
  'no-zone-open': noZoneOpen,
  'over-ceiling': ceiling.overCeiling,
  'regulator-over-ceiling': ceiling.regulatorOverCeiling,
  'regulator-not-recorded': readings.regulatorNotRecorded,
  'no-gauge-reading': readings.noGaugeReading,
  'visit-cut-short': airEnds.visitCutShort,
  'zone-without-air': cycleCount.zoneWithoutAir,
  'zone-skipped': cycleCount.zoneSkipped,
  'too-few-cycles': cycleCount.tooFewCycles,
  'never-dry': endSigns.neverDry,
  'end-sign-missing': endSigns.endSignMissing,
  'air-unattended': cycleTimes.airUnattended,
  'cycle-too-long': cycleTimes.cycleTooLong,
  'air-after-dry': endSigns.airAfterDry,
  'tank-burst-pattern': compressor.tankBurstPattern,
  'rest-too-short': cycleTimes.restTooShort,
  'air-against-water': againstPlan.airAgainstWater,
  'order-against-plan': againstPlan.orderAgainstPlan,
  'compressor-too-small': compressor.compressorTooSmall,
  'compressor-not-recorded': compressor.compressorNotRecorded,
  'air-never-stopped': airEnds.airNeverStopped,
  'stop-without-start': airEnds.stopWithoutStart,
  'hose-off-under-pressure': airEnds.hoseOffUnderPressure,
  'close-down-incomplete': airEnds.closeDownIncomplete,
  'valve-not-half-open': valves.valveNotHalfOpen,
  'valve-not-recorded': valves.valveNotRecorded,
  'valve-not-worked': valves.valveNotWorked,
  'pump-not-drained': closeUp.pumpNotDrained,
  'drain-left-open': drains.drainLeftOpen,
  'drain-not-dry': drains.drainNotDry,
  'drain-not-recorded': drains.drainNotRecorded,
  'plug-not-refitted': closeUp.plugNotRefitted,
  'controller-still-on': closeUp.controllerStillOn,
  'part-kept-nowhere': records.partKeptNowhere,
  'part-without-photo': missingPhotos.partWithoutPhoto,
  'backflow-without-photo': missingPhotos.backflowWithoutPhoto,
  'damage-without-photo': missingPhotos.damageWithoutPhoto,
  'defect-without-photo': missingPhotos.defectWithoutPhoto,
  'photo-used-twice': doubtfulPhotos.photoUsedTwice,
  'photo-far-from-site': doubtfulPhotos.photoFarFromSite,
  'photo-taken-earlier': doubtfulPhotos.photoTakenEarlier,
  'photo-from-gallery': doubtfulPhotos.photoFromGallery,
  'correction-ignored': records.correctionIgnored,
  'chain-broken': chain.chainBroken,
  'device-gap': chain.deviceGap,
  'two-places-at-once': presence.twoPlacesAtOnce,
  'visit-shorter-than-air': presence.visitShorterThanAir,
  'clock-set-back': clocks.clockSetBack,
  'clock-implausible': clocks.clockImplausible,
  'clock-changed': clocks.clockChanged,
  'not-signed-off': crew.notSignedOff,
  'working-alone': crew.workingAlone,
};

/** The same rules as a list, in the same order. */
export const rules: readonly Rule<RuleId>[] = Object.values(rulesById);
