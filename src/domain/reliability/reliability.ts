import { intraclassCorrelations, type IntraclassCorrelations } from '#src/domain/reliability/intraclassCorrelations.ts';
import { intraclassLimits, type IntraclassLimits } from '#src/domain/reliability/intraclassLimits.ts';
import { twoWayMeanSquares, type TwoWayMeanSquares } from '#src/domain/reliability/twoWayMeanSquares.ts';
import { typicalErrorLimits } from '#src/domain/reliability/typicalErrorLimits.ts';
import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';
import { sampleStandardDeviation } from '#src/domain/statistics/sampleStandardDeviation.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/** Rows = people, columns = trials, one unit. */
export interface ReliabilityInput {
  table: readonly (readonly number[])[];
}

type Nullable<T> = { [K in keyof T]: T[K] | null };

/** Reliability of a test; `sem`, `mdc…`, `typicalError`, `swc` in the unit of the test, `logCvPct` in per cent. */
export interface Reliability extends Nullable<TwoWayMeanSquares>, IntraclassCorrelations {
  n: number;
  k: number;
  ci95: IntraclassLimits;
  sem: number | null;
  mdc95: number | null;
  mdc90: number | null;
  typicalError: number | null;
  typicalErrorCi90: [number, number] | null;
  logCvPct: number | null;
  swc: number | null;
  reason: string | null;
}

/**
 * Reliability of repeated trials: intraclass correlations with 95 % limits, standard error of measurement √EMS,
 * minimal detectable change, typical error with 90 % limits, CV by logarithms, smallest worthwhile change
 * (0.2 · standard deviation of the first trial).
 *
 * `typicalError` is SD(difference)/√2 for two trials and √EMS for more; the two are one number for k = 2.
 *
 * Source: Shrout & Fleiss 1979, Psychol Bull 86:420–8; Weir 2005, J Strength Cond Res 19:231–40;
 * Hopkins 2000, Sports Medicine 30(1):1–15 (from memory).
 *
 * @param input a table of at least one person and one trial
 * @returns nulls with a reason for fewer than two people or two trials, and where a formula is undefined
 * @throws {RangeError} if the table is empty, its rows differ in length, or a value is not finite
 */
export function reliability({ table }: ReliabilityInput): Reliability {
  const n = table.length;
  const k = table[0]?.length ?? 0;
  if (n === 0) throw new RangeError('reliability requires at least one person, got 0');
  for (const row of table) {
    requireFiniteList('reliability', row);
    if (row.length !== k) throw new RangeError(`reliability requires rows of one length, got ${k} and ${row.length}`);
  }
  if (n < 2 || k < 2) return unknown(n, k, 'at least two people with two trials each are needed');

  const squares = twoWayMeanSquares(table);
  const df = (n - 1) * (k - 1);
  const correlations = intraclassCorrelations(squares, n, k);
  const ci95 = intraclassLimits(squares, n, k);
  const sem = Math.sqrt(squares.ems);
  const positive = table.every((row) => row.every((value) => value > 0));
  const reasons = [
    Object.values(correlations).includes(null) && 'people do not differ: a correlation is undefined',
    Object.values(ci95).includes(null) && 'no spread to set limits by',
    !positive && 'a value of 0 or below has no logarithm: no logCvPct',
  ].filter((reason) => reason !== false);
  return {
    n,
    k,
    ...squares,
    ...correlations,
    ci95,
    sem,
    mdc95: 1.96 * Math.SQRT2 * sem,
    mdc90: Z90 * Math.SQRT2 * sem,
    typicalError: sem,
    typicalErrorCi90: typicalErrorLimits(sem, df),
    logCvPct: positive ? logCvPct(table) : null,
    swc: 0.2 * sampleStandardDeviation(table.map((row) => row[0]!)),
    reason: reasons.length === 0 ? null : reasons.join('; '),
  };
}

/** 100(e^s − 1), s the error standard deviation of the natural logarithms. */
function logCvPct(table: readonly (readonly number[])[]): number {
  return 100 * Math.expm1(Math.sqrt(twoWayMeanSquares(table.map((row) => row.map(Math.log))).ems));
}

function unknown(n: number, k: number, reason: string): Reliability {
  const correlations = { icc11: null, icc21: null, icc31: null, icc1k: null, icc2k: null, icc3k: null };
  return {
    n,
    k,
    bms: null,
    wms: null,
    jms: null,
    ems: null,
    ...correlations,
    ci95: { ...correlations },
    sem: null,
    mdc95: null,
    mdc90: null,
    typicalError: null,
    typicalErrorCi90: null,
    logCvPct: null,
    swc: null,
    reason,
  };
}
