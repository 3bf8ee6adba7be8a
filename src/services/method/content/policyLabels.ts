import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';

/** What each threshold of the outrun rule is, in words. */
export const POLICY_LABELS: Readonly<Record<keyof OutrunPolicy, string>> = {
  deficitMet: 'Lead deficit, met from, %',
  deficitStrong: 'Lead deficit, strong from, %',
  gainMet: 'Carry pulling away, met from, %',
  gainStrong: 'Carry pulling away, strong from, %',
  strengthExponent: 'Carry expected for 1 % of lead push, %',
  statureExponent: 'Carry expected for 1 % of height, %',
  learningPctPerYear: 'Carry expected for a year of practice, %',
  pairNoisePct: 'Noise of one pair of carry and push, %',
  demandMet: 'Demand over capacity, met above',
  demandStrong: 'Demand over capacity, strong above',
  overMedianMet: 'Times the programme’s median, met above',
  overMedianStrong: 'Times the programme’s median, strong above',
  dayForcePct: 'A leg’s push between days, %',
  daySwingPct: 'The swing’s peak between sessions, %',
  lateReturn: 'Late return, met beyond, points of share',
  look: 'Look, from points',
  act: 'Act, from points',
  minOthersGain: 'Other athletes for a median of gains, at least',
  minOthersDemand: 'Other athletes for a median of demands, at least',
};
