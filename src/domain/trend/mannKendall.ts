import { normalCdf } from '#src/domain/statistics/normalCdf.ts';
import { kendallExact } from '#src/domain/trend/kendallExact.ts';
import { tieSizes } from '#src/domain/trend/tieSizes.ts';

/** What the test looks for: any trend, a rise, or a fall. */
export type Alternative = 'two-sided' | 'greater' | 'less';

/** `z` and `p` are null where all x or all y are equal. */
export interface MannKendall {
  s: number;
  variance: number;
  z: number | null;
  p: number | null;
  exact: boolean;
}

const EXACT_UP_TO = 10;

/**
 * Mann–Kendall test of trend: S counts the pairs that rise with x less those that fall; Z has a continuity
 * correction of 1 and a variance corrected for ties in y and in x. The p value is exact without ties and up to ten
 * points, from Z else.
 *
 * Source: Mann 1945; Kendall 1975; EPA QA/G-9S (ties).
 *
 * @param x at least one value, the time
 * @param y as many values
 * @param alternative what is looked for, default two-sided
 * @example mannKendall([1, 2, 3, 4, 5], [5, 6, 11, 8, 10], 'greater') // → s 6, p 14/120
 */
export function mannKendall(
  x: readonly number[],
  y: readonly number[],
  alternative: Alternative = 'two-sided',
): MannKendall {
  const n = x.length;
  let s = 0;
  for (let i = 0; i < n; i += 1) {
    for (let j = i + 1; j < n; j += 1) s += Math.sign(x[j]! - x[i]!) * Math.sign(y[j]! - y[i]!);
  }
  const xTies = tieSizes(x);
  const yTies = tieSizes(y);
  const variance = kendallVariance(n, xTies, yTies);
  const exact = n > 1 && n <= EXACT_UP_TO && xTies.length === 0 && yTies.length === 0;
  if (variance === 0) return { s, variance, z: null, p: null, exact };
  // s − 0 when s is 0; `+ 0` keeps −0 out of the answer
  const z = (s - Math.sign(s)) / Math.sqrt(variance) + 0;
  const rising = exact ? kendallExact(n, s) : normalCdf(-z);
  const falling = exact ? kendallExact(n, -s) : normalCdf(z);
  const p = { greater: rising, less: falling, 'two-sided': Math.min(1, 2 * Math.min(rising, falling)) }[alternative];
  return { s: s + 0, variance, z, p, exact };
}

/** Variance of S under no trend, with ties in both lists (Kendall 1975). */
function kendallVariance(n: number, xTies: readonly number[], yTies: readonly number[]): number {
  if (n < 2 || xTies[0] === n || yTies[0] === n) return 0;
  const sum = (sizes: readonly number[], of: (size: number) => number) => sizes.reduce((total, t) => total + of(t), 0);
  const first = (t: number) => t * (t - 1) * (2 * t + 5);
  const pairs = (t: number) => t * (t - 1);
  const triples = (t: number) => t * (t - 1) * (t - 2);
  const main = (first(n) - sum(xTies, first) - sum(yTies, first)) / 18;
  const crossed = (sum(xTies, pairs) * sum(yTies, pairs)) / (2 * pairs(n));
  const crossedTriples = n < 3 ? 0 : (sum(xTies, triples) * sum(yTies, triples)) / (9 * triples(n));
  return main + crossed + crossedTriples;
}
