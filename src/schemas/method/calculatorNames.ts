/** The calculators of the Method API, in the order in which they are shown. */
export const CALCULATOR_NAMES = [
  'asymmetry',
  'agreement',
  'reliability',
  'trend',
  'jump-height',
  'jump-curve',
  'push-curve',
  'maturity',
  'growth-velocity',
  'growth-centile',
  'air-density',
  'flight',
  'carry-standard',
  'speed-ratio',
  'ground-trace',
  'session-load',
  'week-change',
  'one-rep-max',
  'outrun',
  'care',
] as const;

/** A calculator's name in `/method/<name>` and `/api/method/<name>`. */
export type CalculatorName = (typeof CALCULATOR_NAMES)[number];

/** Whether a path names a calculator. */
export const isCalculatorName = (name: string | undefined): name is CalculatorName =>
  (CALCULATOR_NAMES as readonly (string | undefined)[]).includes(name);
