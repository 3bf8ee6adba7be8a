/** Curves in closed form for the worked examples, rounded as a plate's file would be. */
const rounded = (value: number, digits: number): number => Number(value.toFixed(digits));
const samples = (rate: number, seconds: number, at: (timeS: number) => number, digits: number): number[] =>
  Array.from({ length: Math.round(rate * seconds) }, (_, i) => rounded(at(rounded(i / rate, 9)), digits));

const BODY_WEIGHT_N = 490.5;
const LOBES = { dipS: 0.3, dipN: 200, pushS: 0.4, pushN: 600 };

function movementN(timeS: number): number {
  const { dipS, dipN, pushS, pushN } = LOBES;
  if (timeS < 0) return BODY_WEIGHT_N;
  if (timeS < dipS) return BODY_WEIGHT_N - dipN * Math.sin((Math.PI * timeS) / dipS);
  return BODY_WEIGHT_N + pushN * Math.sin((Math.PI * (timeS - dipS)) / pushS);
}

/** A countermovement jump of 50 kg in two sine lobes, N: 1 s quiet, dip, push, flight, landing, quiet again. */
export function exampleJump(): { sampleRate: number; force: number[] } {
  const { dipS, dipN, pushS, pushN } = LOBES;
  const takeoffS = dipS + pushS;
  const takeoffMps = (2 * (pushN * pushS - dipN * dipS)) / Math.PI / (BODY_WEIGHT_N / 9.81);
  const landingS = takeoffS + (2 * takeoffMps) / 9.81;
  const at = (timeS: number) => {
    const since = rounded(timeS - 1, 9);
    if (since < takeoffS) return movementN(since);
    if (since < landingS) return 0;
    const landed = since - landingS;
    return BODY_WEIGHT_N + (landed < 0.4 ? 2 * BODY_WEIGHT_N * Math.sin((Math.PI * landed) / 0.4) : 0);
  };
  return { sampleRate: 1000, force: samples(1000, 2.8, at, 2) };
}

/** An isometric push that rises by 1 − e^(−10t) from 490.5 to 1 500 N after 1 s quiet, N. */
export function examplePush(): { sampleRate: number; force: number[]; bodyWeight: number } {
  const at = (timeS: number) => (timeS < 1 ? 490.5 : 490.5 + 1009.5 * (1 - Math.exp(-10 * (timeS - 1))));
  return { sampleRate: 1000, force: samples(1000, 2.5, at, 4), bodyWeight: 490.5 };
}

const SWING: readonly [name: string, timeS: number, leadPct: number][] = [
  ['takeaway', 0.2, 54],
  ['lateBackswing', 0.72, 25],
  ['top', 0.98, 28],
  ['earlyDownswing', 1.06, 62],
  ['leadArmParallel', 1.12, 67],
  ['midDownswing', 1.18, 71],
  ['impact', 1.24, 79],
  ['finish', 1.5, 85],
];

/** One driver swing of 50 kg whose lead share is that of check G1 at each moment, straight between them, N. */
export function exampleSwing() {
  const shareAt = (timeS: number): number => {
    const after = SWING.findIndex(([, knot]) => knot >= timeS);
    if (after <= 0) return SWING[after === 0 ? 0 : SWING.length - 1]![2];
    const [, t0, s0] = SWING[after - 1]!;
    const [, t1, s1] = SWING[after]!;
    return s0 + ((timeS - t0) / (t1 - t0)) * (s1 - s0);
  };
  // the sum of both feet: body weight, lightened before the downswing, then pressed
  const total = (timeS: number) =>
    490.5 * (1 + 0.45 * Math.exp(-(((timeS - 1.12) / 0.07) ** 2)) - 0.25 * Math.exp(-(((timeS - 0.93) / 0.08) ** 2)));
  return {
    sampleRate: 250,
    lead: samples(250, 1.6, (timeS) => (total(timeS) * shareAt(timeS)) / 100, 4),
    trail: samples(250, 1.6, (timeS) => (total(timeS) * (100 - shareAt(timeS))) / 100, 4),
    mass: 50,
    events: Object.fromEntries(SWING.map(([name, timeS]) => [name, timeS])),
  };
}
