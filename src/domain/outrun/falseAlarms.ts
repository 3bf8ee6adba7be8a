import { type Criterion, type CriterionName } from '#src/domain/outrun/criterion.ts';
import type { OutrunLevel } from '#src/domain/outrun/level.ts';

/** What to rule out before believing a criterion, as statements that a coach can tick. */
export const FALSE_ALARMS: Readonly<Partial<Record<CriterionName, readonly string[]>>> = Object.freeze({
  'lead-deficit': [
    'Both legs were tested at the same joint angle as last time.',
    'Every try was a full effort, no half-hearted push.',
    'Neither leg was sore on the testing day.',
  ],
  divergence: [
    'The club and the ball are those of the earlier sessions.',
    'The gain isn’t only a better strike of the ball.',
    'The gain isn’t only a warm season.',
    'The gain isn’t only what coaching changed.',
  ],
  demand: [
    'The same number of plates, one or two, as in the earlier sessions was under the feet.',
    'Body mass was measured on the day.',
    'The push was tested at the same joint angle as last time.',
  ],
  'late-return': [
    'The share comes from force plates, not from a pressure-only mat.',
    'The ball position was the usual one.',
    'The tee height was the usual one.',
  ],
});

/** Said on every flag. In our simulated academy, never accuracy in children. */
export const CARRY_NOISE_WARNING =
  'A large real deficit with ordinary carry noise looks like an early outrun: in our simulated academy 17 to 26 % of such athletes are flagged in a year.';

/**
 * False alarms to rule out: those of each counted criterion that is met, and on a flag the warning about carry noise.
 */
export function falseAlarms(criteria: readonly Criterion[], level: OutrunLevel | null): string[] {
  const ruleOut = criteria
    .filter(({ verdict }) => verdict === 'met' || verdict === 'strong')
    .flatMap(({ name }) => FALSE_ALARMS[name] ?? []);
  return [...new Set(ruleOut), ...(level ? [CARRY_NOISE_WARNING] : [])];
}
