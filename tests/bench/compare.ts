import { performance } from 'node:perf_hooks';

/** One side of a comparison: does its work once and checks that what came back is right. */
export type Work = () => Promise<void> | void;

export interface Comparison {
  name: string;
  goal: number;
  /** Median over the rounds of (measured ÷ baseline), and the best round. */
  ratio: number;
  best: number;
  /** Spread of the baseline's rounds, (max − min) ÷ median. */
  baselineSpread: number;
  ok: boolean;
}

const ROUNDS = 7;

const quantile = (values: readonly number[], q: number): number =>
  values.toSorted((a, b) => a - b)[Math.min(values.length - 1, Math.floor(q * values.length))]!;

async function timesOf(work: Work, times: number): Promise<number[]> {
  const taken: number[] = [];
  for (let i = 0; i < times; i += 1) {
    const start = performance.now();
    await work();
    taken.push(performance.now() - start);
  }
  return taken;
}

/**
 * Measures `measured` against the sum of the baselines in one run: warm-up, then seven interleaved rounds, the quantile
 * of each round. Fails only if the median of the rounds is over the goal and the best round is too.
 */
export async function compare(
  name: string,
  {
    measured,
    baselines,
    goal,
    times = 40,
    q = 0.5,
  }: { measured: Work; baselines: Work[]; goal: number; times?: number; q?: number },
): Promise<Comparison> {
  await timesOf(measured, Math.ceil(times / 4));
  for (const baseline of baselines) await timesOf(baseline, Math.ceil(times / 4));
  const ratios: number[] = [];
  const bases: number[] = [];
  for (let round = 0; round < ROUNDS; round += 1) {
    const top = quantile(await timesOf(measured, times), q);
    let base = 0;
    for (const baseline of baselines) base += quantile(await timesOf(baseline, times), q);
    ratios.push(top / base);
    bases.push(base);
  }
  const ratio = quantile(ratios, 0.5);
  const best = Math.min(...ratios);
  const baselineSpread = (Math.max(...bases) - Math.min(...bases)) / quantile(bases, 0.5);
  return { name, goal, ratio, best, baselineSpread, ok: ratio <= goal || best <= goal };
}
