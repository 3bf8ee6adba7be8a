import type { MethodPage } from '#src/services/method/methodPage.ts';

const raw = String.raw;

export const airDensityPage: MethodPage = {
  title: 'Air density',
  group: 'Driver',
  sentence: 'How dense the air was, from temperature, humidity and pressure or altitude.',
  purpose: [
    'Dense air holds a ball back. A carry of a cold morning at the coast and one of a warm afternoon in the hills are compared only after this is taken out.',
  ],
  formulas: [
    {
      says: 'Density of moist air',
      tex: raw`\rho = \frac{p\,M_a}{Z\,R\,T}\left[1 - x_v\left(1 - \frac{M_v}{M_a}\right)\right]`,
    },
    {
      says: 'Pressure of the standard atmosphere at an altitude h, where no pressure was measured',
      tex: raw`p = 101\,325\left(\frac{288.15 - 0.0065\,h}{288.15}\right)^{5.255876}`,
    },
  ],
  sources: [
    {
      of: 'Equation of moist air, with 400 ppm of carbon dioxide',
      source:
        'CIPM-2007: Picard and others 2008, Metrologia 45:149–155 (constants from memory, reproduced by check values)',
      tag: 'memory',
    },
    { of: 'Standard atmosphere', source: 'ISO 2533:1975', tag: 'recomputed' },
    {
      of: '1.204 kg/m³ for dry air at 20 °C, to compare',
      source: 'Penner 2001, American Journal of Physics 69:563',
      tag: 'read',
    },
  ],
  limits: [
    'The pressure is the one at the place. A weather report gives it reduced to sea level: then give the altitude.',
    'Made for 15 to 27 °C and 600 to 1100 hPa; outside, an extrapolation that is still good to a few parts in a thousand.',
    'By altitude the day’s weather is not known: the pressure may be off by 2 to 3 %.',
  ],
  fields: [
    { path: 'temperatureC', label: 'Temperature', kind: 'number', unit: '°C' },
    { path: 'humidityPct', label: 'Relative humidity', kind: 'number', unit: '%', optional: true, hint: '50 if empty' },
    {
      path: 'pressurePa',
      label: 'Pressure at the place',
      kind: 'number',
      unit: 'Pa',
      optional: true,
      hint: '1013 hPa is 101300 Pa',
    },
    { path: 'altitudeM', label: 'Or the altitude', kind: 'number', unit: 'm', optional: true },
  ],
  outputs: { density: 'Density, kg/m³', isaDensity: 'Density of the standard atmosphere, kg/m³', formula: 'Formula' },
  example: {
    says: 'A laboratory’s day: 20 °C, 50 %, 101 325 Pa.',
    request: { temperatureC: 20, humidityPct: 50, pressurePa: 101325 },
    published: [{ path: 'density', value: 1.199314, tolerance: 1e-5, source: 'recomputed (check G11)' }],
  },
};
