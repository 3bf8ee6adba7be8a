import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Air of the International Standard Atmosphere at one altitude: K, Pa, kg/m³. */
export interface IsaAir {
  temperatureK: number;
  pressurePa: number;
  density: number;
}

/** Pressure at sea level in the standard atmosphere, Pa. */
export const STANDARD_PRESSURE_PA = 101_325;

/**
 * Temperature, pressure and density of the International Standard Atmosphere in its lowest layer.
 *
 * Source: ISO 2533:1975 (SCIENCE §7): 288.15 K at sea level, −6.5 K a kilometre, gas constant 287.05287 J/(kg·K).
 *
 * @param altitudeM geopotential altitude in m, −1000 to 11 000
 * @throws {RangeError} if the altitude is not finite or outside that layer
 * @example isaAir(1000).density // → 1.111643
 */
export function isaAir(altitudeM: number): IsaAir {
  requireFiniteNumber('isaAir', 'altitudeM', altitudeM, { min: -1000, max: 11_000 });
  const temperatureK = 288.15 - 0.0065 * altitudeM;
  const pressurePa = STANDARD_PRESSURE_PA * (temperatureK / 288.15) ** 5.255876;
  return { temperatureK, pressurePa, density: pressurePa / (287.05287 * temperatureK) };
}
