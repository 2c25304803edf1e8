import { useCallback, useEffect, useState } from 'react';
import { dropDraft, readDraft, writeDraft } from '../../../phone/drafts';

/**
 * A value of a screen that outlives the screen, the page and a dead battery: written on every change, read back on opening.
 * Returns the value, its setter and the function that drops it once the entry is saved.
 */
export function useDraftValue<T>(key: string, initial: T): [T, (next: T) => void, () => Promise<void>] {
  const [value, setValue] = useState<{ key: string; value: T }>({ key, value: initial });

  useEffect(() => {
    let alive = true;
    void readDraft<T>(key).then((kept) => {
      if (alive && kept !== null) setValue({ key, value: kept });
    });
    return () => {
      alive = false;
    };
  }, [key]);

  const change = useCallback(
    (next: T) => {
      setValue({ key, value: next });
      void writeDraft(key, next);
    },
    [key],
  );
  const drop = useCallback(async () => {
    await dropDraft(key);
    setValue({ key, value: initial });
    // The first value is a constant of the screen: it is not watched.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [key]);

  return [value.key === key ? value.value : initial, change, drop];
}
