export interface StorageStanding {
  /** Both are hints of the browser, often rounded. */
  usedBytes: number | null;
  quotaBytes: number | null;
  /** Null when the browser does not tell. */
  persisted: boolean | null;
}

/** What the browser says about room. Never rejects. */
export async function storageStanding(): Promise<StorageStanding> {
  const manager = storageManager();
  if (manager === null) return { usedBytes: null, quotaBytes: null, persisted: null };
  const [estimate, persisted] = await Promise.all([
    manager.estimate().catch((): StorageEstimate => ({})),
    manager.persisted().catch(() => null),
  ]);
  return { usedBytes: estimate.usage ?? null, quotaBytes: estimate.quota ?? null, persisted };
}

/** Asks the browser not to clear this storage by itself; true when it agrees. A refusal is no error. */
export async function askPersistence(): Promise<boolean> {
  const manager = storageManager();
  if (manager === null) return false;
  return (await manager.persisted().catch(() => false)) || (await manager.persist().catch(() => false));
}

function storageManager(): StorageManager | null {
  return typeof navigator !== 'undefined' && typeof navigator.storage?.persist === 'function'
    ? navigator.storage
    : null;
}
