/** Mean squares of a table of n people by k trials: between people, within people, between trials, error. */
export interface TwoWayMeanSquares {
  bms: number;
  wms: number;
  jms: number;
  ems: number;
}

/**
 * Two-way analysis of variance without replication. The error sum of squares is taken from the residuals
 * themselves, not by subtraction, so that a small error beside large people keeps its digits.
 *
 * Source: Shrout & Fleiss 1979, Psychol Bull 86:420–8.
 *
 * @param table rows = people, columns = trials; at least 2 × 2, rows of one length
 * @throws {RangeError} if the table is smaller
 */
export function twoWayMeanSquares(table: readonly (readonly number[])[]): TwoWayMeanSquares {
  const n = table.length;
  const k = table[0]?.length ?? 0;
  if (n < 2 || k < 2) throw new RangeError(`twoWayMeanSquares requires at least 2 × 2 values, got ${n} × ${k}`);
  const columnMeans = Array.from({ length: k }, (_, j) => table.reduce((sum, row) => sum + row[j]!, 0) / n);
  const rowMeans = table.map((row) => row.reduce((sum, value) => sum + value, 0) / k);
  const grand = rowMeans.reduce((sum, value) => sum + value, 0) / n;
  let between = 0;
  let trials = 0;
  let error = 0;
  let largest = 0;
  for (let j = 0; j < k; j += 1) trials += n * (columnMeans[j]! - grand) ** 2;
  for (let i = 0; i < n; i += 1) {
    between += k * (rowMeans[i]! - grand) ** 2;
    for (let j = 0; j < k; j += 1) {
      error += (table[i]![j]! - rowMeans[i]! - columnMeans[j]! + grand) ** 2;
      largest = Math.max(largest, Math.abs(table[i]![j]!));
    }
  }
  // equal values leave rounding behind that would pass for a spread
  const rounding = (1e-13 * largest) ** 2;
  const meanSquare = (squares: number, df: number) => (squares / df <= rounding ? 0 : squares / df);
  return {
    bms: meanSquare(between, n - 1),
    wms: meanSquare(trials + error, n * (k - 1)),
    jms: meanSquare(trials, k - 1),
    ems: meanSquare(error, (n - 1) * (k - 1)),
  };
}
