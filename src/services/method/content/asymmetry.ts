import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;

export const asymmetryPage: MethodPage = {
  title: 'Difference between legs',
  group: 'Two legs',
  sentence: 'How much weaker or stronger the lead leg was in a test, and whether that is more than noise.',
  purpose: [
    'A test is done on each leg, several trials a leg. This gives the difference of the means in per cent of the larger one, negative where the lead leg (the one nearer the target) is weaker, with a standard error and a 90 % interval. A difference whose interval holds 0 is inside the noise.',
    'Below it stand the published indices of the same two means, so that figures from elsewhere can be compared. The signed ones are written with the lead leg as the right one.',
  ],
  formulas: [
    {
      says: 'The difference, in per cent of the larger mean',
      tex: raw`d = 100\,\frac{\bar x_{\text{lead}} - \bar x_{\text{trail}}}{\max(\bar x_{\text{lead}}, \bar x_{\text{trail}})}`,
    },
    {
      says: 'Its standard error from the trials of one day, CVs as fractions',
      tex: raw`\mathrm{SE} = 100\,\frac{\min}{\max}\sqrt{\frac{\mathrm{CV}_{\text{lead}}^2}{n_{\text{lead}}} + \frac{\mathrm{CV}_{\text{trail}}^2}{n_{\text{trail}}}}`,
    },
    {
      says: 'The same from a typical error between days of each leg’s mean, in per cent',
      tex: raw`\mathrm{SE} = \frac{\min}{\max}\sqrt{\mathrm{TE}_{\text{lead}}^2 + \mathrm{TE}_{\text{trail}}^2}`,
    },
    {
      says: 'The 90 % interval: z = 1.644854, or Student’s t with Welch–Satterthwaite degrees of freedom where the trials themselves give the noise',
      tex: raw`d \pm z\,\mathrm{SE}`,
    },
    {
      says: 'The mean-based index; its denominator is the mean of both, although it is often printed otherwise',
      tex: raw`\mathrm{AI} = 100\,\frac{D - N}{(D + N)/2}`,
    },
    {
      says: 'The symmetry angle',
      tex: raw`\mathrm{SA} = 100\,\frac{45^\circ - \arctan(X_{\text{trail}}/X_{\text{lead}})}{90^\circ}`,
    },
  ],
  sources: [
    {
      of: 'Eleven of the indices',
      source:
        'Collected by Bishop and others 2016, Strength and Conditioning Journal 38(6):27–32; their worked table (25 against 20) is from memory',
      tag: 'memory',
    },
    {
      of: 'A difference counts only beyond the limbs’ own variation',
      source: 'Exell and others 2012, Journal of Biomechanics 45:1108–11',
      tag: 'read',
    },
    {
      of: 'Per cent of the larger leg for one-legged tests',
      source: 'Bishop and others 2018, Strength and Conditioning Journal 40(4):1–6',
      tag: 'read',
    },
    { of: 'Gait symmetry index', source: 'Robinson 1987, as printed in BMC Sports Science 2021, 13:128', tag: 'read' },
    { of: 'Symmetry angle', source: 'Zifchock and others 2008, Gait and Posture 27:622–7', tag: 'memory' },
    { of: 'Standard error by propagation, and every figure of the example', source: 'Derived here', tag: 'recomputed' },
  ],
  limits: [
    'No fixed line of 10 or 15 % is used: such lines have no proof for healthy young athletes, and they depend on the test, the measure and the person.',
    'The trials of one day know nothing of the next: an interval from them is too narrow for a decision over time. The product uses the typical error between days.',
    'One test never settles the side. Different tests agree on the weaker side only poorly to moderately.',
    'Golf is played from one side. A lead leg stronger than the trail leg is expected, and no difference is a fault in itself.',
    'Joint ranges do not belong here: compare them in degrees.',
  ],
  fields: [
    {
      path: 'lead',
      label: 'Lead leg, one number a trial',
      kind: 'numbers',
      hint: 'Separated by spaces or commas, any unit',
    },
    { path: 'trail', label: 'Trail leg, one number a trial', kind: 'numbers', hint: 'The same unit' },
    {
      path: 'better',
      label: 'Which is better',
      kind: 'choice',
      optional: true,
      options: [
        { value: 'higher', label: 'More, as in force or height' },
        { value: 'lower', label: 'Less, as in a time' },
      ],
    },
    {
      path: 'noise.typicalErrorPct.lead',
      label: 'Typical error between days, lead',
      kind: 'number',
      unit: '%',
      optional: true,
      section: 'Noise: leave all empty to take it from the trials',
      hint: 'Both legs, or neither',
    },
    {
      path: 'noise.typicalErrorPct.trail',
      label: 'Typical error between days, trail',
      kind: 'number',
      unit: '%',
      optional: true,
      section: 'Noise: leave all empty to take it from the trials',
    },
    {
      path: 'noise.cvPct',
      label: 'Or one coefficient of variation for both',
      kind: 'number',
      unit: '%',
      optional: true,
      section: 'Noise: leave all empty to take it from the trials',
    },
  ],
  outputs: {
    'lead.n': 'Lead, trials',
    'lead.mean': 'Lead, mean',
    'lead.best': 'Lead, best',
    'lead.sd': 'Lead, standard deviation',
    'lead.cvPct': 'Lead, coefficient of variation, %',
    'trail.n': 'Trail, trials',
    'trail.mean': 'Trail, mean',
    'trail.best': 'Trail, best',
    'trail.sd': 'Trail, standard deviation',
    'trail.cvPct': 'Trail, coefficient of variation, %',
    differencePct: 'Difference, % of the larger mean',
    differencePctOfBest: 'Difference of the best trials, %',
    standardErrorPct: 'Standard error, %',
    interval90Pct: '90 % interval, %',
    largerCvPct: 'The larger coefficient of variation, %',
    beyondNoise: 'Beyond the noise',
    weakerSide: 'Weaker side',
    'indices.lsi1': 'Limb symmetry index 1 (N/D)',
    'indices.lsi2': 'Limb symmetry index 2 (1 − N/D)',
    'indices.lsi3': 'Limb symmetry index 3, signed',
    'indices.bsa': 'Bilateral strength asymmetry',
    'indices.bai1': 'Bilateral asymmetry index 1',
    'indices.bai2': 'Bilateral asymmetry index 2',
    'indices.ai': 'Asymmetry index',
    'indices.si': 'Symmetry index',
    'indices.gaitSi': 'Gait symmetry index, signed',
    'indices.symmetryAngle': 'Symmetry angle, signed',
    'indices.standardPctDifference': 'Standard percentage difference',
  },
  example: {
    says: 'Three trials a leg, 500 N and 560 N on average, each leg with a coefficient of variation of 4 %: even a difference of 10.7 % has an interval from 6 to 16 %.',
    request: { lead: [480, 500, 520], trail: [537.6, 560, 582.4], noise: { cvPct: 4 } },
    published: [
      { path: 'differencePct', value: -10.714286, tolerance: 1e-6, source: 'recomputed (check A13)' },
      { path: 'standardErrorPct', value: 2.916059, tolerance: 1e-6, source: 'recomputed (check B3)' },
      { path: 'interval90Pct.0', value: -15.510776, tolerance: 1e-6, source: 'recomputed (check B3)' },
      { path: 'interval90Pct.1', value: -5.917795, tolerance: 1e-6, source: 'recomputed (check B3)' },
      { path: 'indices.ai', value: 11.320755, tolerance: 1e-6, source: 'recomputed (check A13)' },
    ],
  },
};
