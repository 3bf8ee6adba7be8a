import { ageYears, DAYS_PER_YEAR } from '#src/domain/growth/ageYears.ts';
import { dayNumber } from '#src/domain/calendar/dayNumber.ts';

/** One growth measure: m, m, kg; null where not taken. */
export interface MeasuredBody {
  on: string;
  statureM: number | null;
  sittingHeightM: number | null;
  massKg: number | null;
}

/** The measure to be looked at, the birth date, and the athlete's nearest earlier valid measure, if any. */
export interface SuspectGrowthInput {
  measure: MeasuredBody;
  birthDate: string;
  earlier: MeasuredBody | null;
}

const SHRINKS_BY_M = 0.02;
const GROWS_A_YEAR_M = 0.16;
const SITTING_SHARE = { least: 0.44, most: 0.6 } as const;
const MASS_FALLS_TO = 0.85;
const MASS_GROWS_A_YEAR = 0.35;
const MASS_SLACK = 0.1;
/** Shortest and tallest, lightest and heaviest that is ordinary at 7 and at 18 years; between them, a straight line. */
const ORDINARY = { stature: [0.98, 1.5, 1.35, 2.12], mass: [14, 65, 33, 125] } as const;

/**
 * Why a growth measure must be asked about: shorter than before by more than 2 cm, growth beyond 16 cm a year and 2 cm,
 * a mass that falls by more than 15 % or rises by more than 10 % and 35 % a year, a sitting height that is no share of
 * the height, or a first measure far from any child's of that age.
 *
 * Source: our own limits; no published source.
 *
 * @returns the reasons, put together, or null
 * @throws {RangeError} if a date is none, or the measure lies before the birth
 * @example suspectGrowth({ measure: { on: '2026-01-17', statureM: 1.45, … }, birthDate, earlier }) // → 'the height …'
 */
export function suspectGrowth({ measure, birthDate, earlier }: SuspectGrowthInput): string | null {
  const reasons: string[] = [];
  const years = earlier === null ? null : (dayNumber(measure.on) - dayNumber(earlier.on)) / DAYS_PER_YEAR;
  const before = years === null || years < 0 ? null : earlier;
  reasons.push(...lengthReasons(measure, before, years ?? 0), ...massReasons(measure, before, years ?? 0));
  const { statureM, sittingHeightM } = measure;
  if (statureM !== null && sittingHeightM !== null) {
    const share = sittingHeightM / statureM;
    if (share < SITTING_SHARE.least || share > SITTING_SHARE.most) {
      reasons.push(`the sitting height is ${Math.round(share * 100)} % of the height`);
    }
  }
  if (before === null) reasons.push(...firstReasons(measure, ageYears(birthDate, measure.on)));
  return reasons.length === 0 ? null : reasons.join('; ');
}

function lengthReasons(measure: MeasuredBody, before: MeasuredBody | null, years: number): string[] {
  return (
    [
      ['statureM', 'height'],
      ['sittingHeightM', 'sitting height'],
    ] as const
  ).flatMap(([key, name]) => {
    const [now, then] = [measure[key], before?.[key] ?? null];
    if (now === null || then === null) return [];
    const change = now - then;
    if (change < -SHRINKS_BY_M) return [`the ${name} fell by ${(-change * 100).toFixed(1)} cm`];
    const most = SHRINKS_BY_M + GROWS_A_YEAR_M * years;
    return change > most ? [`the ${name} rose by ${(change * 100).toFixed(1)} cm`] : [];
  });
}

function massReasons({ massKg: now }: MeasuredBody, before: MeasuredBody | null, years: number): string[] {
  const then = before?.massKg ?? null;
  if (now === null || then === null) return [];
  const share = now / then;
  const most = 1 + MASS_SLACK + MASS_GROWS_A_YEAR * years;
  if (share >= MASS_FALLS_TO && share <= most) return [];
  return [`the mass went from ${then.toFixed(1)} to ${now.toFixed(1)} kg`];
}

function firstReasons({ statureM, massKg }: MeasuredBody, age: number): string[] {
  const far = (
    value: number | null,
    [lowYoung, highYoung, lowOld, highOld]: readonly [number, number, number, number],
  ) => {
    const part = Math.min(1, Math.max(0, (age - 7) / 11));
    return (
      value !== null &&
      (value < lowYoung + (lowOld - lowYoung) * part || value > highYoung + (highOld - highYoung) * part)
    );
  };
  return [
    ...(far(statureM, ORDINARY.stature) ? ['the height is far from any at this age'] : []),
    ...(far(massKg, ORDINARY.mass) ? ['the mass is far from any at this age'] : []),
  ];
}
