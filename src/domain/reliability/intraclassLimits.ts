import type { TwoWayMeanSquares } from '#src/domain/reliability/twoWayMeanSquares.ts';
import { fQuantile } from '#src/domain/statistics/fQuantile.ts';

/** Lower and upper 95 % limit, or null where it is undefined. */
export type Limits = [number, number] | null;

/** 95 % limits of the six intraclass correlations. */
export interface IntraclassLimits {
  icc11: Limits;
  icc21: Limits;
  icc31: Limits;
  icc1k: Limits;
  icc2k: Limits;
  icc3k: Limits;
}

/**
 * 95 % confidence limits of the intraclass correlations. The (2,k) limits are the (2,1) limits carried through
 * the Spearman–Brown formula. A table without error (or without any spread) has no limits.
 *
 * Source: Shrout & Fleiss 1979, Psychol Bull 86:420–8; McGraw & Wong 1996 for the form of (2,1) (from memory).
 *
 * @param squares mean squares of the table
 * @param n people, at least 2
 * @param k trials, at least 2
 */
export function intraclassLimits(squares: TwoWayMeanSquares, n: number, k: number): IntraclassLimits {
  const { bms, wms, ems } = squares;
  const oneWay = ratioLimits(bms, wms, n - 1, n * (k - 1));
  const mixed = ratioLimits(bms, ems, n - 1, (n - 1) * (k - 1));
  const random = randomLimits(squares, n, k);
  return {
    icc11: single(oneWay, k),
    icc21: random,
    icc31: single(mixed, k),
    icc1k: averaged(oneWay),
    icc2k: random && finite(random.map((limit) => (k * limit) / (1 + (k - 1) * limit))),
    icc3k: averaged(mixed),
  };
}

function ratioLimits(above: number, below: number, aboveDf: number, belowDf: number): Limits {
  if (below === 0) return null;
  const ratio = above / below;
  return [ratio / fQuantile(0.975, aboveDf, belowDf), ratio * fQuantile(0.975, belowDf, aboveDf)];
}

const single = (limits: Limits, k: number): Limits =>
  limits && finite(limits.map((ratio) => (ratio - 1) / (ratio + k - 1)));

const averaged = (limits: Limits): Limits => limits && finite(limits.map((ratio) => 1 - 1 / ratio));

function randomLimits({ bms, jms, ems }: TwoWayMeanSquares, n: number, k: number): Limits {
  const spread = bms + (k - 1) * ems + (k * (jms - ems)) / n;
  if (ems === 0 || spread === 0) return null;
  const rho = (bms - ems) / spread;
  const ratio = jms / ems;
  const trialPart = k * rho * ratio;
  const errorPart = n * (1 + (k - 1) * rho) - k * rho;
  const df = ((k - 1) * (n - 1) * (trialPart + errorPart) ** 2) / ((n - 1) * trialPart ** 2 + errorPart ** 2);
  if (!(df > 0) || !Number.isFinite(df)) return null;
  const lowerF = fQuantile(0.975, n - 1, df);
  const upperF = fQuantile(0.975, df, n - 1);
  const base = k * jms + (k * n - k - n) * ems;
  return finite([
    (n * (bms - lowerF * ems)) / (lowerF * base + n * bms),
    (n * (upperF * bms - ems)) / (base + n * upperF * bms),
  ]);
}

function finite([lower, upper]: readonly (number | undefined)[]): Limits {
  return Number.isFinite(lower) && Number.isFinite(upper) ? [lower!, upper!] : null;
}
