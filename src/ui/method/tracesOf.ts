import { GROUND_EVENTS, type GroundEvent } from '#src/domain/ground/groundEvents.ts';
import type { FlightResult } from '#src/domain/driver/flight.ts';
import type { GroundTraceInput } from '#src/domain/ground/groundTrace.ts';
import { integrateMotion } from '#src/domain/jump/integrateMotion.ts';
import type { JumpCurve, JumpCurveInput } from '#src/domain/jump/jumpCurve.ts';
import type { PushCurve, PushCurveInput } from '#src/domain/push/pushCurve.ts';
import type { Trace, TraceMark } from '#src/ui/chart/trace/trace.ts';

const EVENT_WORDS: Readonly<Record<GroundEvent, string>> = {
  takeaway: 'takeaway',
  lateBackswing: 'late backswing',
  top: 'top',
  earlyDownswing: 'early downswing',
  leadArmParallel: 'lead arm parallel',
  midDownswing: 'mid downswing',
  impact: 'impact',
  finish: 'finish',
};
const STEP_BACK_S = 0.03;

/**
 * The drawings that belong to a calculator's answer; none for those that are figures alone.
 *
 * @param request what the API took
 * @param answer  what it gave
 */
export function tracesOf(name: string, request: unknown, answer: unknown): Trace[] {
  switch (name) {
    case 'jump-curve':
      return jumpTraces(request as JumpCurveInput, answer as JumpCurve);
    case 'push-curve':
      return [pushTrace(request as PushCurveInput, answer as PushCurve)];
    case 'ground-trace':
      return [groundTraceOf(request as GroundTraceInput)];
    case 'flight':
      return flightTraces(answer as FlightResult);
    default:
      return [];
  }
}

const points = (values: ArrayLike<number>, rate: number, fromS = 0): [number, number][] =>
  Array.from(values, (value, i) => [fromS + i / rate, value]);

function marksAt(rate: number, marks: readonly (readonly [index: number | null, label: string])[]): TraceMark[] {
  return marks.flatMap(([index, label]) => (index === null ? [] : [{ at: index / rate, label }]));
}

function jumpTraces({ sampleRate, force }: JumpCurveInput, answer: JumpCurve): Trace[] {
  const { onsetIndex, takeoffIndex, landingIndex, bodyWeight, mass, unweighting, braking } = answer;
  const after = (from: number | null, durationS: number | null) =>
    from === null || durationS === null ? null : from + durationS * sampleRate;
  const brakingFrom = after(onsetIndex, unweighting.duration);
  const marks = marksAt(sampleRate, [
    [onsetIndex, 'first movement'],
    [brakingFrom, 'braking'],
    [after(brakingFrom, braking.duration), 'propulsion'],
    [takeoffIndex, 'take-off'],
    [landingIndex, 'landing'],
  ]);
  const drawn: Trace = {
    says: `Vertical force over time${marks.length > 0 ? `, with ${marks.map(({ label }) => label).join(', ')} marked` : ''}.`,
    xUnit: 's',
    yUnit: 'force, N',
    lines: [{ points: points(force, sampleRate), look: 'force' }],
    marks,
  };
  if (onsetIndex === null || takeoffIndex === null || bodyWeight === null || mass === null) return [drawn];
  const start = Math.max(0, onsetIndex - Math.round(STEP_BACK_S * sampleRate));
  const { velocity, displacement } = integrateMotion(force, sampleRate, bodyWeight, mass, start, takeoffIndex);
  const motion = (values: ArrayLike<number>, says: string, yUnit: string): Trace => ({
    says,
    xUnit: 's',
    yUnit,
    lines: [{ points: points(values, sampleRate, start / sampleRate), look: 'force' }],
    marks: [],
  });
  return [
    drawn,
    motion(velocity, 'Velocity of the centre of mass from the first movement to take-off.', 'velocity, m/s'),
    motion(displacement, 'Height of the centre of mass from the first movement to take-off.', 'displacement, m'),
  ];
}

function pushTrace({ sampleRate, force }: PushCurveInput, { onsetIndex }: PushCurve): Trace {
  const at = (ms: number) => (onsetIndex === null ? null : onsetIndex + (ms / 1000) * sampleRate);
  const marks = marksAt(sampleRate, [
    [onsetIndex, 'onset'],
    [at(100), '100 ms'],
    [at(200), '200 ms'],
  ]);
  return {
    says: `Force over time${marks.length > 0 ? ', with the onset and the times 100 and 200 ms after it marked' : ''}.`,
    xUnit: 's',
    yUnit: 'force, N',
    lines: [{ points: points(force, sampleRate), look: 'force' }],
    marks,
  };
}

function groundTraceOf({ sampleRate, lead, trail, mass, events }: GroundTraceInput): Trace {
  const marks = GROUND_EVENTS.flatMap((name) => {
    const at = events[name];
    return at === undefined || at > (lead.length - 1) / sampleRate ? [] : [{ at, label: EVENT_WORDS[name] }];
  });
  return {
    says: `Lead foot (solid) and trail foot (dashed) through the swing, with ${marks.map(({ label }) => label).join(', ')} marked.`,
    xUnit: 's',
    yUnit: mass === undefined ? 'as given' : 'force, N',
    lines: [
      { points: points(lead, sampleRate), look: 'lead', label: 'lead' },
      { points: points(trail, sampleRate), look: 'trail', label: 'trail' },
    ],
    marks,
  };
}

function flightTraces({ path, carry, apex }: FlightResult): Trace[] {
  if (carry === null || apex === null || path.length < 2) return [];
  return [
    {
      says: `The flight from the side: ${Math.round(carry)} m far, ${Math.round(apex)} m high.`,
      xUnit: 'm',
      yUnit: 'height, m',
      lines: [{ points: path, look: 'carry' }],
      marks: [],
      trueShape: true,
    },
  ];
}
