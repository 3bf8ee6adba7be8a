import type { CriterionName } from '#src/domain/outrun/criterion.ts';

/** One label for each criterion, the same on every screen. */
export const CRITERION_LABELS: Readonly<Record<CriterionName, string>> = Object.freeze({
  'lead-deficit': 'Lead deficit',
  divergence: 'Carry pulling away',
  demand: 'Demand over capacity',
  'late-return': 'Late return',
  'ahead-of-strength': 'Ahead of strength',
  'late-peak': 'Late peak',
  delivery: 'From delivery',
  context: 'Around it',
});
