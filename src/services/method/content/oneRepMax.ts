import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;

export const oneRepMaxPage: MethodPage = {
  title: 'One-repetition maximum',
  group: 'Load',
  sentence: 'What could be lifted once, estimated from a load lifted several times.',
  purpose: [
    'Two customary estimates from a set taken to the limit. They serve to plan loads as a share of the maximum without ever testing it.',
  ],
  formulas: [
    { says: 'Epley; one repetition is the load itself', tex: raw`w\left(1 + \frac{r}{30}\right)` },
    { says: 'Brzycki', tex: raw`\frac{36\,w}{37 - r}` },
  ],
  sources: [{ of: 'Both formulas', source: 'Epley 1985; Brzycki 1993', tag: 'memory' }],
  limits: [
    'Above ten repetitions no estimate is given: the formulas part ways, and Brzycki’s has no value at 37.',
    'Made on adults. Under 16, repetitions in reserve are the better guide, and a set to the limit is not wanted.',
    'The two agree at ten repetitions only.',
  ],
  fields: [
    { path: 'load', label: 'Load', kind: 'number', hint: 'Any unit' },
    { path: 'reps', label: 'Repetitions to the limit', kind: 'number', hint: 'Whole, 1 to 10' },
  ],
  outputs: { epley: 'Epley', brzycki: 'Brzycki' },
  example: {
    says: '100 kg, five times.',
    request: { load: 100, reps: 5 },
    published: [
      { path: 'epley', value: 116.666667, tolerance: 1e-6, source: 'by hand (check F7)' },
      { path: 'brzycki', value: 112.5, tolerance: 1e-12, source: 'by hand (check F7)' },
    ],
  },
};
