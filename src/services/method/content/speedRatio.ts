import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;

export const speedRatioPage: MethodPage = {
  title: 'Speed ratio',
  group: 'Driver',
  sentence: 'Ball speed over club speed, and whether the two readings can be true together.',
  purpose: [
    'A driver struck in the middle sends the ball off at about 1.4 to 1.5 times the club’s speed. A ratio far outside says that one of the readings is wrong, so the product proposes to leave such a shot out.',
  ],
  formulas: [
    {
      says: 'The ratio',
      tex: raw`\text{ratio} = \frac{v_{\text{ball}}}{v_{\text{club}}}, \qquad 1.1 \le \text{ratio} \le 1.52`,
    },
  ],
  sources: [
    { of: 'The ratio', source: 'Used by every coach', tag: 'practice' },
    { of: 'The plausible range', source: 'Marram', tag: 'proposal' },
    {
      of: '176 mph of ball from 120 mph of club',
      source: 'Overall Distance Standard of the rules of golf',
      tag: 'read',
    },
  ],
  limits: [
    'It judges readings, not golfers: a mis-hit has a low ratio and is still a shot.',
    'Irons and wedges have lower ratios; the range is for the driver.',
  ],
  fields: [
    { path: 'ballSpeed', label: 'Ball speed', kind: 'number', hint: 'Any unit' },
    { path: 'clubSpeed', label: 'Club speed', kind: 'number', hint: 'The same unit' },
  ],
  outputs: { ratio: 'Ratio', plausible: 'Plausible for a driver' },
  example: {
    says: 'The two speeds of the Overall Distance Standard, in mph.',
    request: { ballSpeed: 176, clubSpeed: 120 },
    published: [
      { path: 'ratio', value: 1.466667, tolerance: 1e-6, source: 'rules of golf, read (check G4)' },
      { path: 'plausible', value: true, tolerance: 0, source: 'our own range' },
    ],
  },
};
