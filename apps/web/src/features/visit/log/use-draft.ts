import { useCallback, useEffect, useRef } from 'react';
import type { FieldValues, UseFormReturn } from 'react-hook-form';
import { dropDraft, readDraft, writeDraft } from '../../../phone/drafts';

/**
 * Keeps what is typed in a form on this phone, on every change, and brings it back when the screen opens again.
 * Returns the function that drops the draft once the entry is saved.
 */
export function useDraft<T extends FieldValues>(key: string, form: UseFormReturn<T>): () => Promise<void> {
  const ready = useRef(false);
  const { reset, watch, getValues } = form;

  useEffect(() => {
    let alive = true;
    ready.current = false;
    void readDraft<T>(key).then((kept) => {
      if (!alive) return;
      if (kept) reset({ ...getValues(), ...kept });
      ready.current = true;
    });
    const watching = watch((values) => {
      if (ready.current) void writeDraft(key, values);
    });
    return () => {
      alive = false;
      watching.unsubscribe();
    };
  }, [key, reset, watch, getValues]);

  return useCallback(() => dropDraft(key), [key]);
}
