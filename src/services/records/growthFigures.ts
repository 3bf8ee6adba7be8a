import type { listGrowthMeasures } from '#src/db/queries/growthMeasures.ts';
import { growthCaution } from '#src/domain/care/growthCaution.ts';
import { ageMonths } from '#src/domain/growth/ageMonths.ts';
import { growthCentile } from '#src/domain/growth/growthCentile.ts';
import { growthVelocity, type GrowthVelocityResult } from '#src/domain/growth/growthVelocity.ts';
import { ageYears } from '#src/domain/growth/ageYears.ts';
import { maturity, type MaturityResult } from '#src/domain/growth/maturity.ts';
import { dayNumber } from '#src/domain/calendar/dayNumber.ts';

export type GrowthRow = Awaited<ReturnType<typeof listGrowthMeasures>>[number];

// A spurt cannot be told from the tape's own error in less than about five months (SCIENCE §5, E8).
const SHORTEST_DAYS = 150;
const LONGEST_DAYS = 400;

export interface VelocityPoint extends GrowthVelocityResult {
  from: string;
  on: string;
}

/** Growth velocity up to each measure, from the nearest earlier one at least five months before. cm a year. */
export function velocitySeries(rows: readonly GrowthRow[]): VelocityPoint[] {
  const tall = rows.flatMap(({ measuredOn, statureM, place }) =>
    statureM === null || place === 'home'
      ? []
      : [{ on: measuredOn, stature: statureM * 100, day: dayNumber(measuredOn) }],
  );
  return tall.flatMap((last) => {
    const first = tall.findLast(({ day }) => last.day - day >= SHORTEST_DAYS && last.day - day <= LONGEST_DAYS);
    if (!first) return [];
    const measures = [first, last].map(({ on, stature }) => ({ on, stature }));
    return [{ from: first.on, on: last.on, ...growthVelocity({ measures }) }];
  });
}

/** The newest velocity, if it can be given. */
export const newestVelocity = (rows: readonly GrowthRow[]): VelocityPoint | null => velocitySeries(rows).at(-1) ?? null;

/** The sentence that stands above everything while a child grows fast, or null. */
export function growthWarning(rows: readonly GrowthRow[], sex: 'female' | 'male'): string | null {
  const newest = newestVelocity(rows);
  if (!newest || newest.perYear === null || newest.standardError === null) return null;
  const { perYear: velocity, standardError, days } = newest;
  return growthCaution({ velocity, standardError, days: days ?? 0, sex });
}

/** Maturity estimates from the newest measure that has what they need. */
export function newestMaturity(
  rows: readonly GrowthRow[],
  { sex, birthDate }: { sex: 'female' | 'male'; birthDate: string },
): (MaturityResult & { on: string }) | null {
  const newest = rows.findLast(({ statureM, place }) => statureM !== null && place === 'academy');
  if (!newest) return null;
  const estimate = maturity({
    sex,
    age: ageYears(birthDate, newest.measuredOn),
    stature: newest.statureM! * 100,
    ...(newest.sittingHeightM === null ? {} : { sittingHeight: newest.sittingHeightM * 100 }),
    ...(newest.massKg === null ? {} : { mass: newest.massKg }),
  });
  return { on: newest.measuredOn, ...estimate };
}

/** Body mass nearest a date within so many days, kg. */
export function massNear(rows: readonly GrowthRow[], on: string, withinDays: number): number | null {
  const day = dayNumber(on);
  const near = rows
    .filter(({ massKg, measuredOn }) => massKg !== null && Math.abs(dayNumber(measuredOn) - day) <= withinDays)
    .sort((a, b) => Math.abs(dayNumber(a.measuredOn) - day) - Math.abs(dayNumber(b.measuredOn) - day));
  return near[0]?.massKg ?? null;
}

/** Measures with the age that day and the centile of stature and of mass in the CDC 2000 reference. */
export function centilesOf(
  rows: readonly GrowthRow[],
  { sex, birthDate }: { sex: 'female' | 'male'; birthDate: string },
) {
  return rows.map((row) => {
    const months = ageMonths(birthDate, row.measuredOn);
    const centile = (measure: 'stature' | 'weight', value: number | null) =>
      value === null ? null : growthCentile({ measure, sex, ageMonths: months, value }).centile;
    return {
      ...row,
      age: months / 12,
      statureCentile: centile('stature', row.statureM === null ? null : row.statureM * 100),
      massCentile: centile('weight', row.massKg),
    };
  });
}
