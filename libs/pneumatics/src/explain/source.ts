/**
 * How far a source can be leaned on: read in print; seen quoted by somebody else; worked out here from a stated formula; written
 * from memory and still to be found; or what the trade does without a publication.
 */
export type SourceStatus = 'published' | 'second-hand' | 'derived' | 'memory' | 'common-practice';

/** A publication, or the lack of one. */
export interface Source {
  title: string;
  author: string;
  /** Year or date as printed; null where the copy shows none. */
  year: string | null;
  /** Where it was read. */
  place: string;
  status: SourceStatus;
}
