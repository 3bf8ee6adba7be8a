import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;
const times = (count: number, one: string, other: string) => Array.from({ length: count }, () => [one, other]);

export const agreementPage: MethodPage = {
  title: 'Agreement on the weaker side',
  group: 'Two legs',
  sentence: 'Whether two tests, or two sessions, name the same leg more often than chance would.',
  purpose: [
    'Each pair holds the weaker side by one test and by another (or by the same test on another day). Kappa is the share of agreement beyond what chance gives: 1 is full agreement, 0 is chance.',
  ],
  formulas: [
    {
      says: 'Cohen’s kappa from the observed and the expected share of agreement',
      tex: raw`\kappa = \frac{p_o - p_e}{1 - p_e}`,
    },
    { says: 'Agreement expected by chance, over the sides', tex: raw`p_e = \sum_s p_{1s}\, p_{2s}` },
  ],
  sources: [
    { of: 'Kappa', source: 'Cohen 1960, Educational and Psychological Measurement 20:37–46', tag: 'memory' },
    {
      of: 'Names of the bands',
      source: 'Landis and Koch 1977, Biometrics 33:159–74; Viera and Garrett 2005',
      tag: 'memory',
    },
    {
      of: 'What to expect: .29 to .64 for an isometric squat, .64 to .66 for a one-leg jump',
      source: 'Bishop and others 2019, Sports 7:58 (28 athletes)',
      tag: 'read',
    },
    {
      of: 'What to expect in golfers: .06 to .39 between tests',
      source: 'Wells and others, 50 men of handicap 5 or better',
      tag: 'read',
    },
  ],
  limits: [
    'Kappa depends on how common each side is: with one side rare it is low even where most pairs agree.',
    'A dozen pairs give a wide uncertainty, which is not shown here.',
    'The names of the bands are a custom and no more.',
  ],
  fields: [
    { path: 'pairs', label: 'Pairs, one a line', kind: 'table', hint: 'lead, trail or none, twice: “lead trail”' },
  ],
  outputs: { observed: 'Observed agreement', expected: 'Expected by chance', kappa: 'Kappa', band: 'Band' },
  example: {
    says: 'Of 50 pairs 20 agree on lead and 15 on trail.',
    request: {
      pairs: [
        ...times(20, 'lead', 'lead'),
        ...times(5, 'lead', 'trail'),
        ...times(10, 'trail', 'lead'),
        ...times(15, 'trail', 'trail'),
      ],
    },
    published: [
      { path: 'observed', value: 0.7, tolerance: 1e-12, source: 'by hand (check B6)' },
      { path: 'expected', value: 0.5, tolerance: 1e-12, source: 'by hand (check B6)' },
      { path: 'kappa', value: 0.4, tolerance: 1e-12, source: 'by hand (check B6)' },
      { path: 'band', value: 'fair', tolerance: 0, source: 'Landis and Koch 1977 (from memory)' },
    ],
  },
};
