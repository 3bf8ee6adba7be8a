/** What became of one thing that was to be recorded. */
export interface Recorded<State extends string> {
  state: State | 'refused';
  /** Why it is asked, void, excluded or refused; null where it simply counts. */
  reason: string | null;
  /** Whether it was written now; false for one that stood there before, and for a refused one. */
  fresh: boolean;
}

/** Values come back from the database as they went in; this only forgives the unit's own rounding. */
export const sameValue = (a: number | null, b: number | null): boolean =>
  a === null || b === null ? a === b : Math.abs(a - b) <= 1e-9 * Math.max(1, Math.abs(a), Math.abs(b));
