import { dayNumber } from '#src/domain/calendar/dayNumber.ts';
import { DAYS_PER_YEAR } from '#src/domain/growth/ageYears.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/** Statures (cm) with their dates (YYYY-MM-DD), in any order; `measurementError` is the SD of one measure, cm. */
export interface GrowthVelocityInput {
  measures: readonly { on: string; stature: number }[];
  measurementError?: number;
}

/** Growth in cm a year from the first date to the last, with its standard error and 90 % interval. */
export interface GrowthVelocityResult {
  perYear: number | null;
  standardError: number | null;
  interval90: [number, number] | null;
  days: number | null;
  reason: string | null;
}

/**
 * Growth velocity between the earliest and the latest stature: difference ÷ years of 365.25 days. Two measures each
 * carry the measurement error, so SE = √2 · error ÷ years. Statures of one date count as their mean.
 *
 * Source: SCIENCE §5 (definition; the standard error by propagation). An error of 0.3 cm is common practice.
 *
 * @returns cm a year; null with a reason where there are not two dates
 * @throws {RangeError} if there is no measure, a date is none, a stature is not positive or the error negative
 * @example growthVelocity({ measures: [{ on: '2026-01-01', stature: 150 }, { on: '2026-04-02', stature: 152.4 }] })
 * // → perYear 9.632967, standardError 1.7029, days 91
 */
export function growthVelocity({ measures, measurementError = 0.3 }: GrowthVelocityInput): GrowthVelocityResult {
  if (measures.length === 0) throw new RangeError('growthVelocity requires at least one measure, got none');
  requireFiniteNumber('growthVelocity', 'measurementError', measurementError, { min: 0 });
  let first = Infinity;
  let last = -Infinity;
  const byDay = new Map<number, { sum: number; count: number }>();
  for (const { on, stature } of measures) {
    requireFiniteNumber('growthVelocity', 'stature', stature, { above: 0 });
    const day = dayNumber(on);
    const sameDay = byDay.get(day) ?? { sum: 0, count: 0 };
    sameDay.sum += stature;
    sameDay.count += 1;
    byDay.set(day, sameDay);
    first = Math.min(first, day);
    last = Math.max(last, day);
  }
  const days = last - first;
  if (days === 0) {
    const reason = 'two statures on different dates are needed';
    return { perYear: null, standardError: null, interval90: null, days: measures.length > 1 ? 0 : null, reason };
  }
  const years = days / DAYS_PER_YEAR;
  const meanOn = (day: number) => byDay.get(day)!.sum / byDay.get(day)!.count;
  const perYear = (meanOn(last) - meanOn(first)) / years;
  const standardError = (Math.SQRT2 * measurementError) / years;
  const interval90: [number, number] = [perYear - Z90 * standardError, perYear + Z90 * standardError];
  return { perYear, standardError, interval90, days, reason: null };
}
