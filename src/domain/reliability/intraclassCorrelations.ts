import type { TwoWayMeanSquares } from '#src/domain/reliability/twoWayMeanSquares.ts';

/** The six intraclass correlations of Shrout and Fleiss; null where the denominator is 0. */
export interface IntraclassCorrelations {
  icc11: number | null;
  icc21: number | null;
  icc31: number | null;
  icc1k: number | null;
  icc2k: number | null;
  icc3k: number | null;
}

/**
 * Intraclass correlations from the mean squares: one-way (1), two-way random (2) and two-way mixed (3),
 * of a single trial and of the mean of k trials. Negative estimates are left as they are.
 *
 * Source: Shrout & Fleiss 1979, Psychol Bull 86:420–8.
 *
 * @param squares mean squares of the table
 * @param n people
 * @param k trials
 */
export function intraclassCorrelations(squares: TwoWayMeanSquares, n: number, k: number): IntraclassCorrelations {
  const { bms, wms, jms, ems } = squares;
  const over = (numerator: number, denominator: number) => (denominator === 0 ? null : numerator / denominator);
  return {
    icc11: over(bms - wms, bms + (k - 1) * wms),
    icc21: over(bms - ems, bms + (k - 1) * ems + (k * (jms - ems)) / n),
    icc31: over(bms - ems, bms + (k - 1) * ems),
    icc1k: over(bms - wms, bms),
    icc2k: over(bms - ems, bms + (jms - ems) / n),
    icc3k: over(bms - ems, bms),
  };
}
