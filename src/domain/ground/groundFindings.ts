import { GROUND_EVENTS } from '#src/domain/ground/groundEvents.ts';
import type { GroundEvent, GroundEventTimes } from '#src/domain/ground/groundEvents.ts';
import { INDEX_ROUNDING } from '#src/domain/ground/sampleAt.ts';
import type { CurveFindings } from '#src/domain/signal/curveQuality.ts';

const GRAVITY = 9.81;
const LARGEST_REST_ERROR = 0.1;
const LEAST_HZ_FOR_TIMING = 200;

/** The trace that `groundFindings` looks at; forces in N where `mass` (kg) is given. */
export interface GroundFindingsInput {
  sampleRate: number;
  lead: ArrayLike<number>;
  trail: ArrayLike<number>;
  mass?: number | undefined;
  events: GroundEventTimes;
}

/**
 * What makes a ground trace doubtful: a plate without any reading or at zero within the swing, moments out of order or
 * outside the trace, both plates together more than 10 % from body weight at rest. A rate under 200 Hz is a remark:
 * shares stay good, times do not.
 *
 * Source: our own limits; no published source.
 *
 * @returns sentences; those in `rejecting` make a figure wrong
 * @example groundFindings({ sampleRate: 100, lead, trail, events }).remarks
 */
export function groundFindings({ sampleRate, lead, trail, mass, events }: GroundFindingsInput): CurveFindings {
  const rejecting = [
    ...eventProblems(events, (lead.length - 1) / sampleRate),
    ...zeroProblems({ lead, trail }, Math.ceil(events.takeaway * sampleRate), Math.floor(events.impact * sampleRate)),
  ];
  const remarks: string[] = [];
  if (mass !== undefined) {
    const rest = meanAtRest(lead, trail, Math.floor(events.takeaway * sampleRate + INDEX_ROUNDING));
    const expected = mass * GRAVITY;
    if (rest === null) {
      remarks.push('no sample before the takeaway: body weight at rest cannot be checked');
    } else if (Math.abs(rest - expected) > LARGEST_REST_ERROR * expected) {
      const found = `both plates at rest read ${Math.round(rest)}, the body weight is ${Math.round(expected)} N`;
      rejecting.push(`${found}: check the mass, the plates' zero, or whether this is pressure`);
    }
  }
  if (sampleRate < LEAST_HZ_FOR_TIMING) {
    remarks.push(`sampled at ${sampleRate} Hz, below ${LEAST_HZ_FOR_TIMING}: times are uncertain`);
  }
  return { rejecting, remarks };
}

function eventProblems(events: GroundEventTimes, endS: number): string[] {
  const problems: string[] = [];
  const given = GROUND_EVENTS.filter((name) => events[name] !== undefined);
  for (const name of given) {
    const time = events[name]!;
    if (time < 0 || time > endS + INDEX_ROUNDING) problems.push(`${name} at ${time} s lies outside the trace`);
  }
  given.forEach((name, i) => {
    const before = given.slice(0, i).filter((earlier) => !mayTrade(earlier, name));
    const late = before.find((earlier) => events[earlier]! >= events[name]!);
    if (late !== undefined) problems.push(`${name} is not after ${late}: moments are out of order`);
  });
  return problems;
}

function mayTrade(earlier: GroundEvent, later: GroundEvent): boolean {
  return earlier === 'earlyDownswing' && later === 'leadArmParallel';
}

function zeroProblems(plates: Record<'lead' | 'trail', ArrayLike<number>>, from: number, to: number): string[] {
  const problems: string[] = [];
  for (const side of ['lead', 'trail'] as const) {
    const samples = plates[side];
    let everywhere = true;
    let within = 0;
    for (let i = 0; i < samples.length; i += 1) {
      if (samples[i]! !== 0) everywhere = false;
      else if (i >= from && i <= to) within += 1;
    }
    if (everywhere) problems.push(`the ${side} plate reads zero throughout`);
    else if (within > 0) problems.push(`the ${side} plate reads zero in ${within} samples between takeaway and impact`);
  }
  return problems;
}

function meanAtRest(lead: ArrayLike<number>, trail: ArrayLike<number>, end: number): number | null {
  const samples = Math.min(end, lead.length);
  if (samples < 1) return null;
  let sum = 0;
  for (let i = 0; i < samples; i += 1) sum += lead[i]! + trail[i]!;
  return sum / samples;
}
