import { airSources } from './sources/air-sources';
import { pipeSources } from './sources/pipe-sources';
import { safetySources } from './sources/safety-sources';

/** Every source that a computed figure can name, by its stable id. */
export const sources = { ...pipeSources, ...airSources, ...safetySources } as const;

/** Stable id of a source. */
export type SourceId = keyof typeof sources;
