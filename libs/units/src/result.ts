/**
 * What a computation gives back: its value, or why there is none. An input that is missing is never filled in
 * silently, and one that is impossible is named together with the range it must keep to.
 */
export type Result<T> =
  | { ok: true; value: T }
  | {
      ok: false;
      error: { kind: 'needs'; fields: string[] } | { kind: 'out-of-range'; field: string; range: string };
    };
