export type Guard = (handler: () => void) => () => void;

/**
 * Runs one strict transaction straight on IndexedDB. `work` queues its requests; what it throws, or a handler wrapped in
 * `guard`, aborts the transaction and rejects the promise with it. Settles when the browser has committed.
 */
export function strictTransaction(
  idb: IDBDatabase,
  stores: string[],
  work: (transaction: IDBTransaction, guard: Guard) => void,
): Promise<void> {
  return new Promise((resolve, reject) => {
    const transaction = idb.transaction(stores, 'readwrite', { durability: 'strict' });
    let failure: Error | null = null;
    const guard: Guard = (handler) => () => {
      try {
        handler();
      } catch (error) {
        failure ??= error instanceof Error ? error : new Error(String(error));
        transaction.abort();
      }
    };
    transaction.oncomplete = () => resolve();
    transaction.onabort = () =>
      reject(failure ?? transaction.error ?? new DOMException('the transaction was aborted', 'AbortError'));
    guard(() => work(transaction, guard))();
  });
}
