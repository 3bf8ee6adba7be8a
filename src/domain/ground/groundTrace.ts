import { GROUND_EVENTS } from '#src/domain/ground/groundEvents.ts';
import type { GroundEvent, GroundEventTimes } from '#src/domain/ground/groundEvents.ts';
import { groundFindings } from '#src/domain/ground/groundFindings.ts';
import { peakBetween } from '#src/domain/ground/peakBetween.ts';
import { sampleAt } from '#src/domain/ground/sampleAt.ts';
import { curveQuality } from '#src/domain/signal/curveQuality.ts';
import type { CurveQuality } from '#src/domain/signal/curveQuality.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/**
 * Lead and trail vertical force (N) or pressure (any unit) of one swing, sampled evenly; mass in kg, where the samples
 * are forces; events in seconds from the first sample.
 */
export interface GroundTraceInput {
  sampleRate: number;
  lead: ArrayLike<number>;
  trail: ArrayLike<number>;
  mass?: number;
  events: GroundEventTimes;
}

/** What the pressure does from early downswing to impact. Neither is an error. */
export type GroundStyle = 'front-foot' | 'reverse' | 'undetermined';

/** The lead side's peak after the top; times in s, `beforeImpact` negative for a peak after impact. */
export interface PeakLead {
  force: number | null;
  timesBodyWeight: number | null;
  time: number | null;
  beforeImpact: number | null;
  afterLeadArmParallel: number | null;
}

/** Shares in per cent, change in points, ramp in × body weight a second; null where it cannot be given. */
export interface GroundTraceResult {
  leadSharePctAt: Partial<Record<GroundEvent, number | null>>;
  style: GroundStyle | null;
  styleChangePct: number | null;
  peakLead: PeakLead;
  rampRate: number | null;
  quality: CurveQuality;
  reason: string | null;
}

/** Points of change within which no style is named, the limits included. */
export const STYLE_NOISE_PCT = 5;

const GRAVITY = 9.81;
const RAMP_BEFORE_S = 0.1;

/**
 * A ground trace's figures: the lead share at the moments of the swing (linear interpolation), the style by its change
 * from early downswing to impact, the lead side's peak between top and finish, and how fast the force rose to it from
 * 0.1 s before the lead arm is parallel. Pressure is not mass: a share says where the pressure was, no more.
 *
 * Sources: styles after Ball & Best 2007, Journal of Sports Sciences 25:757–770 (a change within ±5 points names none:
 * our own); timing against lead arm parallel after Han 2019, Sports Biomechanics 18:115–134.
 *
 * @throws {RangeError} if the plates differ in length or have fewer than two samples, or a number is negative, not
 *   finite or out of range
 * @example groundTrace({ sampleRate: 500, lead, trail, events }).style // → 'front-foot'
 */
export function groundTrace(input: GroundTraceInput): GroundTraceResult {
  const { sampleRate, lead, trail, mass, events } = input;
  requireTrace(input);
  const leadSharePctAt: Partial<Record<GroundEvent, number | null>> = {};
  for (const name of GROUND_EVENTS) {
    const time = events[name];
    if (time !== undefined) {
      leadSharePctAt[name] = share(sampleAt(lead, sampleRate, time), sampleAt(trail, sampleRate, time));
    }
  }
  const early = leadSharePctAt.earlyDownswing ?? null;
  const atImpact = leadSharePctAt.impact ?? null;
  const styleChangePct = early === null || atImpact === null ? null : atImpact - early;
  const peak = peakBetween(lead, sampleRate, events.top, events.finish ?? Infinity);
  const bodyWeight = mass === undefined ? null : mass * GRAVITY;
  return {
    leadSharePctAt,
    style: styleOf(styleChangePct),
    styleChangePct,
    peakLead: {
      force: peak && peak.force,
      timesBodyWeight: peak && bodyWeight && peak.force / bodyWeight,
      time: peak && peak.time,
      beforeImpact: peak && events.impact - peak.time,
      afterLeadArmParallel: peak && peak.time - events.leadArmParallel,
    },
    rampRate: rampRate(input, peak, bodyWeight),
    quality: curveQuality(groundFindings({ sampleRate, lead, trail, mass, events })),
    reason: reasonFor(events, styleChangePct, peak === null),
  };
}

function requireTrace({ sampleRate, lead, trail, mass, events }: GroundTraceInput): void {
  requireFiniteNumber('groundTrace', 'sampleRate', sampleRate, { above: 0 });
  if (mass !== undefined) requireFiniteNumber('groundTrace', 'mass', mass, { above: 0 });
  if (lead.length !== trail.length) {
    throw new RangeError(`groundTrace requires equal lengths, got ${lead.length} and ${trail.length}`);
  }
  if (lead.length < 2) throw new RangeError(`groundTrace requires at least two samples, got ${lead.length}`);
  for (let i = 0; i < lead.length; i += 1) {
    requireFiniteNumber('groundTrace', 'lead', lead[i]!, { min: 0 });
    requireFiniteNumber('groundTrace', 'trail', trail[i]!, { min: 0 });
  }
  for (const name of GROUND_EVENTS) {
    const time = events[name];
    if (time !== undefined) requireFiniteNumber('groundTrace', `event ${name}`, time);
  }
}

function share(lead: number | null, trail: number | null): number | null {
  if (lead === null || trail === null || lead + trail === 0) return null;
  return (lead / (lead + trail)) * 100;
}

function styleOf(changePct: number | null): GroundStyle | null {
  if (changePct === null) return null;
  // @NOTE 55 − 50 in binary shares can be 5.000000000000007: the limits count as inside.
  if (Math.abs(changePct) <= STYLE_NOISE_PCT + 1e-9) return 'undetermined';
  return changePct > 0 ? 'front-foot' : 'reverse';
}

function rampRate(
  { lead, sampleRate, events }: GroundTraceInput,
  peak: { force: number; time: number } | null,
  bodyWeight: number | null,
): number | null {
  const fromS = events.leadArmParallel - RAMP_BEFORE_S;
  const from = sampleAt(lead, sampleRate, fromS);
  if (peak === null || bodyWeight === null || from === null || peak.time <= fromS) return null;
  return (peak.force - from) / bodyWeight / (peak.time - fromS);
}

function reasonFor(events: GroundEventTimes, styleChangePct: number | null, noPeak: boolean): string | null {
  const reasons: string[] = [];
  if (events.earlyDownswing === undefined) reasons.push('no early downswing given: no style');
  else if (styleChangePct === null) reasons.push('no share at early downswing or impact: no style');
  if (noPeak) reasons.push('no sample between top and finish: no peak');
  return reasons.length === 0 ? null : reasons.join('; ');
}
