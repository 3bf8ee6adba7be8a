/**
 * Round values that hold a range, about `count` of them: steps of 1, 2, 2.5 or 5 times a power of ten. The first is at
 * or below `low`, the last at or above `high`, so they serve as the ends of an axis too.
 *
 * @param low  smallest value to show
 * @param high largest value to show
 * @param count wished number of ticks, at least 2
 * @throws {RangeError} if a bound is not finite, they are out of order, or count is under 2
 * @example niceTicks(163, 185, 3) // → [160, 180, 200]
 */
export function niceTicks(low: number, high: number, count = 4): number[] {
  if (!Number.isFinite(low) || !Number.isFinite(high) || low > high) {
    throw new RangeError(`niceTicks requires finite bounds in order, got ${low} and ${high}`);
  }
  if (count < 2) throw new RangeError(`niceTicks requires a count of at least 2, got ${count}`);
  const [from, to] =
    low === high
      ? [low - Math.max(Math.abs(low) * 0.05, 0.5), high + Math.max(Math.abs(high) * 0.05, 0.5)]
      : [low, high];
  let best: number[] | null = null;
  for (const step of steps(from, to, count)) {
    const first = Math.floor(tidy(from / step));
    const last = Math.ceil(tidy(to / step));
    const ticks = Array.from({ length: last - first + 1 }, (_, i) => tidy((first + i) * step));
    if (!best || cost(ticks, to - from, count) < cost(best, to - from, count)) best = ticks;
  }
  return best!;
}

// A tick too many or too few weighs as much as an axis half as long again as what it shows.
const cost = (ticks: readonly number[], range: number, count: number): number =>
  Math.abs(ticks.length - count) + 2 * ((ticks.at(-1)! - ticks[0]!) / range - 1);

function steps(from: number, to: number, count: number): number[] {
  const power = 10 ** Math.floor(Math.log10((to - from) / count));
  return [1, 2, 2.5, 5, 10, 20, 25, 50].map((factor) => factor * power);
}

// Sums of tenths drift in binary; twelve digits are more than any axis shows.
const tidy = (value: number): number => Number(value.toPrecision(12)) + 0;
