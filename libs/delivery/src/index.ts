export { CanonicalFormError, canonicalText } from './canonical/canonical-text';
export { entryHash, noPrevious } from './chain/entry-hash';
export { readHeader, type EntryHeader } from './chain/entry-header';
export { fromHex, toHex } from './chain/hex';
export { emptyChain, sealEntry, type ChainHead, type SealedEntry } from './chain/seal-entry';
export { verifyChain, type ChainFault, type ChainVerdict } from './chain/verify-chain';
export { stuckReasons, type StuckReason } from './answers/stuck-reason';
export { startLoop, type DeliveryLoop, type LoopStatus } from './loop/delivery-loop';
export type { WakeCause } from './loop/wake-signal';
export type { Clock, Random, Timer } from './ports/clock';
export type { Codec, Sha256 } from './ports/codec';
export type { DeliveryPorts, ReceiptReading } from './ports/ports';
export type {
  Acknowledgement,
  ChainStanding,
  Contact,
  DeliveryStore,
  FeedPage,
  HeldEntry,
  OutgoingEntry,
} from './ports/store';
export type {
  FeedPlace,
  HttpAnswer,
  PhoneManifest,
  PhotoToSend,
  PushBatch,
  Sent,
  Transport,
} from './ports/transport';
export { runRound, type RoundReport } from './round/round';
export { freshMemory, type DeliveryMemory } from './round/step';
export {
  bundleFirstLine,
  readBundle,
  sectionEnd,
  sectionLine,
  type BundleReading,
  type BundleSection,
  type SectionHeader,
} from './bundle/bundle-format';
