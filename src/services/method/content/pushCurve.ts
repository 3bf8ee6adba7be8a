import { examplePush } from '#src/services/method/content/exampleCurves.ts';
import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;
const C8 = 'exact for a rise by 1 − e^(−10t) (check C8)';

export const pushCurvePage: MethodPage = {
  title: 'Isometric push from a force curve',
  group: 'Force',
  sentence: 'Peak force, early force and its rate from a push against something that does not move.',
  purpose: [
    'The athlete leans into the bar or belt for a second, then pushes as hard and fast as possible for three to five seconds. The peak is the figure to decide by; the force after 50 to 250 ms and the rates say how fast it came.',
  ],
  formulas: [
    {
      says: 'Onset: the last sample at or below the line before the force stays above it for 20 ms',
      tex: raw`F > \bar F_{\text{preload}} + 5\,\mathrm{SD}_{\text{preload}}`,
    },
    {
      says: 'Rate of force development over a window from onset',
      tex: raw`\mathrm{RFD}_{0\text{–}T} = \frac{F(t_0 + T) - F(t_0)}{T}`,
    },
    {
      says: 'Impulse above the preload',
      tex: raw`J = \int_{t_0}^{t_0 + T} \bigl(F(t) - \bar F_{\text{preload}}\bigr)\,dt`,
    },
    {
      says: 'Relative to body size',
      tex: raw`\frac{F_{\text{peak}}}{m} \quad\text{and}\quad \frac{F_{\text{peak}}}{W}`,
    },
  ],
  sources: [
    { of: 'Onset at 5 SD of the preload', source: 'As commonly done', tag: 'memory' },
    {
      of: 'Peak force repeats within 11 %, rate and impulse of a one-leg pull do not',
      source: 'Thomas and others 2017, Sports 5:15 (17 athletes of 16 and 17)',
      tag: 'read',
    },
    {
      of: 'Early rates fail under 16',
      source: 'Journal of Sports Science and Medicine 25:556 (59 boys, under 12 to under 18)',
      tag: 'read',
    },
    { of: 'Windows of 50 to 250 ms', source: 'Used in most laboratories', tag: 'practice' },
    { of: 'The curve of the example', source: 'In closed form', tag: 'recomputed' },
  ],
  limits: [
    'Forces are gross: they hold the weight that the athlete leans in with. Compare only pushes set up alike.',
    'Under 16, rates and early force are information only; decide by the peak.',
    'Another joint angle is another test.',
    'A half-hearted push looks like a weak leg.',
  ],
  fields: [
    { path: 'sampleRate', label: 'Samples a second', kind: 'number', unit: 'Hz' },
    { path: 'force', label: 'Force', kind: 'samples', unit: 'N', hint: 'One quiet second first' },
    {
      path: 'bodyWeight',
      label: 'Body weight',
      kind: 'number',
      unit: 'N',
      optional: true,
      hint: 'For the figures per kilogram and times body weight',
    },
    { path: 'g', label: 'Gravity', kind: 'number', unit: 'm/s²', optional: true, hint: '9.81 if empty' },
  ],
  outputs: {
    preload: 'Preload, N',
    onsetIndex: 'Onset, sample',
    peakForce: 'Peak force, N',
    netPeakForce: 'Peak above the preload, N',
    'forceAt.50': 'Force after 50 ms, N',
    'forceAt.100': 'Force after 100 ms, N',
    'forceAt.150': 'Force after 150 ms, N',
    'forceAt.200': 'Force after 200 ms, N',
    'forceAt.250': 'Force after 250 ms, N',
    'rfd.0-100': 'Rate, 0 to 100 ms, N/s',
    'rfd.0-150': 'Rate, 0 to 150 ms, N/s',
    'rfd.0-200': 'Rate, 0 to 200 ms, N/s',
    'impulse.0-200': 'Impulse, 0 to 200 ms, N·s',
    perKg: 'Peak, N/kg',
    timesBodyWeight: 'Peak, × body weight',
    'quality.ok': 'Curve can be read',
    'quality.problems': 'Remarks',
  },
  example: {
    says: 'A push of 50 kg that rises from body weight towards 1 500 N.',
    request: examplePush(),
    published: [
      { path: 'forceAt.100', value: 1128.625704, tolerance: 1e-6, source: C8 },
      { path: 'forceAt.200', value: 1363.379032, tolerance: 1e-6, source: C8 },
      { path: 'rfd.0-100', value: 6381.257, tolerance: 1e-6, source: C8 },
      { path: 'rfd.0-200', value: 4364.395, tolerance: 1e-6, source: C8 },
      { path: 'impulse.0-200', value: 114.612097, tolerance: 1e-4, source: C8 },
      { path: 'timesBodyWeight', value: 3.058104, tolerance: 1e-5, source: 'exact at the end of the rise (check C9)' },
    ],
  },
};
