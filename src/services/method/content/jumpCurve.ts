import { exampleJump } from '#src/services/method/content/exampleCurves.ts';
import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;
const C4 = 'exact for two sine lobes; the trapezoid at 1000 samples a second comes within .01 % (check C4)';

export const jumpCurvePage: MethodPage = {
  title: 'Jump from a force curve',
  group: 'Force',
  sentence: 'Height, phases and power of a countermovement jump from the vertical force of one plate.',
  purpose: [
    'The athlete stands still for a second on the plate and then jumps. Standing gives the body weight; what the force is above and below it, added up over time, gives the speed of the body; its zeros part the jump into unweighting, braking and propulsion.',
    'A curve that cannot be read rightly is refused with the reason, never guessed at.',
  ],
  formulas: [
    {
      says: 'Speed of the centre of mass, from 30 ms before the first movement',
      tex: raw`\begin{aligned} &v(t) = \frac{1}{m}\int_{t_0}^{t} \bigl(F(\tau) - W\bigr)\,d\tau\\[0.5em] &m = \frac{W}{g} \end{aligned}`,
    },
    { says: 'Height', tex: raw`h = \frac{v_{\text{take-off}}^2}{2g}` },
    {
      says: 'Height from the time in the air, beside it',
      tex: raw`h_{\text{flight}} = \frac{g\,t_{\text{flight}}^2}{8}`,
    },
    {
      says: 'First movement: the first sample outside the band',
      tex: raw`\lvert F - W\rvert > \max(5\,\mathrm{SD}_{\text{standing}},\ 1\ \mathrm{N})`,
    },
    { says: 'Power', tex: raw`P(t) = F(t)\,v(t)` },
  ],
  sources: [
    {
      of: 'The phases and how to part them',
      source: 'McMahon and others 2018, Strength and Conditioning Journal 40(4):96–106',
      tag: 'read',
    },
    { of: 'First movement at 5 SD, and the step back of 30 ms', source: 'Owen and others 2014', tag: 'memory' },
    { of: 'Take-off under 10 N', source: 'Plates are read so', tag: 'practice' },
    {
      of: '1000 samples a second advised, 200 or fewer biased',
      source: 'Handbooks of force measurement',
      tag: 'memory',
    },
    {
      of: 'Children’s one-leg jumps vary by 2.6 to 6.0 % between trials',
      source: 'McCubbine and others (19 girls of about 10)',
      tag: 'read',
    },
    { of: 'The curve of the example', source: 'In closed form', tag: 'recomputed' },
  ],
  limits: [
    'A body weight wrong by 1 N shifts the speed at take-off by that force times the duration ÷ mass: stand still first.',
    'A step back, a false start or a hand on a rail spoils the curve; it is then refused.',
    'Children’s jumps vary by 3 to 6 % between trials, so one jump says little: take three.',
    'Formulas that guess power from height were made for adults on two legs and are not used.',
  ],
  fields: [
    { path: 'sampleRate', label: 'Samples a second', kind: 'number', unit: 'Hz' },
    { path: 'force', label: 'Vertical force', kind: 'samples', unit: 'N', hint: 'One second of standing still first' },
    { path: 'g', label: 'Gravity', kind: 'number', unit: 'm/s²', optional: true, hint: '9.81 if empty' },
  ],
  outputs: {
    bodyWeight: 'Body weight, N',
    mass: 'Mass, kg',
    weighingSd: 'Standard deviation while standing, N',
    onsetIndex: 'First movement, sample',
    takeoffIndex: 'Take-off, sample',
    landingIndex: 'Landing, sample',
    'unweighting.duration': 'Unweighting, duration, s',
    'unweighting.impulse': 'Unweighting, impulse, N·s',
    'braking.duration': 'Braking, duration, s',
    'braking.impulse': 'Braking, impulse, N·s',
    'propulsion.duration': 'Propulsion, duration, s',
    'propulsion.impulse': 'Propulsion, impulse, N·s',
    minVelocity: 'Lowest velocity, m/s',
    takeoffVelocity: 'Speed at take-off, m/s',
    height: 'Height, m',
    flightTime: 'Time in the air, s',
    heightFromFlight: 'Height from the time in the air, m',
    timeToTakeoff: 'Time to take-off, s',
    rsiMod: 'Modified reactive strength index, m/s',
    peakForce: 'Peak force, N',
    peakPower: 'Peak power, W',
    forceAtZeroVelocity: 'Force at zero velocity, N',
    lowestDisplacement: 'Lowest point, m',
    'quality.ok': 'Curve can be read',
    'quality.problems': 'Remarks',
  },
  example: {
    says: 'A jump of 50 kg made of two sine lobes: 200 N below body weight for 0.3 s, then 600 N above it for 0.4 s.',
    request: exampleJump(),
    published: [
      { path: 'bodyWeight', value: 490.5, tolerance: 1e-9, source: C4 },
      { path: 'minVelocity', value: -0.763944, tolerance: 1e-4, source: C4 },
      { path: 'takeoffVelocity', value: 2.291831, tolerance: 1e-4, source: C4 },
      { path: 'height', value: 0.267711, tolerance: 1e-4, source: C4 },
      { path: 'forceAtZeroVelocity', value: 1010.115242, tolerance: 1e-4, source: C4 },
      { path: 'peakPower', value: 1694.9977, tolerance: 1e-4, source: C4 },
    ],
  },
};
