import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;
const F1 = 'recomputed (check F1)';
const days = ['Day 1', 'Day 2', 'Day 3', 'Day 4', 'Day 5', 'Day 6', 'Day 7'];
const columns = [
  { name: 'rpe', label: 'Effort', kind: 'number' },
  { name: 'minutes', label: 'Minutes', kind: 'number' },
] as const;

export const sessionLoadPage: MethodPage = {
  title: 'Session load of a week',
  group: 'Load',
  sentence: 'How much a week held, from effort and minutes, and how alike its days were.',
  purpose: [
    'About half an hour after a session the athlete says how hard it was, from 0 (rest) to 10 (maximal). Effort times minutes is its load. Days that are all alike make a high monotony; a week both heavy and monotonous makes a high strain.',
  ],
  formulas: [
    { says: 'Load of a session', tex: raw`\text{load} = \text{effort} \times \text{minutes}` },
    {
      says: 'Monotony over the seven days, rest days as 0, sample standard deviation',
      tex: raw`\text{monotony} = \frac{\bar x}{\mathrm{SD}}`,
    },
    { says: 'Strain', tex: raw`\text{strain} = \text{week} \times \text{monotony}` },
  ],
  sources: [
    { of: 'Load, monotony, strain', source: 'Foster 1998; Foster and others 2001', tag: 'read' },
    { of: 'Words of the scale', source: 'Category-ratio scale, as printed with the method', tag: 'read' },
    { of: 'Monotony above 2 is looked at in adults', source: 'Adult literature', tag: 'memory' },
  ],
  limits: [
    'There is no cut-off for children: compare an athlete with their own weeks.',
    'The standard deviation here divides by six. Where it divides by seven, monotony comes out 8 % higher: ask before comparing.',
    'Driver balls belong on a line of their own: minutes do not count them.',
  ],
  fields: days.map((label, i) => ({
    path: `days.${i}`,
    label,
    kind: 'rows' as const,
    columns,
    oneLine: true,
    optional: true,
    ...(i === 0 ? { hint: 'Effort and minutes, sessions parted by a semicolon: 6 60; 4 30. Empty for rest' } : {}),
  })),
  outputs: {
    daily: 'Load by day',
    week: 'Load of the week',
    mean: 'Mean of a day',
    sd: 'Standard deviation of the days',
    monotony: 'Monotony',
    strain: 'Strain',
  },
  example: {
    says: 'Loads of 360, 180, 0, 350, 270, 200 and 0.',
    request: {
      days: [
        [{ rpe: 6, minutes: 60 }],
        [{ rpe: 3, minutes: 60 }],
        [],
        [{ rpe: 5, minutes: 70 }],
        [{ rpe: 6, minutes: 45 }],
        [{ rpe: 4, minutes: 50 }],
        [],
      ],
    },
    published: [
      { path: 'week', value: 1360, tolerance: 0, source: F1 },
      { path: 'mean', value: 194.285714, tolerance: 1e-6, source: F1 },
      { path: 'sd', value: 148.980663, tolerance: 1e-6, source: F1 },
      { path: 'monotony', value: 1.3041, tolerance: 1e-6, source: F1 },
      { path: 'strain', value: 1773.576, tolerance: 1e-6, source: F1 },
    ],
  },
};
