import { criterionKind, type Criterion, type CriterionName, type Verdict } from '#src/domain/outrun/criterion.ts';
import type { CarryPair, LegPair, OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { typicalErrorPct } from '#src/domain/reliability/typicalErrorPct.ts';

/** The worked examples of our own rule (SCIENCE §9, W1 to W9): no published cut-off exists. */

const TE = {
  push: typicalErrorPct({ cvPct: 4, n: 3 }),
  jump: typicalErrorPct({ cvPct: 5, n: 3 }),
  hop: typicalErrorPct({ cvPct: 4.5, n: 3 }),
};
const legs = (test: keyof typeof TE, lead: number, trail: number): LegPair => ({
  lead,
  trail,
  teLeadPct: TE[test],
  teTrailPct: TE[test],
});
const pair = (day: number, [carry, strength, stature, age]: [number, number, number, number]): CarryPair => ({
  day,
  carry,
  strength,
  stature,
  age,
});

export const W1 = {
  leadDeficit: {
    values: [
      legs('push', 500, 560),
      legs('jump', 0.118, 0.131),
      legs('hop', 1.32, 1.41),
      legs('push', 510, 556),
      legs('jump', 0.12, 0.129),
      legs('hop', 1.35, 1.43),
    ],
  },
} satisfies OutrunInput;

export const W2 = {
  leadDeficit: {
    values: [
      legs('push', 500, 545),
      legs('jump', 0.121, 0.127),
      legs('hop', 1.36, 1.42),
      legs('push', 512, 538),
      legs('jump', 0.122, 0.126),
      legs('hop', 1.37, 1.42),
    ],
  },
} satisfies OutrunInput;

export const W3 = {
  divergence: {
    pairs: [
      pair(0, [150, 620, 155, 13]),
      pair(91, [155, 628, 156, 13.25]),
      pair(183, [166, 625, 157, 13.5]),
      pair(365, [178, 622, 158, 14]),
      pair(457, [186, 618, 159, 14.25]),
    ],
  },
} satisfies OutrunInput;

export const W3_OTHERS = [-4.1, -2, -1.2, -0.6, 0.3, 0.9, 1.8, 2.6, 5];

export const W4 = {
  divergence: {
    pairs: [
      pair(0, [165, 600, 150, 12]),
      pair(91, [169, 606, 151.5, 12.25]),
      pair(183, [176, 624, 153.5, 12.5]),
      pair(365, [181, 640, 156, 13]),
      pair(457, [185, 655, 158.5, 13.25]),
      pair(548, [192, 690, 161, 13.5]),
    ],
  },
} satisfies OutrunInput;

export const W6 = {
  demand: { peakLead: { mean: 1.45, cvPct: 5, n: 5 }, capacity: { mean: 1.7, cvPct: 5, n: 3 } },
} satisfies OutrunInput;

export const W7 = {
  demand: {
    peakLead: { mean: 1.5, cvPct: 4.5, n: 5 },
    capacity: { mean: 1.35, cvPct: 4, n: 3 },
    programmeMedian: 0.74,
  },
} satisfies OutrunInput;

export const W8 = {
  demand: {
    peakLead: { mean: 1.3, cvPct: 5, n: 5 },
    capacity: { mean: 1.35, cvPct: 5, n: 3 },
    programmeMedian: 0.74,
  },
} satisfies OutrunInput;

export const W9 = {
  lateReturn: { earlyDownswing: [63, 60, 65, 62, 64], impact: [51, 52, 50, 55, 53] },
} satisfies OutrunInput;

/** A criterion with given points, for tests of the level alone. */
export function criterionOf(name: CriterionName, points: number, verdict?: Verdict): Criterion {
  return {
    name,
    kind: criterionKind(name),
    verdict: verdict ?? (['not met', 'met', 'strong'] as const)[points]!,
    points,
    value: points,
    standardError: null,
    interval90: null,
    threshold: null,
    reason: '',
  };
}
