import type { VisitRecord } from '@rimeward/contracts';
import { foldVisit, parseEntry, type LogEntry, type VisitState } from '@rimeward/field-log';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { fetchRecord } from './api';

export interface OpenRecord {
  record: VisitRecord;
  state: VisitState;
}

/** The visit as the office has it, folded here from the exact texts of its entries. */
export function useRecord(visitId: string) {
  const asked = useQuery({ queryKey: ['record', visitId], queryFn: () => fetchRecord(visitId) });
  const record = asked.data;
  const open = useMemo(
    (): OpenRecord | null => (record ? { record, state: foldVisit(readable(record)) } : null),
    [record],
  );
  return { ...asked, open };
}

/** Entries that count: what is held is shown apart and does not enter the state. */
function readable(record: VisitRecord): LogEntry[] {
  return record.entries.flatMap((stored) => {
    if (stored.heldReason !== null) return [];
    const parsed = parseEntry(stored.text);
    return parsed.ok ? [parsed.entry] : [];
  });
}
