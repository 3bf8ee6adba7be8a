import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;

export const weekChangePage: MethodPage = {
  title: 'Change from week to week',
  group: 'Load',
  sentence: 'How much more or less the newest week held than the one before.',
  purpose: [
    'A plain change in per cent, for load, minutes or driver balls. It is a reason to ask why, above all in a growth spurt, and no verdict.',
  ],
  formulas: [
    {
      says: 'Change of the newest week',
      tex: raw`\Delta = 100\,\frac{w_{\text{newest}} - w_{\text{before}}}{w_{\text{before}}}`,
    },
  ],
  sources: [
    {
      of: 'Why not a ratio of a short to a long mean: the two share data, which makes a false correlation',
      source: 'Lolli and others 2019, British Journal of Sports Medicine 53:921 and 53:1510',
      tag: 'read',
    },
    { of: 'Ask above about 15 to 20 % in a growth spurt', source: 'Marram', tag: 'proposal' },
    { of: '“10 % a week”', source: 'A custom, not evidence', tag: 'practice' },
  ],
  limits: ['After a light week every normal one looks like a leap.', 'Nothing here predicts an injury.'],
  fields: [{ path: 'weeks', label: 'Weeks, the newest last', kind: 'numbers', hint: 'Load, minutes or balls' }],
  outputs: { changePct: 'Change on the week before, %' },
  example: {
    says: 'From 1 200 to 1 360.',
    request: { weeks: [1200, 1360] },
    published: [{ path: 'changePct', value: 13.333333, tolerance: 1e-6, source: 'by hand (check F6)' }],
  },
};
