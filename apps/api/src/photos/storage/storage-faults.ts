import { StorageFullError } from './photo-storage';

/** Code of a system error, null for any other. */
export function codeOf(error: unknown): string | null {
  if (typeof error !== 'object' || error === null || !('code' in error)) return null;
  return typeof error.code === 'string' ? error.code : null;
}

const noRoom: readonly (string | null)[] = ['ENOSPC', 'EDQUOT'];

/** Gives a full disk its name. */
export async function whenRoom<T>(act: () => Promise<T>): Promise<T> {
  try {
    return await act();
  } catch (error) {
    if (noRoom.includes(codeOf(error)))
      throw new StorageFullError('no room for photographs', { cause: error });
    throw error;
  }
}
