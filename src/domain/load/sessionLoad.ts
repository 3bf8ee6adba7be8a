import { mean } from '#src/domain/statistics/mean.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';
import { sampleStandardDeviation } from '#src/domain/statistics/sampleStandardDeviation.ts';

/** One session: effort on the CR10 scale, 0 to 10, and its length in minutes. */
export interface TrainingSession {
  rpe: number;
  minutes: number;
}

/** The sessions of each of seven consecutive days; a day of rest is an empty list. */
export interface SessionLoadInput {
  days: readonly (readonly TrainingSession[])[];
}

/** Loads in arbitrary units (effort × minutes); monotony and strain are null where the seven days are alike. */
export interface SessionLoad {
  daily: number[];
  week: number;
  mean: number;
  sd: number;
  monotony: number | null;
  strain: number | null;
  reason: string | null;
}

/**
 * Session-RPE load of a week: effort × minutes summed by day and week, monotony = mean/SD of the seven days
 * (rest days as 0, sample SD), strain = week · monotony. There is no cut-off for children.
 *
 * Source: Foster 1998 and Foster et al. 2001 (formulas read).
 *
 * @param input exactly seven days
 * @throws {RangeError} if there are not seven days, an effort is outside 0 to 10, or minutes are negative
 * @example sessionLoad({ days: [[{ rpe: 6, minutes: 60 }], [], [], [], [], [], []] }).week // → 360
 */
export function sessionLoad({ days }: SessionLoadInput): SessionLoad {
  if (days.length !== 7) throw new RangeError(`sessionLoad requires seven days, got ${days.length}`);
  const daily = days.map((sessions) =>
    sessions.reduce((sum, { rpe, minutes }) => {
      requireFiniteNumber('sessionLoad', 'rpe', rpe, { min: 0, max: 10 });
      requireFiniteNumber('sessionLoad', 'minutes', minutes, { min: 0 });
      return sum + rpe * minutes;
    }, 0),
  );
  const week = daily.reduce((sum, load) => sum + load, 0);
  const average = mean(daily);
  const sd = sampleStandardDeviation(daily);
  const common = { daily, week, mean: average, sd };
  if (sd === 0) {
    return { ...common, monotony: null, strain: null, reason: 'all seven days are alike: monotony is undefined' };
  }
  const monotony = average / sd;
  return { ...common, monotony, strain: week * monotony, reason: null };
}
