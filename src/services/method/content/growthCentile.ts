import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;

export const growthCentilePage: MethodPage = {
  title: 'Growth centile',
  group: 'Growth',
  sentence: 'Where a child’s height, weight or body-mass index stands in a published reference.',
  purpose: [
    'A reference gives for each age a median M, a spread S and a skewness L. With them a measure becomes z, the number of standard deviations from the median, and a centile. The product uses the charts of the US Centers for Disease Control and Prevention of 2000, to see a child leave its own channel, never to rank children.',
  ],
  formulas: [
    {
      says: 'Standard deviations from the median',
      tex: raw`\begin{aligned} &z = \frac{(X/M)^L - 1}{L\,S}\\[0.5em] &z = \frac{\ln(X/M)}{S}\ \text{ where } L = 0 \end{aligned}`,
    },
    { says: 'Centile', tex: raw`100\,\Phi(z)` },
    { says: 'The way back', tex: raw`X = M\,(1 + L\,S\,z)^{1/L}` },
  ],
  sources: [
    {
      of: 'L, M and S by age',
      source: 'US Centers for Disease Control and Prevention, growth charts of 2000 (public domain)',
      tag: 'read',
    },
    { of: 'The LMS method', source: 'Cole and Green 1992, Statistics in Medicine 11:1305–19', tag: 'memory' },
    { of: 'z of the example', source: 'Worked out from the printed rows', tag: 'recomputed' },
  ],
  limits: [
    'The reference is of children in the United States before 2000; other countries have their own. Give L, M and S to use another.',
    'Ages from 72.5 to 240 months; between the tabled ages the three are interpolated in a straight line.',
    'Very high weights and body-mass indices need an extended method, which this is not.',
    'Body-mass index says little of a muscular athlete, and no number here is a diagnosis.',
  ],
  fields: [
    { path: 'value', label: 'Value', kind: 'number', hint: 'cm, kg or kg/m²' },
    {
      path: 'measure',
      label: 'What was measured',
      kind: 'choice',
      optional: true,
      section: 'By the CDC charts',
      options: [
        { value: 'stature', label: 'Height, cm' },
        { value: 'weight', label: 'Weight, kg' },
        { value: 'bmi', label: 'Body-mass index, kg/m²' },
      ],
    },
    {
      path: 'sex',
      label: 'Sex',
      kind: 'choice',
      optional: true,
      section: 'By the CDC charts',
      options: [
        { value: 'male', label: 'Male' },
        { value: 'female', label: 'Female' },
      ],
    },
    { path: 'ageMonths', label: 'Age', kind: 'number', unit: 'months', optional: true, section: 'By the CDC charts' },
    { path: 'lms.l', label: 'L', kind: 'number', optional: true, section: 'Or by another reference' },
    { path: 'lms.m', label: 'M', kind: 'number', optional: true, section: 'Or by another reference' },
    { path: 'lms.s', label: 'S', kind: 'number', optional: true, section: 'Or by another reference' },
  ],
  outputs: { l: 'L', m: 'M', s: 'S', z: 'Standard deviations from the median, z', centile: 'Centile' },
  example: {
    says: 'A boy of 120.5 months, 145 cm.',
    request: { measure: 'stature', sex: 'male', ageMonths: 120.5, value: 145 },
    published: [
      { path: 'm', value: 138.8234114, tolerance: 1e-9, source: 'CDC 2000 table, read' },
      { path: 'z', value: 0.9245, tolerance: 1e-4, source: 'recomputed (check E10)' },
      { path: 'centile', value: 82.24, tolerance: 1e-4, source: 'recomputed (check E10)' },
    ],
  },
};
