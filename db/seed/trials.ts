import { inTerm, type Truth } from '#db/seed/truth.ts';
import { trueBody, trueLegs } from '#db/seed/body.ts';
import type { Random } from '#db/seed/random.ts';
import { TERMS } from '#db/seed/truth.ts';

export interface GeneratedTrial {
  testKey: 'push' | 'jump' | 'hop' | 'anterior-reach';
  side: 'left' | 'right';
  attempt: number;
  valueSi: number;
  /** A remark on the sheet that makes the trial void. */
  voidReason?: string;
}

const CV = { push: 0.04, jump: 0.05, hop: 0.045, 'anterior-reach': 0.03 } as const;
const BETWEEN_DAYS = { leg: 0.02, both: 0.012 } as const;

/** A battery of one athlete in one term: four tests, both legs, three trials; a slip now and then, a gap now and then. */
export function generateTrials(truth: Truth, term: number, random: Random): GeneratedTrial[] {
  const { massKg, statureM } = trueBody(truth, TERMS[term]!.testedOn);
  const legs = trueLegs(truth, term);
  const perKg = Math.max(legs.lead, legs.trail) / massKg;
  const strong = {
    push: Math.max(legs.lead, legs.trail),
    jump: 0.009 * perKg - 0.01,
    hop: 0.9 * statureM * (perKg / 17.5) ** 0.5 + 0.03,
    'anterior-reach': 0.41 * statureM,
  } as const;
  const shift = 1 + random.normal(0, BETWEEN_DAYS.both);
  return (Object.keys(strong) as GeneratedTrial['testKey'][]).flatMap((testKey) => {
    // Reach is a matter of joints and balance: it follows the legs' difference only a little.
    const leadPct = inTerm(truth.leadPct, term) * (testKey === 'anterior-reach' ? 0.2 : 1);
    return (['left', 'right'] as const).flatMap((side) => {
      const isLead = (side === 'left') === (truth.plays === 'right');
      const weaker = isLead ? Math.min(0, leadPct) : Math.min(0, -leadPct);
      const day = strong[testKey] * (1 + weaker / 100) * shift * (1 + random.normal(0, BETWEEN_DAYS.leg));
      return [1, 2, 3]
        .filter(() => !random.chance(0.02))
        .map((attempt) => ({
          testKey,
          side,
          attempt,
          valueSi: day * (1 + random.normal(0, CV[testKey])),
          ...(random.chance(0.015) ? { voidReason: 'foot slipped' } : {}),
        }));
    });
  });
}
