import type { Page } from 'playwright-core';

export interface PhoneEntry {
  device: string;
  seq: number;
  text: string;
  hash: string;
}

/** What the phone's database holds, read raw and not through the application. */
export function entriesOnPhone(page: Page): Promise<PhoneEntry[]> {
  return page.evaluate(
    () =>
      new Promise<PhoneEntry[]>((resolve, reject) => {
        const asked = indexedDB.open('rimeward');
        asked.onerror = () => reject(new Error('The database does not open'));
        asked.onsuccess = () => {
          const all = asked.result.transaction('entries').objectStore('entries').getAll();
          all.onerror = () => reject(new Error('The entries cannot be read'));
          all.onsuccess = () => {
            asked.result.close();
            const rows = all.result as PhoneEntry[];
            resolve(rows.map(({ device, seq, text, hash }) => ({ device, seq, text, hash })));
          };
        };
      }),
  );
}
