export * from './explain/source';
export { sources, type SourceId } from './explain/sources';
export * from './explain/formulas';
export type { Assumption, AssumptionReason, Explained, Explanation, InputValue } from './explain/explanation';
export * from './pipe/material';
export type { PipeRun } from './pipe/pipe-run';
export type { PipeSize } from './pipe/dimensions/pipe-size';
export { nominalSizesIn, sizeOf } from './pipe/size-of';
export * from './pipe/inside-diameter';
export * from './pipe/water-held';
export { pvcHighestF, polyethyleneHighestF, temperatureFactor } from './pipe/temperature-factor';
export * from './pipe/rating';
export { standardAtmosphere, type Atmosphere } from './atmosphere/standard-atmosphere';
export * from './ceiling/candidate';
export * from './ceiling/policies';
export * from './ceiling/pressure-ceiling';
export type { Compressor } from './air-demand/compressor';
export * from './air-demand/compressor-fit';
export { compressorDelivery, type Delivery } from './air-demand/delivery';
export { displacementAir, type DisplacementAir } from './air-demand/displacement';
export { openHeadsAir, type AirAround, type OpenHeads } from './air-demand/open-heads';
export { waterPushed, type WaterPushed, type WaterPushedInput } from './air-demand/water-pushed';
export { usualCouplingFactor, type Hose } from './loss/hose';
export { hoseLoss, type HoseLoss, type LossWarning } from './loss/hose-loss';
export {
  heldPressure,
  type GaugeMeaning,
  type HeldPressure,
  type HeldPressureInput,
} from './loss/held-pressure';
export { harrisLossPsi, harrisOutletPsia } from './loss/harris';
export * from './temperature/discharge';
export * from './temperature/hose-cooling';
export * from './energy/stored-energy';
export * from './noise/noise-dose';
export * from './cycles/head-kind';
export * from './cycles/air-cycles';
export type { OrderedZoneInput } from './order/ordered-zone';
export type { PlaceReason } from './order/place-reason';
export * from './order/zone-order';
export * from './plan/plan-input';
export * from './plan/zone-plan';
export { planZone } from './plan/plan-zone';
export { planSystem } from './plan/plan-system';
