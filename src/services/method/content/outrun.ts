import { CRITERION_LABELS } from '#src/domain/outrun/criterionLabels.ts';
import { DEFAULT_POLICY, type OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { typicalErrorPct } from '#src/domain/reliability/typicalErrorPct.ts';
import type { FormField } from '#src/schemas/method/form/formField.ts';
import { outrunTables } from '#src/services/method/content/outrunTables.ts';
import { POLICY_LABELS } from '#src/services/method/content/policyLabels.ts';
import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;
const W = 'our own rule (checks W1 and W3)';

const typicalError = (cvPct: number) => Number(typicalErrorPct({ cvPct, n: 3 }).toFixed(6));
const PUSH = typicalError(4);
const JUMP = typicalError(5);
const HOP = typicalError(4.5);
const legs = (lead: number, trail: number, te: number) => ({ lead, trail, teLeadPct: te, teTrailPct: te });
const number = (path: string, label: string, section: string, unit?: string): FormField => ({
  path,
  label,
  kind: 'number',
  optional: true,
  section,
  ...(unit ? { unit } : {}),
});

const S = {
  deficit: 'Lead deficit: push, jump and hop',
  divergence: 'Carry pulling away',
  demand: 'Demand over capacity',
  back: 'Late return',
  ahead: 'Ahead of strength',
  peak: 'Late peak',
  delivery: 'From delivery',
  around: 'Around it',
  policy: 'Thresholds: the defaults if empty',
};

const athleteColumns = [
  { name: 'strength', label: 'Lead push', unit: 'N', kind: 'number' },
  { name: 'clubSpeed', label: 'Club speed', unit: 'm/s', kind: 'number' },
] as const;

const fields: FormField[] = [
  {
    path: 'leadDeficit.values',
    label: 'Results, one test and session a line',
    kind: 'rows',
    optional: true,
    section: S.deficit,
    hint: 'Lead, trail, and the typical error between days of each in per cent',
    columns: [
      { name: 'lead', label: 'Lead', kind: 'number' },
      { name: 'trail', label: 'Trail', kind: 'number' },
      { name: 'teLeadPct', label: 'Typical error, lead', unit: '%', kind: 'number' },
      { name: 'teTrailPct', label: 'Typical error, trail', unit: '%', kind: 'number' },
    ],
  },
  {
    path: 'divergence.pairs',
    label: 'Sessions, one a line',
    kind: 'rows',
    optional: true,
    section: S.divergence,
    hint: 'Day (date or number), standard carry in m, lead push in N, height in cm, age in years',
    columns: [
      { name: 'day', label: 'Day', kind: 'number' },
      { name: 'carry', label: 'Carry', unit: 'm', kind: 'number' },
      { name: 'strength', label: 'Lead push', unit: 'N', kind: 'number' },
      { name: 'stature', label: 'Height', unit: 'cm', kind: 'number' },
      { name: 'age', label: 'Age', unit: 'years', kind: 'number' },
    ],
  },
  {
    path: 'divergence.othersRaw',
    label: 'Raw gains of the other athletes',
    kind: 'numbers',
    unit: '%',
    optional: true,
    section: S.divergence,
  },
  number('demand.peakLead.mean', 'Peak lead force in the driver swing, mean', S.demand, '× body weight'),
  number('demand.peakLead.cvPct', 'Its coefficient of variation', S.demand, '%'),
  number('demand.peakLead.n', 'Swings', S.demand),
  number('demand.capacity.mean', 'Lead push peak, mean', S.demand, '× body weight'),
  number('demand.capacity.cvPct', 'Its coefficient of variation', S.demand, '%'),
  number('demand.capacity.n', 'Trials', S.demand),
  number('demand.programmeMedian', 'Median ratio of the programme on the same rig', S.demand),
  {
    path: 'lateReturn.earlyDownswing',
    label: 'Lead share in early downswing, one number a swing',
    kind: 'numbers',
    unit: '%',
    optional: true,
    section: S.back,
  },
  {
    path: 'lateReturn.impact',
    label: 'Lead share at impact',
    kind: 'numbers',
    unit: '%',
    optional: true,
    section: S.back,
  },
  number('lateReturn.typicalErrorPct', 'Typical error', S.back, 'points'),
  {
    path: 'aheadOfStrength.others',
    label: 'Other athletes, one a line',
    kind: 'rows',
    optional: true,
    section: S.ahead,
    hint: 'Lead push in N, club speed in m/s; fifteen or more',
    columns: athleteColumns,
  },
  number('aheadOfStrength.athlete.strength', 'This athlete’s lead push', S.ahead, 'N'),
  number('aheadOfStrength.athlete.clubSpeed', 'This athlete’s club speed', S.ahead, 'm/s'),
  {
    path: 'latePeak.afterLeadArmParallelMs',
    label: 'Peak after lead arm parallel, one number a swing',
    kind: 'numbers',
    unit: 'ms',
    optional: true,
    section: S.peak,
  },
  number('delivery.carryChange', 'Change of carry', S.delivery, 'm'),
  number('delivery.carryMdc', 'Detectable change of carry', S.delivery, 'm'),
  number('delivery.clubSpeedChange', 'Change of club speed', S.delivery, 'm/s'),
  number('delivery.clubSpeedMdc', 'Detectable change of club speed', S.delivery, 'm/s'),
  number('delivery.attackChangeDeg', 'Change of attack angle', S.delivery, '°'),
  number('delivery.loftChangeDeg', 'Change of dynamic loft', S.delivery, '°'),
  { path: 'delivery.strengthRisen', label: 'Lead push has risen', kind: 'flag', optional: true, section: S.delivery },
  {
    path: 'context.hipRotation',
    label: 'Hip internal rotation, one measurement a line',
    kind: 'rows',
    optional: true,
    section: S.around,
    hint: 'Lead and trail, in degrees',
    columns: [
      { name: 'lead', label: 'Lead', unit: '°', kind: 'number' },
      { name: 'trail', label: 'Trail', unit: '°', kind: 'number' },
    ],
  },
  number('context.pain', 'Pain, 0 to 10', S.around),
  {
    path: 'context.velocityInSpurtBand',
    label: 'Growing as in a spurt',
    kind: 'flag',
    optional: true,
    section: S.around,
  },
  number('context.driverBallsChangePct', 'Driver balls on the week before', S.around, '%'),
  ...Object.entries(DEFAULT_POLICY).map(([key, value]): FormField => ({
    path: `policy.${key}`,
    label: POLICY_LABELS[key as keyof OutrunPolicy],
    kind: 'number',
    optional: true,
    section: S.policy,
    hint: `${value} if empty`,
  })),
];

export const outrunPage: MethodPage = {
  title: 'Outrun',
  group: 'Decisions',
  sentence:
    'Whether a driver strategy asks more of the lead leg than it can give yet: our own rule, with its evidence.',
  purpose: [
    'An outrun is a question between two coaches. Eight criteria look at the same athlete: one at what the lead leg can do, two compare the driver with it, one looks at the strategy, and four are shown without counting. Each answers not met, met, strong or cannot say.',
    'A level needs the gate: a lead deficit together with a comparing criterion. A deficit alone, or a deficit with a style, raises nothing. Look (gate and 3 points) asks both coaches to talk before the next block. Act (gate and 5 points, or 4 where the deficit is strong and a comparing criterion is still worth 2) asks for a Route within a week and no new driver speed work until then.',
    'Once raised it stays. It may be cleared after two judgements running without a level and with at most one point, made from two different testing days; people decide.',
  ],
  formulas: [
    {
      says: 'Lead deficit: the weighted mean of the differences of the newest two sessions of each test',
      tex: raw`\begin{aligned} &D = \frac{\sum w\,d}{\sum w}, \qquad \mathrm{SE} = \frac{1}{\sqrt{\sum w}}\\[0.5em] &w = \frac{1}{\mathrm{TE}_{\text{lead}}^2 + \mathrm{TE}_{\text{trail}}^2} \end{aligned}`,
    },
    {
      says: 'Carry pulling away: carry C beyond lead push F, height S and age A; newest two less all earlier, less the others’ median',
      tex: raw`\begin{aligned} q ={}& 100\,(\ln C - 0.5 \ln F - \ln S) - 2A\\ G ={}& \bar q_{\text{newest two}} - \bar q_{\text{earlier}}\\ &- \operatorname{median}_{\text{others}} \end{aligned}`,
    },
    { says: 'Its standard error', tex: raw`\mathrm{SE} = 4\sqrt{\tfrac12 + \tfrac{1}{n_{\text{earlier}}}}` },
    {
      says: 'Demand over capacity, both in times body weight; its lower 90 % limit counts',
      tex: raw`\begin{aligned} &\mathrm{DR} = \frac{\bar F_{\text{swing}}}{\bar F_{\text{push}}}\\[0.5em] &\mathrm{SE} = \frac{\mathrm{DR}}{100}\sqrt{\frac{\mathrm{CV}_d^2}{n_d} + 3^2 + \frac{\mathrm{CV}_i^2}{n_i} + 2.5^2} \end{aligned}`,
    },
    {
      says: 'Late return: mean change of lead share from early downswing to impact',
      tex: raw`\bar\Delta < -\max(\mathrm{TE}, 5)`,
    },
  ],
  tables: outrunTables,
  sources: [
    { of: 'The rule, its thresholds and its levels', source: 'Marram; tuned on a simulated academy', tag: 'proposal' },
    {
      of: 'Peak forces under the lead foot go with club speed, and loading it near lead arm parallel matters most',
      source: 'Han and others 2019, Sports Biomechanics 18:115–34 (63 men of handicap 3 or better)',
      tag: 'read',
    },
    {
      of: 'Asymmetry alone does not go with club speed',
      source: 'Wells and others, 50 men of handicap 5 or better',
      tag: 'read',
    },
    {
      of: 'Moving back is a fast style of good players',
      source: 'Ball and Best 2007, Journal of Sports Sciences 25:757–70',
      tag: 'read',
    },
    { of: 'Lead hip rotation and back pain', source: 'Murray 2009; Vad 2004 (adults, at one time)', tag: 'read' },
    { of: 'Upward attack with the driver is sound', source: 'Said by coaches', tag: 'practice' },
  ],
  limits: [
    'No published cut-off exists, and nothing here was validated in children. Figures of how often it is right come from our simulated academy.',
    'In that academy a large real deficit with ordinary carry looked like an early outrun in 17 to 26 % of such athletes within a year.',
    'It cannot see: an outrun without a lead deficit, deficits under about 5 %, the first term, excess carry under 3 to 4 %.',
    'Without force plates the demand cannot be measured, and outruns are found later or not at all: see the simulated figures.',
    'No flag does not mean safe. The word Stop never comes from here, but from Care.',
  ],
  fields,
  outputs: {
    ...CRITERION_LABELS,
    policy: '',
    level: 'Level',
    points: 'Points',
    gate: 'Gate',
    criteria: 'Criterion by criterion',
    'criteria.*.kind': '',
    'criteria.*.verdict': 'verdict',
    'criteria.*.points': 'points',
    'criteria.*.value': 'value',
    'criteria.*.standardError': 'standard error',
    'criteria.*.interval90': '90 % interval',
    'criteria.*.threshold': 'threshold',
    'criteria.*.reason': 'reason',
    clearsWhen: 'What would clear it',
    falseAlarms: 'False alarms to rule out',
  },
  example: {
    says: 'A strong lead deficit in three tests, and carry well ahead of growth and strength: 4 points, both strong, so Act.',
    request: {
      leadDeficit: {
        values: [
          legs(500, 560, PUSH),
          legs(0.118, 0.131, JUMP),
          legs(1.32, 1.41, HOP),
          legs(510, 556, PUSH),
          legs(0.12, 0.129, JUMP),
          legs(1.35, 1.43, HOP),
        ],
      },
      divergence: {
        pairs: [
          { day: '2025-01-10', carry: 150, strength: 620, stature: 155, age: 13 },
          { day: '2025-04-11', carry: 155, strength: 628, stature: 156, age: 13.25 },
          { day: '2025-07-11', carry: 166, strength: 625, stature: 157, age: 13.5 },
          { day: '2026-01-09', carry: 178, strength: 622, stature: 158, age: 14 },
          { day: '2026-04-10', carry: 186, strength: 618, stature: 159, age: 14.25 },
        ],
      },
    },
    published: [
      { path: 'criteria.0.value', value: -8.022082, tolerance: 1e-6, source: W },
      { path: 'criteria.0.standardError', value: 2.076918, tolerance: 1e-6, source: W },
      { path: 'criteria.1.value', value: 11.848648, tolerance: 1e-6, source: W },
      { path: 'criteria.1.standardError', value: 3.651484, tolerance: 1e-6, source: W },
      { path: 'points', value: 4, tolerance: 0, source: W },
      { path: 'level', value: 'act', tolerance: 0, source: W },
    ],
  },
};
