import { findPushOnset } from '#src/domain/push/findPushOnset.ts';
import { forceAtTime } from '#src/domain/push/forceAtTime.ts';
import { netImpulse } from '#src/domain/push/netImpulse.ts';
import { preloadProblem, pushStartProblem, stillRising } from '#src/domain/push/pushProblems.ts';
import { curveQuality, type CurveQuality } from '#src/domain/signal/curveQuality.ts';
import { findGlitch } from '#src/domain/signal/findGlitch.ts';
import { firstSecond } from '#src/domain/signal/firstSecond.ts';
import { sampleRateFindings } from '#src/domain/signal/sampleRateFindings.ts';
import { leastAndGreatest } from '#src/domain/statistics/leastAndGreatest.ts';
import { requireFiniteList } from '#src/domain/statistics/requireFiniteList.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Force of an isometric push (N), quiet preload first; samples per second; body weight in N; g in m/s², default 9.81. */
export interface PushCurveInput {
  sampleRate: number;
  force: ArrayLike<number>;
  bodyWeight?: number;
  g?: number;
}

/**
 * An isometric push read from its force. Forces gross in N, rates N/s, impulse net of preload in N·s, `perKg` N/kg,
 * `timesBodyWeight` ×BW; windows in ms from onset. Where `quality.ok` is false, what the problem spoils is null.
 */
export interface PushCurve {
  preload: number | null;
  onsetIndex: number | null;
  peakForce: number | null;
  netPeakForce: number | null;
  forceAt: Record<'50' | '100' | '150' | '200' | '250', number | null>;
  rfd: Record<'0-100' | '0-150' | '0-200', number | null>;
  impulse: Record<'0-200', number | null>;
  perKg: number | null;
  timesBodyWeight: number | null;
  quality: CurveQuality;
  reason: string | null;
}

const ONSET_SDS = 5;
const GLITCH_SHARE = 0.4;
/** A push of less than 50 N or a tenth of the preload is none. */
const LEAST_PUSH_N = 50;
const LEAST_PUSH_SHARE = 0.1;
/** Keeps a constant preload at or below its own mean, which may round down. */
const ROUNDING = 1e-9;

/**
 * Reads an isometric push. Preload is the mean of the first second; onset the last sample at or below preload + 5 SD
 * before the force stays above it for 20 ms. Rates run from the force at onset to the force at the window's end.
 * Under 16, decide on peak force; rates and early force are information only.
 *
 * Source: onset as commonly done (from memory); windows common practice.
 *
 * @param input at least one finite sample; body weight above 0, only for `perKg` and `timesBodyWeight`
 * @throws {RangeError} if the curve is empty, a sample is not finite, or rate, body weight or g is not above 0
 */
export function pushCurve({ sampleRate, force, bodyWeight, g = 9.81 }: PushCurveInput): PushCurve {
  requireFiniteNumber('pushCurve', 'sampleRate', sampleRate, { above: 0 });
  requireFiniteNumber('pushCurve', 'g', g, { above: 0 });
  if (bodyWeight !== undefined) requireFiniteNumber('pushCurve', 'bodyWeight', bodyWeight, { above: 0 });
  requireFiniteList('pushCurve', force);

  const { rejecting, remarks } = sampleRateFindings(sampleRate);
  const tooSlow = rejecting.length > 0;
  const quiet = firstSecond(force, sampleRate);
  const unsteady = preloadProblem(force, quiet, force.length / sampleRate);
  if (quiet === null || unsteady !== null) {
    const problems = [...rejecting, unsteady].filter((problem) => problem !== null);
    return { ...nothing(), ...verdict(problems, [], remarks) };
  }

  const preload = quiet.meanN;
  const band = ONSET_SDS * quiet.sdN + ROUNDING * Math.abs(preload);
  const { greatest: peakForce } = leastAndGreatest(force);
  const rise = peakForce - preload;
  const onset = findPushOnset(force, sampleRate, preload + band);
  if (onset === -1 || rise < Math.max(LEAST_PUSH_N, LEAST_PUSH_SHARE * preload)) {
    return {
      ...nothing(),
      preload,
      ...verdict([...rejecting, 'no push: the force stays at the preload'], [], remarks),
    };
  }
  const glitch = findGlitch(force, sampleRate, GLITCH_SHARE * rise, force.length);
  if (glitch !== -1) {
    const leap = `the signal leaps at ${(glitch / sampleRate).toFixed(3)} s: samples are lost or false`;
    return { ...nothing(), preload, ...verdict([...rejecting, leap], [], remarks) };
  }
  const badStart = pushStartProblem(force, sampleRate, preload, band, quiet.samples, onset, indexOf(force, peakForce));
  if (badStart !== null) rejecting.push(badStart);
  const cutShort = stillRising(force, sampleRate, peakForce);
  if (cutShort) rejecting.push('the file ends while the force still rises: the peak is not known');

  const early = tooSlow || badStart !== null ? null : earlyForce(force, sampleRate, onset, preload);
  const windowsEnd = early !== null && Object.values(early.forceAt).includes(null);
  const missing = windowsEnd ? ['the file ends within 250 ms of the onset: later windows are missing'] : [];
  const peak = cutShort ? null : peakForce;
  return {
    ...nothing(),
    ...early,
    preload,
    onsetIndex: badStart === null ? onset : null,
    peakForce: peak,
    netPeakForce: peak === null ? null : peak - preload,
    perKg: peak === null || bodyWeight === undefined ? null : peak / (bodyWeight / g),
    timesBodyWeight: peak === null || bodyWeight === undefined ? null : peak / bodyWeight,
    ...verdict(rejecting, missing, remarks),
  };
}

function earlyForce(force: ArrayLike<number>, sampleRate: number, onset: number, preloadN: number) {
  const at = (ms: number) => forceAtTime(force, sampleRate, onset, ms / 1000);
  const rate = (ms: number) => {
    const later = at(ms);
    return later === null ? null : (later - force[onset]!) / (ms / 1000);
  };
  return {
    forceAt: { '50': at(50), '100': at(100), '150': at(150), '200': at(200), '250': at(250) },
    rfd: { '0-100': rate(100), '0-150': rate(150), '0-200': rate(200) },
    impulse: { '0-200': netImpulse(force, sampleRate, onset, 0.2, preloadN) },
  };
}

const nothing = (): Omit<PushCurve, 'quality' | 'reason'> => ({
  preload: null,
  onsetIndex: null,
  peakForce: null,
  netPeakForce: null,
  forceAt: { '50': null, '100': null, '150': null, '200': null, '250': null },
  rfd: { '0-100': null, '0-150': null, '0-200': null },
  impulse: { '0-200': null },
  perKg: null,
  timesBodyWeight: null,
});

function verdict(rejecting: string[], missing: string[], advice: string[]): Pick<PushCurve, 'quality' | 'reason'> {
  const nulls = [...rejecting, ...missing];
  return {
    quality: curveQuality({ rejecting, remarks: [...missing, ...advice] }),
    reason: nulls.length === 0 ? null : nulls.join('; '),
  };
}

function indexOf(force: ArrayLike<number>, value: number): number {
  for (let i = 0; i < force.length; i += 1) if (force[i] === value) return i;
  return -1;
}
