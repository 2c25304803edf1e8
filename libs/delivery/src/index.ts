export { CanonicalFormError, canonicalText } from './canonical/canonical-text';
export { entryHash, noPrevious } from './chain/entry-hash';
export { readHeader, type EntryHeader } from './chain/entry-header';
export { fromHex, toHex } from './chain/hex';
export { emptyChain, sealEntry, type ChainHead, type SealedEntry } from './chain/seal-entry';
export { verifyChain, type ChainFault, type ChainVerdict } from './chain/verify-chain';
export type { Codec, Sha256 } from './ports/codec';
