import { intervalWords, plainNumber, signedNumber } from '#src/ui/words/numberWords.ts';
import { withUnit } from '#src/ui/words/valueWords.ts';

interface Compared {
  testName: string;
  unit: string;
  leadMean: number;
  trailMean: number;
  leadN: number;
  trailN: number;
  typicalErrorPct: { lead: number; trail: number } | null;
  difference: number;
  interval: readonly [number, number] | null;
}

/** How the difference between two legs was worked out, with this athlete's own inputs. */
export function pushWorkings(compared: Compared, name: string) {
  const { testName, unit, leadMean, trailMean, leadN, trailN, typicalErrorPct, difference, interval } = compared;
  return {
    formula: '100 × (lead − trail) ÷ the larger; standard error (smaller ÷ larger) × √(TE lead² + TE trail²)',
    inputs: [
      { name: `${testName} of ${name}, lead`, value: `${withUnit(leadMean, unit)}, mean of ${leadN}` },
      { name: 'trail', value: `${withUnit(trailMean, unit)}, mean of ${trailN}` },
      ...(typicalErrorPct
        ? [
            {
              name: 'typical error between days, lead and trail',
              value: `${plainNumber(typicalErrorPct.lead, 1)} % and ${plainNumber(typicalErrorPct.trail, 1)} %`,
            },
          ]
        : []),
      {
        name: 'difference',
        value: `${signedNumber(difference, 1)} %${interval ? `, 90 % interval ${intervalWords(interval, 1)} %` : ''}`,
      },
    ],
    source:
      'Difference in per cent of the larger leg (one of the indices that Bishop and others collected, 2016). Typical error between days: our own rule from the test’s published variation and 2.5 % from day to day.',
    limits: [
      'One test on one day never settles which side is weaker.',
      'Golf is played from one side: a stronger lead leg is expected and is not a fault.',
    ],
    method: 'asymmetry',
  };
}
