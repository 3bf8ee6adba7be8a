import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;

export const carryStandardPage: MethodPage = {
  title: 'Carry at standard conditions',
  group: 'Driver',
  sentence: 'What the carries of a session would have been at 20 °C, sea level and no wind.',
  purpose: [
    'Each measured carry is multiplied by the ratio of two modelled ones: at standard air (20 °C, 101 325 Pa, 50 % humidity, no wind) and at the day’s air. The error of the model largely cancels in the ratio. The product follows this carry over the terms, so that a warm season is not taken for progress.',
  ],
  formulas: [
    {
      says: 'Standard carry of a shot',
      tex: raw`C_{\text{std}} = C_{\text{measured}} \cdot \frac{C_{\text{model}}(\text{standard air})}{C_{\text{model}}(\text{that day’s air})}`,
    },
  ],
  sources: [
    { of: 'The ratio', source: 'Marram', tag: 'proposal' },
    { of: 'The flight model', source: 'Smits and Smith 1994 with the spin decay of Penner 2001', tag: 'read' },
    { of: 'Air density', source: 'CIPM-2007', tag: 'memory' },
    {
      of: 'About 0.14 m a degree at 58 m/s, 12° and 2 800 rpm, from the air alone',
      source: 'Worked out with this model',
      tag: 'recomputed',
    },
  ],
  limits: [
    'Only the air is taken out: cold balls, cold hands, a wet face and another ball are not.',
    'Below about 45 m/s at a low launch the model’s sign turns: it takes dense air and a wind against for a help. The adjustment of slow swings is the least certain.',
    'Above 3 m/s of wind the ratio is rough: the product leaves such sessions out of trends.',
    'A shot without launch or spin cannot be adjusted and stays without a standard carry.',
    'At most 1 000 shots a request.',
  ],
  fields: [
    {
      path: 'shots',
      label: 'Shots, one a line',
      kind: 'rows',
      hint: 'Ball speed, launch, spin, carry. A dash where launch or spin is not known',
      columns: [
        { name: 'ballSpeed', label: 'Ball speed', unit: 'm/s', kind: 'number' },
        { name: 'launchDeg', label: 'Launch', unit: '°', kind: 'number', optional: true },
        { name: 'spinRpm', label: 'Spin', unit: 'rpm', kind: 'number', optional: true },
        { name: 'carry', label: 'Carry', unit: 'm', kind: 'number' },
      ],
    },
    { path: 'conditions.temperatureC', label: 'Temperature', kind: 'number', unit: '°C', section: 'The day’s air' },
    {
      path: 'conditions.humidityPct',
      label: 'Relative humidity',
      kind: 'number',
      unit: '%',
      optional: true,
      section: 'The day’s air',
      hint: '50 if empty',
    },
    {
      path: 'conditions.pressurePa',
      label: 'Pressure at the place',
      kind: 'number',
      unit: 'Pa',
      optional: true,
      section: 'The day’s air',
    },
    {
      path: 'conditions.altitudeM',
      label: 'Or the altitude',
      kind: 'number',
      unit: 'm',
      optional: true,
      section: 'The day’s air',
    },
    {
      path: 'conditions.wind',
      label: 'Wind along the shot',
      kind: 'number',
      unit: 'm/s',
      optional: true,
      section: 'The day’s air',
      hint: 'Above 0 following',
    },
  ],
  outputs: {
    shots: 'Shot by shot',
    'shots.*.carryStandard': 'standard carry, m',
    'shots.*.adjustment': 'factor',
    'shots.*.reason': 'why not',
    median: 'Median of the measured carries, m',
    medianStandard: 'Median of the standard carries, m',
  },
  example: {
    says: 'Two drives in standard air stay as they are; the third has no spin reading.',
    request: {
      shots: [
        { ballSpeed: 58, launchDeg: 12, spinRpm: 2800, carry: 180 },
        { ballSpeed: 57, launchDeg: 13, spinRpm: 2900, carry: 176 },
        { ballSpeed: 57.5, launchDeg: 12.5, spinRpm: null, carry: 178 },
      ],
      conditions: { temperatureC: 20, humidityPct: 50, pressurePa: 101325 },
    },
    published: [
      { path: 'shots.0.adjustment', value: 1, tolerance: 1e-12, source: 'by definition' },
      { path: 'shots.1.carryStandard', value: 176, tolerance: 1e-12, source: 'by definition' },
      { path: 'shots.2.carryStandard', value: null, tolerance: 0, source: 'by definition' },
      { path: 'medianStandard', value: 178, tolerance: 1e-12, source: 'by hand: (180 + 176)/2' },
    ],
  },
};
