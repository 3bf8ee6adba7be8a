import { describe, expect, it } from 'vitest';
import type { CalculatorName } from '#src/schemas/method/calculatorNames.ts';
import { CALCULATORS } from '#src/services/method/calculators.ts';
import { runCalculator } from '#src/services/method/runCalculator.ts';
import { W1, W2, W3, W7, W9 } from '#tests/unit/domain/outrun/workedExamples.ts';

/** A value of an answer by its path. */
interface Expected {
  name: CalculatorName;
  says: string;
  request: object;
  values: Readonly<Record<string, unknown>>;
  /** relative, absolute where the value is 0 */
  tolerance?: number;
  source: string;
}

const answerTo = (name: CalculatorName, request: object): Promise<object> =>
  runCalculator(CALCULATORS[name], CALCULATORS[name].schema.parse(request) as object);

const valueAt = (answer: object, path: string): unknown =>
  path.split('/').reduce<unknown>((part, key) => (part as Record<string, unknown>)[key], answer);

const LEGS = { lead: [500], trail: [560] };
const B5 = { lead: [14.8, 15.2, 15], trail: [16.3, 16.9, 16.6] };
const WEIR = [
  [146, 140],
  [148, 152],
  [170, 152],
  [90, 99],
  [157, 145],
  [156, 153],
  [176, 167],
  [205, 218],
];
const EPA = [10, 10, 10, 5, 10, 20, 18, 17, 15, 24, 15];
const upTo = (n: number) => Array.from({ length: n }, (_, i) => i + 1);
const REST = [[], [], [], [], [], []];
const pain = (on: string, more: object) => ({ on, site: 'joint', pain: 1, nextMorning: 0, ...more });
/** Two samples a second; the shares are 50, 60 and 55 % at 0, 0.5 and 1 s. */
const SHARES = { sampleRate: 2, lead: [250, 300, 275], trail: [250, 200, 225] };

/** Each convention that decides a digit, through the calculator as it is called. */
const EXPECTED: readonly Expected[] = [
  {
    name: 'asymmetry',
    says: 'one typical error for both legs',
    request: { ...LEGS, noise: { typicalErrorPct: 3.40343 } },
    values: { differencePct: -10.714286, standardErrorPct: 4.297479, 'interval90Pct/1': -3.645562, weakerSide: 'lead' },
    source: 'by hand: (500/560)·√2·3.40343, ± 1.6448536 of it',
  },
  {
    name: 'asymmetry',
    says: 'the trials’ own noise by t, with Welch–Satterthwaite degrees of freedom',
    request: B5,
    values: {
      standardErrorPct: 1.1716659332,
      'interval90Pct/0': -12.2001816795,
      'interval90Pct/1': -7.0769267543,
      differencePctOfBest: -10.059172,
      'trail/sd': 0.3,
    },
    source: 'B5, recomputed with SciPy 1.17: df 3.679625',
  },
  {
    name: 'asymmetry',
    says: 'the directional signs turn where lower is better',
    request: { lead: [25], trail: [20], better: 'lower' },
    values: {
      differencePct: -20,
      weakerSide: 'lead',
      'indices/symmetryAngle': -7.044657,
      'indices/gaitSi': -22.222222,
    },
    source: 'A9, A10 of 25 and 20 (recomputed), signs by the contract',
  },
  {
    name: 'asymmetry',
    says: 'the indices of 25 and 20',
    request: { lead: [25], trail: [20] },
    values: {
      'indices/lsi1': 80,
      'indices/lsi2': 20,
      'indices/lsi3': 22.222222,
      'indices/bsa': 20,
      'indices/bai1': 11.111111,
      'indices/bai2': 22.222222,
      'indices/ai': 22.222222,
      'indices/si': 11.111111,
      'indices/symmetryAngle': 7.044657,
      'indices/standardPctDifference': 20,
      beyondNoise: null,
    },
    source: 'A1 to A11 (recomputed; T5: 22.2222, not 14.2857)',
  },
  {
    name: 'agreement',
    says: 'undefined where all pairs are in one cell',
    request: { pairs: [['lead', 'lead']] },
    values: { observed: 1, expected: 1, kappa: null, band: null },
    source: 'B6, by hand',
  },
  {
    name: 'reliability',
    says: 'two trials',
    request: { table: WEIR },
    values: {
      bms: 2098.535714,
      jms: 30.25,
      ems: 57.107143,
      icc21: 0.949975,
      icc31: 0.947016,
      'ci95/icc31/0': 0.760678,
      'ci95/icc31/1': 0.989163,
      sem: 7.556927,
      typicalError: 7.556927,
      mdc95: 20.946732,
      mdc90: 17.578729,
      'typicalErrorCi90/0': 5.330787,
      'typicalErrorCi90/1': 13.580937,
      swc: 6.554388,
      logCvPct: 5.161627,
    },
    source: 'B2: Weir 2005, recomputed (numbers from memory)',
  },
  {
    name: 'trend',
    says: 'ties: Z with continuity correction, two-sided by default',
    request: { x: upTo(EPA.length), y: EPA },
    values: {
      'mannKendall/s': 22,
      'mannKendall/variance': 155.333333,
      'mannKendall/z': 1.68495,
      'mannKendall/p': 0.091998,
      'mannKendall/exact': false,
    },
    tolerance: 1e-5,
    source: 'B12: EPA QA/G-9S p. 109 (read)',
  },
  {
    name: 'trend',
    says: 'exact for ten points or fewer without ties',
    request: { x: upTo(5), y: [5, 6, 11, 8, 10], alternative: 'greater' },
    values: {
      'mannKendall/s': 6,
      'mannKendall/p': 14 / 120,
      'mannKendall/exact': true,
      'mannKendall/z': 5 / Math.sqrt(50 / 3),
    },
    source: 'B13 (recomputed), Z by hand: 5/√16.6667',
  },
  {
    name: 'jump-height',
    says: 'g as given',
    request: { flightTime: 0.5, g: 9.80665 },
    values: { height: 0.3064578, takeoffVelocity: 2.4516625, rsiMod: null },
    tolerance: 1e-7,
    source: 'C1 (exact)',
  },
  {
    name: 'jump-height',
    says: 'modified reactive strength index',
    request: { takeoffVelocity: 2.291831, timeToTakeoff: 0.7 },
    values: { height: 0.267711, flightTime: 0.467244, rsiMod: 0.382444 },
    tolerance: 2e-6,
    source: 'C4 (exact)',
  },
  {
    name: 'maturity',
    says: 'a girl',
    request: { sex: 'female', age: 12, stature: 151.5, sittingHeight: 79.5, mass: 41.8 },
    values: {
      'mirwald/offset': -0.036325,
      'moore/offset': -0.031355,
      mooreStature: null,
      fransen: null,
      band: 'circa',
    },
    tolerance: 2e-5,
    source: 'E6 (recomputed)',
  },
  {
    name: 'growth-centile',
    says: 'a value of the published third centile',
    request: { measure: 'bmi', sex: 'female', ageMonths: 144.5, value: 14.4941525 },
    values: { centile: 3, m: 18.10148804 },
    tolerance: 1e-5,
    source: 'E9: CDC 2000, P3 column (read)',
  },
  {
    name: 'growth-centile',
    says: 'a reference of one’s own with L = 1',
    request: { lms: { l: 1, m: 149.0807, s: 0.04753 }, value: 140 },
    values: { z: -1.2815, centile: 10 },
    tolerance: 1e-3,
    source: 'E10: WHO 2007, boy of 144 months (recomputed)',
  },
  {
    name: 'growth-centile',
    says: 'nothing outside the table',
    request: { measure: 'weight', sex: 'male', ageMonths: 72.4, value: 20 },
    values: { l: null, m: null, s: null, z: null, centile: null },
    source: 'by the contract: 72.5 to 240 months',
  },
  {
    name: 'growth-velocity',
    says: '90 % interval of E8',
    request: {
      measures: [
        { on: '2026-04-02', stature: 152.4 },
        { on: '2026-01-01', stature: 150 },
      ],
    },
    values: { perYear: 9.632967, 'interval90/0': 9.632967 - 1.6448536 * 1.702884, 'interval90/1': 12.433962, days: 91 },
    tolerance: 2e-6,
    source: 'E8 (recomputed): √2·0.3/(91/365.25) = 1.702884',
  },
  {
    name: 'air-density',
    says: 'altitude',
    request: { temperatureC: 8.5, altitudeM: 1000 },
    values: { isaDensity: 1.111643, formula: 'CIPM-2007' },
    tolerance: 1e-5,
    source: 'G10: ISO 2533 (read)',
  },
  {
    name: 'air-density',
    says: 'pressure and dry air',
    request: { temperatureC: 15, humidityPct: 0, pressurePa: 101_325 },
    values: { density: 1.225521 },
    tolerance: 1e-5,
    source: 'G11: CIPM-2007 (recomputed)',
  },
  {
    name: 'flight',
    says: 'no air',
    request: { ballSpeed: 70, launchDeg: 12, spinRpm: 2800, density: 0 },
    values: { carry: 203.161014, apex: 10.795802, time: 2.967139, landingDeg: 12, landingSpeed: 70 },
    source: 'G5: vacuum (exact)',
  },
  {
    name: 'flight',
    says: 'constants without drag or lift are no air',
    request: { ballSpeed: 70, launchDeg: 12, spinRpm: 2800, model: 'constant', cd: 0, cl: 0 },
    values: { carry: 203.161014, apex: 10.795802 },
    source: 'G5: vacuum (exact)',
  },
  {
    name: 'flight',
    says: 'a slower launch in the standard air of the rule',
    request: { ballSpeed: 110 * 0.44704, launchDeg: 13, spinRpm: 2800 },
    values: { carry: 156.33 * 0.9144 },
    tolerance: 6e-4,
    source: 'G9: 156.33 yd ± 0.1 (recomputed, no measured truth)',
  },
  {
    name: 'speed-ratio',
    says: 'the ends of the range are inside',
    request: { ballSpeed: 1.52, clubSpeed: 1 },
    values: { ratio: 1.52, plausible: true },
    source: 'our own range; from it on the reading is doubted above only',
  },
  {
    name: 'speed-ratio',
    says: 'a ball slower than the club allows',
    request: { ballSpeed: 1.09, clubSpeed: 1 },
    values: { ratio: 1.09, plausible: false },
    source: 'our own range',
  },
  {
    name: 'ground-trace',
    says: 'linear between samples, five points named undetermined',
    request: {
      ...SHARES,
      mass: 50,
      events: { takeaway: 0, top: 0.25, earlyDownswing: 0.5, leadArmParallel: 0.6, impact: 1 },
    },
    values: {
      'leadSharePctAt/top': 55,
      'leadSharePctAt/impact': 55,
      styleChangePct: -5,
      style: 'undetermined',
      'peakLead/force': 300,
      'peakLead/time': 0.5,
      'peakLead/beforeImpact': 0.5,
      'peakLead/afterLeadArmParallel': -0.1,
      'peakLead/timesBodyWeight': 0.611621,
    },
    source: 'by hand: 300/(50·9.81); the limits are inside by the contract',
  },
  {
    name: 'ground-trace',
    says: 'no style without an early downswing',
    request: { ...SHARES, events: { takeaway: 0, top: 0.25, leadArmParallel: 0.6, impact: 1 } },
    values: { style: null, styleChangePct: null, rampRate: null, 'peakLead/timesBodyWeight': null },
    source: 'by the contract',
  },
  {
    name: 'session-load',
    says: 'no monotony of a week without sessions',
    request: { days: [[], ...REST] },
    values: { week: 0, mean: 0, sd: 0, monotony: null, strain: null },
    source: 'F3, by hand',
  },
  {
    name: 'week-change',
    says: 'nothing against a week of rest',
    request: { weeks: [0, 100] },
    values: { changePct: null },
    source: 'by hand: division by 0',
  },
  {
    name: 'one-rep-max',
    says: 'one repetition is the load itself',
    request: { load: 100, reps: 1 },
    values: { epley: 100, brzycki: 100 },
    source: 'F7 (by hand)',
  },
  {
    name: 'one-rep-max',
    says: 'no estimate above ten',
    request: { load: 100, reps: 11 },
    values: { epley: null, brzycki: null },
    source: 'F7 (by hand)',
  },
  {
    name: 'outrun',
    says: 'a deficit and a style raise nothing',
    request: { ...W1, ...W9 },
    values: { level: null, points: 3, gate: false, 'criteria/3/value': -10.6, 'criteria/3/interval90/0': -13.659776 },
    source: 'W1 + W9: our own rule (SCIENCE §9)',
  },
  {
    name: 'outrun',
    says: 'Look',
    request: { ...W2, ...W7 },
    values: {
      level: 'look',
      points: 3,
      gate: true,
      'criteria/2/value': 1.111111,
      'criteria/2/interval90/1': 1.201819,
      'criteria/2/verdict': 'strong',
    },
    source: 'W2 + W7: our own rule (SCIENCE §9)',
  },
  {
    name: 'outrun',
    says: 'no level without a deficit; thresholds of one’s own are in the answer',
    request: { ...W3, ...W7, ...W9, policy: { look: 2 } },
    values: { level: null, points: 5, gate: false, 'policy/look': 2, 'policy/act': 5, 'policy/deficitMet': -4 },
    source: 'W3 + W7 + W9: our own rule (SCIENCE §9)',
  },
  {
    name: 'care',
    says: 'a morning that is not known',
    request: { under18: true, reports: [pain('2026-05-01', { pain: 0, nextMorning: null })] },
    values: { level: 'reduce', 'allowed/driver': true, reason: null },
    source: 'H4: our own rule',
  },
  {
    name: 'care',
    says: 'five stops under 18',
    request: { under18: true, reports: [pain('2026-05-01', { pain: 5 })] },
    values: { level: 'stop-and-refer', 'allowed/impact': false },
    source: 'H2: our own rule',
  },
  {
    name: 'care',
    says: 'five reduces an adult',
    request: { under18: false, reports: [pain('2026-05-01', { pain: 5 })] },
    values: { level: 'reduce' },
    source: 'after Thomeé 1997 and Silbernagel 2007 (from memory)',
  },
];

/** Null here is never because the request did not ask for it. */
const WITH_REASON = new Set(['kappa', 'z', 'beyondNoise', 'monotony', 'changePct', 'epley', 'style', 'level']);

describe('conventions', () => {
  it.each(EXPECTED)('$name: $says ($source)', async ({ name, request, values, tolerance = 1e-6 }) => {
    const answer = await answerTo(name, request);
    for (const [path, value] of Object.entries(values)) {
      const found = valueAt(answer, path);
      if (typeof value !== 'number') expect(found, path).toBe(value);
      else {
        const off = Math.abs((found as number) - value);
        expect(off, `${path} is ${found}`).toBeLessThanOrEqual(tolerance * (Math.abs(value) || 1));
      }
      if (value === null && WITH_REASON.has(path)) expect(valueAt(answer, 'reason'), path).toMatch(/\w/);
    }
  });

  it('a standard carry is the measured one by the ratio of two flights', async () => {
    const launch = { ballSpeed: 58, launchDeg: 12, spinRpm: 2800 };
    const air = { temperatureC: 4, altitudeM: 300 };
    const carryIn = async (conditions: object, wind: number): Promise<number> => {
      const { density } = (await answerTo('air-density', conditions)) as { density: number };
      return ((await answerTo('flight', { ...launch, density, wind })) as { carry: number }).carry;
    };
    const ratio = (await carryIn({ temperatureC: 20 }, 0)) / (await carryIn(air, -2));
    const answer = await answerTo('carry-standard', {
      shots: [
        { ...launch, carry: 170 },
        { ...launch, carry: 180, spinRpm: null },
      ],
      conditions: { ...air, wind: -2 },
    });
    expect(ratio).toBeGreaterThan(1.01);
    expect(valueAt(answer, 'shots/0/adjustment')).toBeCloseTo(ratio, 9);
    expect(valueAt(answer, 'shots/0/carryStandard')).toBeCloseTo(170 * ratio, 6);
    expect(valueAt(answer, 'shots/1')).toMatchObject({ carryStandard: null, adjustment: null });
    expect(answer).toMatchObject({ median: 175, medianStandard: valueAt(answer, 'shots/0/carryStandard') });
  });

  it('L, M and S are linear between the ages of the table (120.5 and 121.5 months)', async () => {
    const at = async (ageMonths: number) =>
      (await answerTo('growth-centile', { measure: 'stature', sex: 'male', ageMonths, value: 145 })) as {
        l: number;
        m: number;
        s: number;
      };
    const [before, between, after] = [await at(120.5), await at(120.75), await at(121.5)];
    for (const key of ['l', 'm', 's'] as const) {
      expect(after[key]).not.toBe(before[key]);
      expect(between[key]).toBeCloseTo(0.75 * before[key] + 0.25 * after[key], 12);
    }
  });

  it('an outrun always has its eight criteria, in order', async () => {
    const names = [
      'lead-deficit',
      'divergence',
      'demand',
      'late-return',
      'ahead-of-strength',
      'late-peak',
      'delivery',
      'context',
    ];
    for (const request of [{}, { ...W1, ...W3, ...W7, ...W9 }]) {
      const { criteria } = (await answerTo('outrun', request)) as { criteria: { name: string; points: number }[] };
      expect(criteria.map(({ name }) => name)).toEqual(names);
      expect(criteria.slice(4).map(({ points }) => points)).toEqual([0, 0, 0, 0]);
    }
  });
});
