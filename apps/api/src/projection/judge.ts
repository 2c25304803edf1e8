import type { VisitDocument } from '@rimeward/contracts';
import type { VisitState } from '@rimeward/field-log';
import type { Finding } from './summary';

/** What the rules say of a visit. */
export function judge(
  _document: VisitDocument,
  _state: VisitState,
): { findings: Finding[]; rulesVersion: string } {
  return { findings: [], rulesVersion: 'none' };
}
