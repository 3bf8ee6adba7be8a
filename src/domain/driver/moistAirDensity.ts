import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

const KELVIN_AT_0_C = 273.15;
const GAS_CONSTANT = 8.314472;
const DRY_AIR_KG_PER_MOL = 28.96546e-3;
const WATER_KG_PER_MOL = 18.01528e-3;

/**
 * Density of moist air by the CIPM-2007 equation, with 400 ppm of carbon dioxide: saturation vapour pressure,
 * enhancement factor and compressibility included.
 *
 * Source: Picard, Davis, Gläser & Fujii 2008, Metrologia 45:149–155 (constants from memory, reproduced by the check
 * values). The equation was made for 15 to 27 °C and 600 to 1100 hPa; outside, it is an extrapolation.
 *
 * @param air temperature in °C (−60 to 60), relative humidity in per cent, pressure in Pa
 * @returns kg/m³
 * @throws {RangeError} if a number is not finite or outside its range
 * @example moistAirDensity({ temperatureC: 20, humidityPct: 50, pressurePa: 101325 }) // → 1.199314
 */
export function moistAirDensity({
  temperatureC,
  humidityPct,
  pressurePa,
}: {
  temperatureC: number;
  humidityPct: number;
  pressurePa: number;
}): number {
  requireFiniteNumber('moistAirDensity', 'temperatureC', temperatureC, { min: -60, max: 60 });
  requireFiniteNumber('moistAirDensity', 'humidityPct', humidityPct, { min: 0, max: 100 });
  requireFiniteNumber('moistAirDensity', 'pressurePa', pressurePa, { min: 20_000, max: 120_000 });
  const kelvin = temperatureC + KELVIN_AT_0_C;
  const vapour = vapourMoleFraction(temperatureC, humidityPct, pressurePa);
  return (
    ((pressurePa * DRY_AIR_KG_PER_MOL) / (compressibility(temperatureC, vapour, pressurePa) * GAS_CONSTANT * kelvin)) *
    (1 - vapour * (1 - WATER_KG_PER_MOL / DRY_AIR_KG_PER_MOL))
  );
}

/** Mole fraction of water vapour: humidity × enhancement factor × saturation pressure ÷ pressure. */
function vapourMoleFraction(temperatureC: number, humidityPct: number, pressurePa: number): number {
  const kelvin = temperatureC + KELVIN_AT_0_C;
  const saturationPa = Math.exp(
    1.2378847e-5 * kelvin ** 2 - 1.9121316e-2 * kelvin + 33.93711047 - 6.3431645e3 / kelvin,
  );
  const enhancement = 1.00062 + 3.14e-8 * pressurePa + 5.6e-7 * temperatureC ** 2;
  return ((humidityPct / 100) * enhancement * saturationPa) / pressurePa;
}

function compressibility(temperatureC: number, vapour: number, pressurePa: number): number {
  const perKelvin = pressurePa / (temperatureC + KELVIN_AT_0_C);
  const first =
    1.58123e-6 -
    2.9331e-8 * temperatureC +
    1.1043e-10 * temperatureC ** 2 +
    (5.707e-6 - 2.051e-8 * temperatureC) * vapour +
    (1.9898e-4 - 2.376e-6 * temperatureC) * vapour ** 2;
  const second = 1.83e-11 - 0.765e-8 * vapour ** 2;
  return 1 - perKelvin * first + perKelvin ** 2 * second;
}
