import { cannotSay, found, type Criterion } from '#src/domain/outrun/criterion.ts';
import { figure } from '#src/domain/outrun/figure.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Lines of the context, fixed for this version of the rule. */
export const HIP_BELOW_TRAIL_DEG = 10;
export const HIP_LOW_DEG = 20;
export const BALLS_UP_PCT = 20;
export const CONTEXT_PAIN = 2;

/**
 * Around it (information): what stands beside an outrun and carries no points. Lead hip internal rotation at least
 * 10° below the trail side or under 20°, both only when found twice; growth in the spurt band; driver balls up by more
 * than 20 % in a week; pain of 2 or more.
 *
 * The pain is withheld from swing coaches: build their answer with `withoutPain`.
 *
 * Source: hip rotation and back pain, Murray 2009; Vad 2004; the lines are our own, no published cut-off.
 *
 * @returns a criterion without a value; its findings stand in `reason`
 * @throws {RangeError} if a figure is not finite, an angle negative or the pain outside 0 to 10
 */
export function contextCriterion(block: OutrunInput['context']): Criterion {
  const { hipRotation = [], pain, velocityInSpurtBand, driverBallsChangePct } = block ?? {};
  const findings: string[] = [];
  const looked: string[] = [];

  const hips = hipRotation.filter(({ lead, trail }) => {
    requireFiniteNumber('contextCriterion', 'hipRotation lead', lead, { min: 0 });
    requireFiniteNumber('contextCriterion', 'hipRotation trail', trail, { min: 0 });
    return trail - lead >= HIP_BELOW_TRAIL_DEG || lead < HIP_LOW_DEG;
  }).length;
  if (hipRotation.length >= 2) looked.push('hip rotation');
  if (hips >= 2) {
    findings.push(
      `the lead hip turns in ${HIP_BELOW_TRAIL_DEG}° less than the trail hip, or under ${HIP_LOW_DEG}°, in ${hips} of ${hipRotation.length} measurements`,
    );
  }
  if (velocityInSpurtBand !== undefined && velocityInSpurtBand !== null) {
    looked.push('growth');
    if (velocityInSpurtBand) findings.push('growing fast');
  }
  if (driverBallsChangePct !== undefined && driverBallsChangePct !== null) {
    requireFiniteNumber('contextCriterion', 'driverBallsChangePct', driverBallsChangePct);
    looked.push('driver balls');
    if (driverBallsChangePct > BALLS_UP_PCT) {
      findings.push(
        `driver balls up ${figure(driverBallsChangePct, 0)} % on the week before (more than ${BALLS_UP_PCT} %)`,
      );
    }
  }
  if (pain !== undefined && pain !== null) {
    requireFiniteNumber('contextCriterion', 'pain', pain, { min: 0, max: 10 });
    looked.push('pain');
    if (pain >= CONTEXT_PAIN) findings.push(`pain ${figure(pain, Number.isInteger(pain) ? 0 : 1)} out of 10`);
  }

  if (looked.length === 0) {
    const once = hipRotation.length === 1 ? 'Hip rotation was measured once only: it counts when found twice. ' : '';
    return cannotSay(
      'context',
      null,
      `${once}Nothing is known of hip rotation measured twice, growth or driver balls.`,
    );
  }
  return found('context', null, {
    verdict: findings.length > 0 ? 'met' : 'not met',
    points: 0,
    value: null,
    standardError: null,
    interval90: null,
    reason: findings.length > 0 ? sentence(findings.join('; ')) : `Nothing found in ${looked.join(', ')}.`,
  });
}

/**
 * The same context for a reader who may not see pain: judged again as though no pain had been reported, so that
 * neither the text nor the verdict gives it away.
 */
export function withoutPain(block: OutrunInput['context']): Criterion {
  return contextCriterion(block && { ...block, pain: null });
}

const sentence = (text: string) => `${text.charAt(0).toUpperCase()}${text.slice(1)}.`;
