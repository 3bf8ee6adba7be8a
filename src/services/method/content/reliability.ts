import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;
const SHROUT = 'Shrout and Fleiss 1979, recomputed to more digits (check B1)';

export const reliabilityPage: MethodPage = {
  title: 'Reliability of a test',
  group: 'Numbers',
  sentence: 'How far a test repeats itself, and how large a change must be to be real.',
  purpose: [
    'Several people do the same test two or more times with nothing changed in between. From the table of their results come the intraclass correlations with limits, the standard error of measurement, the change that is detectable in one person, the typical error and the smallest change worth having.',
    'The typical error is the number to keep: it says in the test’s own unit how far apart two results of one person fall by chance.',
  ],
  formulas: [
    {
      says: 'One trial, people and trials both drawn at random',
      tex: raw`\begin{aligned} &\mathrm{ICC}(2,1) = \frac{\mathrm{BMS} - \mathrm{EMS}}{E}\\ &E = \mathrm{BMS} + (k-1)\,\mathrm{EMS}\\ &\quad + k(\mathrm{JMS} - \mathrm{EMS})/n \end{aligned}`,
    },
    {
      says: 'One trial, the same fixed trials for all',
      tex: raw`\mathrm{ICC}(3,1) = \frac{\mathrm{BMS} - \mathrm{EMS}}{\mathrm{BMS} + (k-1)\,\mathrm{EMS}}`,
    },
    {
      says: 'Standard error of measurement, and the typical error for two trials',
      tex: raw`\mathrm{SEM} = \sqrt{\mathrm{EMS}}, \qquad \mathrm{TE} = \frac{\mathrm{SD}(x_2 - x_1)}{\sqrt 2}`,
    },
    {
      says: 'Minimal detectable change',
      tex: raw`\begin{aligned} &\mathrm{MDC}_{95} = 1.96\,\sqrt 2\,\mathrm{SEM}\\[0.5em] &\mathrm{MDC}_{90} = 1.6449\,\sqrt 2\,\mathrm{SEM} \end{aligned}`,
    },
    {
      says: 'Coefficient of variation by logarithms, s the typical error of the natural logarithms',
      tex: raw`\mathrm{CV} = 100\,(e^{s} - 1)`,
    },
    { says: 'Smallest worthwhile change', tex: raw`\mathrm{SWC} = 0.2\,\mathrm{SD}_{\text{first trial}}` },
  ],
  sources: [
    {
      of: 'Intraclass correlations, their limits, and the table of the example',
      source: 'Shrout and Fleiss 1979, Psychological Bulletin 86:420–8',
      tag: 'read',
    },
    {
      of: 'Standard error of measurement and detectable change',
      source: 'Weir 2005, Journal of Strength and Conditioning Research 19:231–40',
      tag: 'read',
    },
    {
      of: 'Typical error, its limits, log CV, smallest worthwhile change',
      source: 'Hopkins 2000, Sports Medicine 30(1):1–15, and 2004',
      tag: 'memory',
    },
    {
      of: 'Adolescents’ figures to compare with: peak measures within 11 %, early force not acceptable',
      source: 'Thomas and others 2017, Sports 5:15 (17 athletes of 16 and 17)',
      tag: 'read',
    },
  ],
  limits: [
    'A correlation is high in a mixed group and low in an alike one, with the same test: never judge a test by it alone.',
    'Fewer than ten people give limits so wide that the figures say little; the product takes a study of its own from ten.',
    'All trials of one day miss what changes between days.',
    'Published adult figures do not carry over to children: early force (rates) repeats badly under 16.',
  ],
  fields: [
    {
      path: 'table',
      label: 'Results, one person a line, one number a trial',
      kind: 'table',
      hint: 'As many trials for everybody',
    },
  ],
  outputs: {
    n: 'People',
    k: 'Trials',
    bms: 'Mean square between people (BMS)',
    wms: 'Mean square within people (WMS)',
    jms: 'Mean square between trials (JMS)',
    ems: 'Mean square of the error (EMS)',
    icc11: 'ICC(1,1)',
    icc21: 'ICC(2,1)',
    icc31: 'ICC(3,1)',
    icc1k: 'ICC(1,k)',
    icc2k: 'ICC(2,k)',
    icc3k: 'ICC(3,k)',
    'ci95.icc11': 'ICC(1,1), 95 % limits',
    'ci95.icc21': 'ICC(2,1), 95 % limits',
    'ci95.icc31': 'ICC(3,1), 95 % limits',
    'ci95.icc1k': 'ICC(1,k), 95 % limits',
    'ci95.icc2k': 'ICC(2,k), 95 % limits',
    'ci95.icc3k': 'ICC(3,k), 95 % limits',
    sem: 'Standard error of measurement',
    mdc95: 'Minimal detectable change, 95 %',
    mdc90: 'Minimal detectable change, 90 %',
    typicalError: 'Typical error',
    typicalErrorCi90: 'Typical error, 90 % limits',
    logCvPct: 'Coefficient of variation by logarithms, %',
    swc: 'Smallest worthwhile change',
  },
  example: {
    says: 'The classic table: six people, four judges.',
    request: {
      table: [
        [9, 2, 5, 8],
        [6, 1, 3, 2],
        [8, 4, 6, 8],
        [7, 1, 2, 6],
        [10, 5, 6, 9],
        [6, 2, 4, 7],
      ],
    },
    published: [
      { path: 'icc11', value: 0.165742, tolerance: 1e-5, source: SHROUT },
      { path: 'icc21', value: 0.289764, tolerance: 1e-5, source: SHROUT },
      { path: 'icc31', value: 0.714841, tolerance: 1e-5, source: SHROUT },
      { path: 'icc3k', value: 0.909316, tolerance: 1e-5, source: SHROUT },
      { path: 'ci95.icc31.0', value: 0.342465, tolerance: 1e-5, source: SHROUT },
      { path: 'sem', value: 1.009675, tolerance: 1e-5, source: SHROUT },
      { path: 'mdc95', value: 2.798677, tolerance: 1e-5, source: SHROUT },
    ],
  },
};
