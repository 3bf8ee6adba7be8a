import { trueBody, trueLegs } from '#db/seed/body.ts';
import type { Random } from '#db/seed/random.ts';
import { TERMS, type Truth } from '#db/seed/truth.ts';

export const SWING_RATE_HZ = 500;
const DURATION_S = 1.6;

/** Seconds from the first sample. */
export const SWING_EVENTS = {
  takeaway: 0.2,
  lateBackswing: 0.72,
  top: 0.98,
  earlyDownswing: 1.06,
  leadArmParallel: 1.13,
  impact: 1.24,
  finish: 1.5,
} as const;

export interface GeneratedSwing {
  /** Vertical force under each foot, N, one value a sample. */
  left: number[];
  right: number[];
}

/** Lead share of the pressure at the knots of a swing: both styles shift back, forward, and then part. */
function shares(style: Truth['style'], random: Random): readonly (readonly [number, number])[] {
  const wobble = (value: number) => value + random.normal(0, 1.3);
  const atImpact = style === 'front-foot' ? 79 : 52;
  return [
    [0, wobble(52)],
    [SWING_EVENTS.takeaway, wobble(52)],
    [SWING_EVENTS.lateBackswing, wobble(26)],
    [SWING_EVENTS.top, wobble(30)],
    [SWING_EVENTS.earlyDownswing, wobble(style === 'front-foot' ? 62 : 64)],
    [SWING_EVENTS.leadArmParallel, wobble(style === 'front-foot' ? 71 : 66)],
    [SWING_EVENTS.impact, wobble(atImpact)],
    [SWING_EVENTS.finish, wobble(87)],
    [DURATION_S, wobble(88)],
  ];
}

/** One driver swing of an athlete on two plates. The lead leg peaks at lead arm parallel, at its true demand. */
export function generateSwing(truth: Truth, term: number, random: Random): GeneratedSwing {
  const weightN = trueBody(truth, TERMS[term]!.droveOn).massKg * 9.81;
  const peakN = trueLegs(truth, term).lead * truth.demand * (1 + random.normal(0, 0.04));
  const knots = shares(truth.style, random);
  const peakShare = shareAt(knots, SWING_EVENTS.leadArmParallel) / 100;
  // The whole body's force rises above its weight so that the lead foot's part of it reaches the peak.
  const surgeN = peakN / peakShare - weightN;
  const left: number[] = [];
  const right: number[] = [];
  for (let i = 0; i < DURATION_S * SWING_RATE_HZ; i += 1) {
    const time = i / SWING_RATE_HZ;
    const total = weightN + surgeN * Math.exp(-(((time - SWING_EVENTS.leadArmParallel) / 0.075) ** 2));
    const leadN = (total * shareAt(knots, time)) / 100;
    const [lead, trail] = [leadN, total - leadN].map((force) => Math.max(0, Math.round(force + random.normal(0, 4))));
    (truth.plays === 'right' ? left : right).push(lead!);
    (truth.plays === 'right' ? right : left).push(trail!);
  }
  return { left, right };
}

/** Cosine from one knot to the next. */
function shareAt(knots: readonly (readonly [number, number])[], time: number): number {
  const next = Math.max(
    1,
    knots.findIndex(([at]) => at >= time),
  );
  const [[t0, v0], [t1, v1]] = [knots[next - 1]!, knots[next]!];
  const part = (1 - Math.cos(Math.PI * Math.min(1, Math.max(0, (time - t0) / (t1 - t0))))) / 2;
  return v0 + (v1 - v0) * part;
}
