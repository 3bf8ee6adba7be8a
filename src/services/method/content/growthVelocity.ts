import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;

export const growthVelocityPage: MethodPage = {
  title: 'Growth velocity',
  group: 'Growth',
  sentence: 'How fast a child grows in a year, with the tape’s own error.',
  purpose: [
    'From the first height to the last, in centimetres a year. A spurt asks for care with jumps and drivers; but two heights a few weeks apart cannot show one, since each errs by a few millimetres.',
  ],
  formulas: [
    { says: 'Velocity over the days between', tex: raw`V = \frac{h_2 - h_1}{\text{days}/365.25}` },
    {
      says: 'Its standard error, e the error of one measurement',
      tex: raw`\mathrm{SE} = \frac{\sqrt 2\, e}{\text{days}/365.25}`,
    },
    { says: '90 % interval', tex: raw`V \pm 1.644854\,\mathrm{SE}` },
  ],
  sources: [
    { of: 'Standard error by propagation', source: 'Derived here', tag: 'recomputed' },
    { of: 'An error of 0.3 cm a measurement', source: 'Trained staff, fixed measure', tag: 'practice' },
    { of: 'Peaks to compare with: boys 9.5 cm a year at 13.5, girls 8.3 at 11.5', source: 'Abbassi 1998', tag: 'read' },
    {
      of: 'Fast growth goes with bone and growth-plate injury',
      source: 'Wik and others 2020 (74 athletes)',
      tag: 'read',
    },
    {
      of: 'Bands: under 4 slow, 4 to 7 usual, from 7 (girls) or 8 (boys) like a spurt, over at least five months',
      source: 'Marram',
      tag: 'proposal',
    },
  ],
  limits: [
    'Over three months the interval is about ± 2.8 cm a year: wait for about six months before calling a spurt.',
    'Height is least in the evening: measure at one time of the day.',
    'The cautions come from footballers and track athletes; girls and golfers are hardly studied.',
  ],
  fields: [
    {
      path: 'measures',
      label: 'Heights, one a line',
      kind: 'rows',
      hint: 'Date and height: 2026-01-10 150.0',
      columns: [
        { name: 'on', label: 'Date', kind: 'text' },
        { name: 'stature', label: 'Height', unit: 'cm', kind: 'number' },
      ],
    },
    {
      path: 'measurementError',
      label: 'Error of one measurement',
      kind: 'number',
      unit: 'cm',
      optional: true,
      hint: '0.3 if empty',
    },
  ],
  outputs: {
    perYear: 'Growth, cm a year',
    standardError: 'Standard error, cm a year',
    interval90: '90 % interval, cm a year',
    days: 'Days between',
  },
  example: {
    says: '150.0 cm, and 152.4 cm 91 days later.',
    request: {
      measures: [
        { on: '2026-01-01', stature: 150 },
        { on: '2026-04-02', stature: 152.4 },
      ],
    },
    published: [
      { path: 'perYear', value: 9.632967, tolerance: 1e-6, source: 'recomputed (check E8)' },
      { path: 'standardError', value: 1.7029, tolerance: 1e-4, source: 'recomputed (check E8)' },
      { path: 'days', value: 91, tolerance: 0, source: 'by the calendar' },
    ],
  },
};
