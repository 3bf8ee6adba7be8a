import { seededNormal } from '#tests/unit/domain/seededNormal.ts';

/** What to do to the made jump; forces in N, times in s. */
export interface MadeJumpOptions {
  sampleRate?: number;
  quietS?: number;
  standAfterS?: number;
  massKg?: number;
  noiseSdN?: number;
  /** added to every sample as a function of time */
  baseline?: (timeS: number) => number;
  /** added to flight time, for a landing on bent legs */
  lateLandingS?: number;
  seed?: number;
}

/** Take-off velocity of the made jump in closed form, for 50 kg: (600·0.8/π − 200·0.6/π)/50 m/s. */
export const MADE_TAKEOFF_MPS = (600 * 0.8 - 200 * 0.6) / (Math.PI * 50);

/** Force of the movement of check C4 (N), 0.7 s long, for 50 kg: a dip of .3 s, then a push of .4 s. */
export function movementForce(timeS: number): number {
  const bodyWeight = 490.5;
  if (timeS < 0) return bodyWeight;
  if (timeS < 0.3) return bodyWeight - 200 * Math.sin((Math.PI * timeS) / 0.3);
  if (timeS < 0.7) return bodyWeight + 600 * Math.sin((Math.PI * (timeS - 0.3)) / 0.4);
  return 0;
}

/** The countermovement jump of check C4 as a plate would record it: quiet, dip, push, flight, landing, quiet. */
export function madeJump(options: MadeJumpOptions = {}): { sampleRate: number; force: number[] } {
  const { sampleRate = 1000, quietS = 1, standAfterS = 1, massKg = 50, noiseSdN = 0, seed = 1 } = options;
  const { baseline = () => 0, lateLandingS = 0 } = options;
  const scale = massKg / 50;
  const flightS = (2 * MADE_TAKEOFF_MPS) / 9.81 + lateLandingS;
  const normal = seededNormal(seed);
  const landingS = 0.7 + flightS;
  const count = Math.round((quietS + landingS + standAfterS) * sampleRate);
  const force = Array.from({ length: count }, (_, i) => {
    // rounding keeps the edges of the lobes on their samples
    const timeS = Math.round((i / sampleRate - quietS) * 1e9) / 1e9;
    const pure = timeS < landingS ? movementForce(timeS) : landingForce(timeS - landingS);
    return scale * pure + baseline(i / sampleRate) + noiseSdN * normal();
  });
  return { sampleRate, force };
}

/** A steep rise to three times body weight that settles in .4 s. */
function landingForce(sinceS: number): number {
  if (sinceS > 0.4) return 490.5;
  return 490.5 + 981 * Math.sin((Math.PI * sinceS) / 0.4);
}
