import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;
const SEN = 'Sen 1968 (data from memory), also the test of a well-known library (check B11)';

export const trendPage: MethodPage = {
  title: 'Trend over time',
  group: 'Numbers',
  sentence: 'Whether something rises or falls, how fast, and how sure that is.',
  purpose: [
    'Three views of one trend. Least squares uses every point and is pulled by an odd one. The Theil–Sen line is the median of the slopes of all pairs and bears almost a third of odd points. The Mann–Kendall test asks only whether later values tend to be higher.',
  ],
  formulas: [
    {
      says: 'Least squares',
      tex: raw`\begin{aligned} &b = \frac{\sum (x_i - \bar x)(y_i - \bar y)}{\sum (x_i - \bar x)^2}\\[0.5em] &a = \bar y - b\,\bar x \end{aligned}`,
    },
    {
      says: 'Theil–Sen',
      tex: raw`\begin{aligned} &\tilde b = \operatorname{median}_{i<j} \frac{y_j - y_i}{x_j - x_i}\\[0.5em] &\tilde a = \operatorname{median}(y) - \tilde b\,\operatorname{median}(x) \end{aligned}`,
    },
    {
      says: 'Mann–Kendall',
      tex: raw`\begin{aligned} &S = \sum_{i<j} \operatorname{sgn}(y_j - y_i)\\[0.5em] &Z = \frac{S - \operatorname{sgn}(S)}{\sqrt{\operatorname{Var}(S)}} \end{aligned}`,
    },
  ],
  sources: [
    {
      of: 'Theil–Sen slope and its limits',
      source: 'Sen 1968, Journal of the American Statistical Association 63:1379–89',
      tag: 'memory',
    },
    { of: 'Mann–Kendall test with ties', source: 'US Environmental Protection Agency, QA/G-9S, page 109', tag: 'read' },
    {
      of: 'Least squares checked on the Norris data',
      source: 'US National Institute of Standards and Technology, Statistical Reference Datasets',
      tag: 'read',
    },
    { of: 'Exact probabilities up to ten points', source: 'Counted over all orders', tag: 'recomputed' },
  ],
  limits: [
    'Four points can never reach a two-sided probability under .05.',
    'A trend over a term says nothing of its cause: growth alone makes carry and force rise.',
    'Points close together in time are not independent; the intervals are then too narrow.',
    'At most 2 000 points, since every pair is looked at.',
  ],
  fields: [
    { path: 'x', label: 'x, for example days', kind: 'numbers' },
    { path: 'y', label: 'y, as many values', kind: 'numbers' },
    {
      path: 'alternative',
      label: 'Question of the test',
      kind: 'choice',
      optional: true,
      options: [
        { value: 'two-sided', label: 'Does it change?' },
        { value: 'greater', label: 'Does it rise?' },
        { value: 'less', label: 'Does it fall?' },
      ],
    },
  ],
  outputs: {
    n: 'Points',
    'ols.slope': 'Least squares, slope',
    'ols.intercept': 'Least squares, intercept',
    'ols.slopeSe': 'Standard error of the slope',
    'ols.slopeCi90': 'Slope, 90 % interval',
    'ols.r2': 'r²',
    'ols.residualSd': 'Standard deviation of the residuals',
    'theilSen.slope': 'Theil–Sen, slope',
    'theilSen.intercept': 'Theil–Sen, intercept',
    'theilSen.slopeCi90': 'Theil–Sen slope, 90 % interval',
    'mannKendall.s': 'Mann–Kendall S',
    'mannKendall.variance': 'Variance of S',
    'mannKendall.z': 'Z',
    'mannKendall.p': 'Probability',
    'mannKendall.exact': 'Exact probability',
  },
  example: {
    says: 'The seven points of Sen’s paper.',
    request: { x: [1, 2, 3, 4, 10, 12, 18], y: [9, 15, 19, 20, 45, 55, 78] },
    published: [
      { path: 'theilSen.slope', value: 4, tolerance: 1e-12, source: SEN },
      { path: 'theilSen.intercept', value: 4, tolerance: 1e-12, source: SEN },
      { path: 'theilSen.slopeCi90.0', value: 3.75, tolerance: 1e-9, source: 'recomputed at 90 % (check B11)' },
      { path: 'theilSen.slopeCi90.1', value: 4.181818, tolerance: 1e-6, source: 'recomputed at 90 % (check B11)' },
      { path: 'ols.slope', value: 4.021352, tolerance: 1e-6, source: 'recomputed (check B11)' },
      { path: 'ols.intercept', value: 5.704626, tolerance: 1e-6, source: 'recomputed (check B11)' },
    ],
  },
};
