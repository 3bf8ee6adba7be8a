import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;
const E1 = 'recomputed from the printed formulas (check E1)';

export const maturityPage: MethodPage = {
  title: 'Maturity estimate',
  group: 'Growth',
  sentence: 'Roughly how far a child is from the fastest growth, as a band with a year’s doubt.',
  purpose: [
    'From sex, age, height, sitting height and mass, published formulas estimate the years to the time of fastest growth (peak height velocity). The product shows a band (before, around, after) and not the decimal, and uses it for cautions only.',
  ],
  formulas: [
    {
      says: 'Mirwald, boys (age A in years; height H, sitting height B and leg length L = H − B in cm; mass W in kg). The last term is a percentage',
      tex: raw`\begin{aligned} &-9.236 + 0.0002708\,LB\\ &- 0.001663\,AL + 0.007216\,AB\\ &+ 0.02292\cdot\frac{100\,W}{H} \end{aligned}`,
    },
    {
      says: 'Mirwald, girls',
      tex: raw`\begin{aligned} &-9.376 + 0.0001882\,LB + 0.0022\,AL\\ &+ 0.005841\,AB - 0.002658\,AW\\ &+ 0.07693\cdot\frac{100\,W}{H} \end{aligned}`,
    },
    {
      says: 'Moore, boys from sitting height; boys from height; girls from height',
      tex: raw`\begin{aligned} &-8.128741 + 0.0070346\,AB\\ &-7.999994 + 0.0036124\,AH\\ &-7.709133 + 0.0042232\,AH \end{aligned}`,
    },
    {
      says: 'Fransen, boys only: a ratio r of the age to the age at the peak',
      tex: raw`\begin{aligned} r ={}& 6.986547255416\\ &+ 0.115802846632\,A\\ &+ 0.001450825199\,A^2\\ &+ 0.004518400406\,W\\ &- 0.000034086447\,W^2\\ &- 0.151951447289\,H\\ &+ 0.000932836659\,H^2\\ &- 0.000001656585\,H^3\\ &+ 0.032198263733\,L\\ &- 0.000269025264\,L^2\\ &- 0.000760897942\,HA \end{aligned}`,
    },
  ],
  sources: [
    {
      of: 'Mirwald’s formulas',
      source: 'Mirwald and others 2002, Medicine and Science in Sports and Exercise 34:689–94',
      tag: 'read',
    },
    {
      of: 'Moore’s formulas',
      source: 'Moore and others 2015, Medicine and Science in Sports and Exercise 47:1755–64',
      tag: 'read',
    },
    { of: 'Fransen’s ratio', source: 'Fransen and others 2018, Pediatric Exercise Science 30:296–307', tag: 'read' },
    { of: 'Early and late maturers are pulled to the mean', source: 'Kozieł and Malina 2018', tag: 'read' },
    { of: 'The band of ± 1 year', source: 'Marram', tag: 'proposal' },
  ],
  limits: [
    'An early maturer is placed too late and a late maturer too early; one year of doubt is the least to assume.',
    'Best within a year of the peak: boys of about 12 to 16, girls of about 9 to 13.',
    'Printed copies hold errors: a wrong sign in Fransen’s intercept, a changed digit in Moore’s, a missing × 100 in Mirwald’s last term. Ours were checked against the papers.',
    'Not a medical assessment of growth. A child who does not grow as expected belongs to a doctor.',
  ],
  fields: [
    {
      path: 'sex',
      label: 'Sex',
      kind: 'choice',
      options: [
        { value: 'male', label: 'Male' },
        { value: 'female', label: 'Female' },
      ],
    },
    { path: 'age', label: 'Age', kind: 'number', unit: 'years', hint: 'With decimals' },
    { path: 'stature', label: 'Height', kind: 'number', unit: 'cm' },
    { path: 'sittingHeight', label: 'Sitting height', kind: 'number', unit: 'cm', optional: true },
    { path: 'mass', label: 'Mass', kind: 'number', unit: 'kg', optional: true },
  ],
  outputs: {
    'mirwald.offset': 'Mirwald, years from the peak',
    'mirwald.ageAtPhv': 'Mirwald, age at the peak, years',
    'moore.offset': 'Moore, years from the peak',
    'moore.ageAtPhv': 'Moore, age at the peak, years',
    'mooreStature.offset': 'Moore from height, years from the peak',
    'mooreStature.ageAtPhv': 'Moore from height, age at the peak, years',
    'fransen.ratio': 'Fransen, ratio',
    'fransen.ageAtPhv': 'Fransen, age at the peak, years',
    mirwald: 'Mirwald',
    moore: 'Moore',
    mooreStature: 'Moore from height',
    fransen: 'Fransen',
    band: 'Band',
    cautions: 'Cautions',
  },
  example: {
    says: 'A boy of 12.0 years, 150 cm, sitting 78 cm, 40 kg.',
    request: { sex: 'male', age: 12, stature: 150, sittingHeight: 78, mass: 40 },
    published: [
      { path: 'mirwald.offset', value: -1.786643, tolerance: 1e-5, source: E1 },
      { path: 'moore.offset', value: -1.544355, tolerance: 1e-5, source: E1 },
      { path: 'mooreStature.offset', value: -1.497674, tolerance: 1e-5, source: E1 },
      { path: 'fransen.ratio', value: 0.870463, tolerance: 1e-5, source: E1 },
    ],
  },
};
