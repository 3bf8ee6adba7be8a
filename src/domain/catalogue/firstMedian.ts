const BAND_STARTS = [11, 13, 15] as const;

/**
 * The median that a first test is compared with: under 11, 11–12, 13–14, 15 years and over.
 *
 * @param mediansSi four medians in the base unit of the test; null where the test has none
 * @param ageYears  decimal age on the day of the test
 * @returns the band's median, or null without medians
 * @example firstMedian([600, 730, 880, 1030], 12.4) // → 730
 */
export function firstMedian(mediansSi: readonly number[] | null, ageYears: number): number | null {
  const band = BAND_STARTS.filter((start) => ageYears >= start).length;
  return mediansSi?.[band] ?? null;
}
