import { CRITERION_LABELS } from '#src/domain/outrun/criterionLabels.ts';
import { DEFAULT_POLICY } from '#src/domain/outrun/policy.ts';

const P = DEFAULT_POLICY;
const pct = (value: number) => `${String(value).replace('-', '−')} %`;
const SHOWN = '–';

const criteria = [
  [
    CRITERION_LABELS['lead-deficit'],
    'capacity',
    `the mean at or below ${pct(P.deficitMet)}, with its upper 90 % limit below 0`,
    `the same at or below ${pct(P.deficitStrong)}`,
    'Push, jump or hop, two results or more from the newest two sessions of each within 400 days, two valid trials a leg',
  ],
  [
    CRITERION_LABELS.divergence,
    'comparing',
    `${pct(P.gainMet)} or more; a point less where the demand was measured and is not met`,
    `${pct(P.gainStrong)} or more`,
    'Three pairs of carry and push over 180 days or more, the newest two within 400 days',
  ],
  [
    CRITERION_LABELS.demand,
    'comparing',
    `the lower 90 % limit above ${P.demandMet}, and above ${P.overMedianMet.toFixed(2)} × the programme’s median`,
    `the lower 90 % limit above ${P.demandStrong}, and above ${P.overMedianStrong.toFixed(2)} × the median`,
    `Force plates: five swings of one session and a push within 42 days; a median of ${P.minOthersDemand} others on the same rig, else the fixed line alone`,
  ],
  [
    CRITERION_LABELS['late-return'],
    'strategy',
    `the lead share falls by more than ${P.lateReturn} points, or the typical error if that is larger`,
    'never',
    'Five swings. It means: check the capacity. Moving back is a fast style and no fault',
  ],
  [
    CRITERION_LABELS['ahead-of-strength'],
    'information',
    'club speed above the 90 % prediction interval of the others’ line on lead push',
    SHOWN,
    'Fifteen other athletes',
  ],
  [
    CRITERION_LABELS['late-peak'],
    'information',
    'the lead peak more than 20 ms after lead arm parallel in 70 % of the swings',
    SHOWN,
    'Five swings at 200 samples a second or more',
  ],
  [
    CRITERION_LABELS.delivery,
    'information',
    'carry up beyond its detectable change, club speed not, attack angle or dynamic loft up by 2° or more, push not risen',
    SHOWN,
    'Both changes with their detectable change',
  ],
  [
    CRITERION_LABELS.context,
    'information',
    'twice, the lead hip turns in 10° less than the trail hip, or under 20°; growing as in a spurt; driver balls up by more than 20 % on the week; pain of 2 or more',
    SHOWN,
    'Any one of these',
  ],
];

// Terms since it began, then ordinary, late growers, technique gains, deficit only: per cent.
const simulated = [
  ['Plates, 9 terms', '22', '83', '97', '99', '100', '0.8', '1.0', '2.3', '20'],
  ['No plates, 9 terms', '6', '31', '55', '69', '77', '0.6', '0.8', '4.4', '26'],
  ['No plates, 5 terms', '5', '24', '40', '49', '–', '0.5', '0.1', '3.2', '17'],
  ['Any test over 10 %', '64', '94', '99', '100', '100', '74', '74', '78', '99'],
  ['Any test over 15 %', '30', '62', '75', '83', '89', '19', '18', '20', '80'],
];

/** The criteria with their thresholds in force, and what the rule found in simulation. */
export const outrunTables = [
  {
    title: 'The eight criteria',
    says: 'Met gives one point and strong two, for the first four; the other four are shown and never counted. Where data are missing the answer is cannot say, with no points.',
    columns: ['Criterion', 'Kind', 'Met', 'Strong', 'Needs'].map((header) => ({ header })),
    rows: criteria,
  },
  {
    title: 'In our simulated academy',
    says: 'Thirty made-up athletes whose truth is known, three terms a year. Three rows are this rule, with force plates or without, after so many terms of data; two are a spreadsheet that marks any test over a fixed line. First the share in per cent of true outruns at Look or higher by the terms since they began; then the share of athletes without an outrun, by kind, who were flagged in a year. It says nothing of how right the rule is in children.',
    columns: [
      { header: 'Rule and data' },
      ...[
        '1 term',
        '2 terms',
        '3 terms',
        '4 terms',
        '5 terms',
        'Ordinary',
        'Late growers',
        'Technique gains',
        'Deficit only',
      ].map((header) => ({ header, numeric: true })),
    ],
    rows: simulated,
  },
];
