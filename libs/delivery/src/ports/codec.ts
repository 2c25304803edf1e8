/** SHA-256 of bytes, 32 bytes. Synchronous, so that sealing fits inside one database transaction. */
export type Sha256 = (bytes: Uint8Array) => Uint8Array;

/** Text to bytes and bytes to digest, as the host does it. */
export interface Codec {
  /** UTF-8 of a well-formed text. */
  utf8: (text: string) => Uint8Array;
  sha256: Sha256;
}
