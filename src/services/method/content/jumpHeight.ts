import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;

export const jumpHeightPage: MethodPage = {
  title: 'Jump height',
  group: 'Force',
  sentence: 'Height of a jump from the time in the air, or from the speed at take-off.',
  purpose: [
    'A contact mat or a video gives the time in the air; a force plate gives the speed at take-off. Either leads to the height. With the time from the first movement to take-off comes the modified reactive strength index, which tells a quick jump from a slow one of the same height.',
  ],
  formulas: [
    { says: 'From the time in the air', tex: raw`h = \frac{g\,t^2}{8}, \qquad v = \frac{g\,t}{2}` },
    { says: 'From the speed at take-off', tex: raw`h = \frac{v^2}{2g}` },
    { says: 'Modified reactive strength index', tex: raw`\mathrm{RSI_{mod}} = \frac{h}{t_{\text{to take-off}}}` },
  ],
  sources: [
    { of: 'Both heights', source: 'Motion of a thrown body', tag: 'recomputed' },
    {
      of: 'Modified reactive strength index',
      source: 'Defined so wherever it is used',
      tag: 'practice',
    },
    {
      of: 'Time in the air gives 1 to 2 cm more than the impulse',
      source: '1.7 cm in one study of 18 people',
      tag: 'read',
    },
  ],
  limits: [
    'The time in the air is right only where the posture at landing is that of take-off: bent knees add height that was not jumped.',
    'A video at 240 frames a second errs by about 4 mm at a time of 0.35 s.',
    'Heights by the two ways do not mix in one series.',
  ],
  fields: [
    {
      path: 'flightTime',
      label: 'Time in the air',
      kind: 'number',
      unit: 's',
      optional: true,
      hint: 'Give this one or the next',
    },
    { path: 'takeoffVelocity', label: 'Speed at take-off', kind: 'number', unit: 'm/s', optional: true },
    { path: 'timeToTakeoff', label: 'Time from first movement to take-off', kind: 'number', unit: 's', optional: true },
    { path: 'g', label: 'Gravity', kind: 'number', unit: 'm/s²', optional: true, hint: '9.81 if empty' },
  ],
  outputs: {
    height: 'Height, m',
    takeoffVelocity: 'Speed at take-off, m/s',
    flightTime: 'Time in the air, s',
    rsiMod: 'Modified reactive strength index, m/s',
  },
  example: {
    says: 'Half a second in the air.',
    request: { flightTime: 0.5 },
    published: [{ path: 'height', value: 0.3065625, tolerance: 1e-12, source: 'exact (check C1)' }],
  },
};
