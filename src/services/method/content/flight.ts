import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;
const MPH = 0.44704;

export const flightPage: MethodPage = {
  title: 'Ball flight',
  group: 'Driver',
  sentence: 'Carry, height and descent of a ball from speed, launch, spin and air, by a published model.',
  purpose: [
    'A model of drag and lift on a spinning ball, in the vertical plane, with wind along the shot. It serves to compare: the same shot in other air, or the same ball speed from another club. It does not predict how far a junior hits.',
  ],
  formulas: [
    {
      says: 'Acceleration, u the velocity through the air, V its size',
      tex: raw`\begin{aligned} a_x &= -kV(C_D u_x + C_L u_y)\\ a_y &= -kV(C_D u_y - C_L u_x) - g\\ k &= \frac{\rho A}{2m} \end{aligned}`,
    },
    {
      says: 'Drag and lift by the spin ratio S = ωr/V and the Reynolds number',
      tex: raw`\begin{aligned} C_D ={}& 0.24 + 0.18\,S\\ &+ 0.06 \sin\!\left(\pi\,\frac{\mathrm{Re} - 9\cdot 10^4}{2\cdot 10^5}\right)\\[0.5em] C_L ={}& 0.54\,S^{0.4} \end{aligned}`,
    },
    { says: 'Decay of the spin', tex: raw`\frac{d\omega}{dt} = -2\cdot 10^{-5}\,\frac{\omega V}{r}` },
  ],
  sources: [
    { of: 'Drag and lift', source: 'Smits and Smith 1994, as printed by others', tag: 'read' },
    { of: 'Decay of the spin', source: 'Penner 2001, American Journal of Physics 69:563, equation 16', tag: 'read' },
    {
      of: 'Models and real balls differ by ± 10 %; thirteen balls spread over 18 m',
      source: 'Lyu and others 2018, Proceedings 2:238',
      tag: 'read',
    },
    { of: 'Carry of the example', source: 'Regression value of this model, no measured truth', tag: 'recomputed' },
  ],
  limits: [
    'Fitted to drivers at full speed (Reynolds number 7·10⁴ to 2.1·10⁵, spin ratio .08 to .2). A junior’s launch is often outside, and the formula is then continued.',
    'No side spin, no roll, level ground, steady wind.',
    'At full speed a wind against costs more than the same wind behind gives.',
    'For slow balls launched low the model turns round: below about 45 m/s it lets a wind against, or colder air, carry the ball further, since lift then outweighs drag. Whether real balls do so has not been measured here.',
    'Cold balls and clothes cost more than the cold air alone.',
  ],
  fields: [
    { path: 'ballSpeed', label: 'Ball speed', kind: 'number', unit: 'm/s', hint: '1 mph is 0.44704 m/s' },
    { path: 'launchDeg', label: 'Launch angle', kind: 'number', unit: '°' },
    { path: 'spinRpm', label: 'Back spin', kind: 'number', unit: 'rpm' },
    { path: 'density', label: 'Air density', kind: 'number', unit: 'kg/m³', optional: true, hint: '1.194 if empty' },
    {
      path: 'wind',
      label: 'Wind along the shot',
      kind: 'number',
      unit: 'm/s',
      optional: true,
      hint: 'Above 0 following',
    },
    {
      path: 'model',
      label: 'Drag and lift',
      kind: 'choice',
      optional: true,
      section: 'Other drag and lift',
      options: [
        { value: 'smits-smith', label: 'By spin and speed' },
        { value: 'constant', label: 'Constant, as given' },
      ],
    },
    { path: 'cd', label: 'Drag coefficient', kind: 'number', optional: true, section: 'Other drag and lift' },
    { path: 'cl', label: 'Lift coefficient', kind: 'number', optional: true, section: 'Other drag and lift' },
  ],
  outputs: {
    carry: 'Carry, m',
    time: 'Time, s',
    apex: 'Highest point, m',
    landingDeg: 'Angle of descent, °',
    landingSpeed: 'Speed at landing, m/s',
    path: '',
  },
  example: {
    says: 'A robot’s drive: 176 mph, 10°, 2 520 rpm, in air of 1.194 kg/m³. 240.35 m are 262.85 yd.',
    request: { ballSpeed: 176 * MPH, launchDeg: 10, spinRpm: 2520, density: 1.194 },
    published: [
      { path: 'carry', value: 262.85 * 0.9144, tolerance: 4e-4, source: 'recomputed, no measured truth (check G9)' },
      { path: 'time', value: 7.064, tolerance: 4e-4, source: 'recomputed, no measured truth (check G9)' },
    ],
  },
};
