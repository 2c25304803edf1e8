export type Refusal = 'not-enrolled' | 'other-person' | 'photo-missing' | 'too-large';

/** Thrown inside a transaction so that nothing of it stays. */
export class SaveRefused extends Error {
  override readonly name = 'SaveRefused';

  constructor(readonly fault: Refusal) {
    super(fault);
  }
}
