/** A statement takes 65 535 parameters: long lists go in parts. */
const ROWS_A_STATEMENT = 1000;

/** Runs an insert on a list a thousand rows at a time, in order. */
export async function inParts<T>(rows: readonly T[], insert: (part: T[]) => Promise<unknown>): Promise<void> {
  for (let from = 0; from < rows.length; from += ROWS_A_STATEMENT) {
    await insert(rows.slice(from, from + ROWS_A_STATEMENT));
  }
}
