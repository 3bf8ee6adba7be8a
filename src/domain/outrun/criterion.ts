/** The eight criteria in their fixed order. */
export const CRITERION_NAMES = [
  'lead-deficit',
  'divergence',
  'demand',
  'late-return',
  'ahead-of-strength',
  'late-peak',
  'delivery',
  'context',
] as const;

/** The name of a criterion in the contract; its label for people is in `criterionLabels.ts`. */
export type CriterionName = (typeof CRITERION_NAMES)[number];

/** What a criterion looks at; only the first three kinds carry points. */
export type CriterionKind = 'capacity' | 'comparing' | 'strategy' | 'information';

/** The answer of a criterion. Information criteria never answer `strong`. */
export type Verdict = 'not met' | 'met' | 'strong' | 'cannot say';

/**
 * One criterion's answer. `value`, `standardError`, `interval90` and `threshold` are in the criterion's own unit;
 * `threshold` is the *met* threshold in force. `reason` is a plain sentence with figures.
 */
export interface Criterion {
  name: CriterionName;
  kind: CriterionKind;
  verdict: Verdict;
  points: number;
  value: number | null;
  standardError: number | null;
  interval90: [number, number] | null;
  threshold: number | null;
  reason: string;
}

/** The part of a criterion that does not depend on the data. */
export type CriterionHead = Pick<Criterion, 'name' | 'kind' | 'threshold'>;

/** What a criterion found; the points are passed in, since a strategy never has two. */
export type Finding = Omit<Criterion, keyof CriterionHead>;

const KIND_BY_NAME: Readonly<Record<CriterionName, CriterionKind>> = Object.freeze({
  'lead-deficit': 'capacity',
  divergence: 'comparing',
  demand: 'comparing',
  'late-return': 'strategy',
  'ahead-of-strength': 'information',
  'late-peak': 'information',
  delivery: 'information',
  context: 'information',
});

/** The kind of the criterion of this name. */
export const criterionKind = (name: CriterionName): CriterionKind => KIND_BY_NAME[name];

/**
 * A criterion that cannot be judged: no value, no points.
 *
 * @param reason a plain sentence that says what is missing
 */
export function cannotSay(name: CriterionName, threshold: number | null, reason: string): Criterion {
  const nothing = { points: 0, value: null, standardError: null, interval90: null };
  return { name, kind: criterionKind(name), verdict: 'cannot say', threshold, reason, ...nothing };
}

/**
 * A criterion with a value. Numbers beyond the reach of a double turn into "cannot say", never into NaN or infinity.
 */
export function found(name: CriterionName, threshold: number | null, finding: Finding): Criterion {
  const numbers = [finding.value, finding.standardError, ...(finding.interval90 ?? [])];
  if (numbers.some((value) => value !== null && !Number.isFinite(value))) {
    return cannotSay(name, threshold, 'The figures are too large or too small to be compared.');
  }
  return { name, kind: criterionKind(name), threshold, ...finding };
}
