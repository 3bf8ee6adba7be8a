import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';

/** Loads of consecutive weeks in any unit, each ≥ 0, the newest last. */
export interface WeekChangeInput {
  weeks: readonly number[];
}

/** Change of the newest week on the one before, per cent; null with its reason where it is undefined. */
export interface WeekChange {
  changePct: number | null;
  reason: string | null;
}

/**
 * Change of the newest week's load on the week before, `100·(new − old)/old`. Shown instead of a ratio of acute to
 * chronic load, which couples with itself (Lolli 2019, BJSM 53:921).
 *
 * @param input at least one week
 * @throws {RangeError} if there is no week, or a load is negative or not finite
 * @example weekChange({ weeks: [1200, 1360] }).changePct // → 13.3333
 */
export function weekChange({ weeks }: WeekChangeInput): WeekChange {
  requireFiniteList('weekChange', weeks);
  const negative = weeks.find((load) => load < 0);
  if (negative !== undefined) throw new RangeError(`weekChange requires loads ≥ 0, got ${negative}`);
  const newest = weeks.at(-1)!;
  const before = weeks.at(-2);
  if (before === undefined) return { changePct: null, reason: 'one week only: nothing to compare with' };
  if (before === 0) return { changePct: null, reason: 'the week before is 0: a change in per cent is undefined' };
  return { changePct: (100 * (newest - before)) / before, reason: null };
}
