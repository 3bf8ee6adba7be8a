import { isaAir, STANDARD_PRESSURE_PA } from '#src/domain/driver/isaAir.ts';
import { moistAirDensity } from '#src/domain/driver/moistAirDensity.ts';

/** Humidity taken where none was measured, per cent. */
export const STANDARD_HUMIDITY_PCT = 50;

/**
 * Air as a session records it: temperature in °C with either the pressure in Pa (not reduced to sea level) or the
 * altitude in m. Without either, sea-level standard pressure; without humidity, 50 %.
 */
export interface AirDensityInput {
  temperatureC: number;
  humidityPct?: number;
  pressurePa?: number;
  altitudeM?: number;
}

/** Density in kg/m³; `isaDensity` is that of the standard atmosphere, given with an altitude only. */
export interface AirDensityResult {
  density: number;
  isaDensity?: number;
  formula: 'CIPM-2007';
  reason: string | null;
}

/**
 * Density of the air by CIPM-2007, from a measured pressure or from the standard atmosphere's pressure at an altitude
 * with the given temperature.
 *
 * Sources: Picard 2008 (CIPM-2007), ISO 2533 (standard atmosphere).
 *
 * @throws {RangeError} if a number is out of its range, or both pressure and altitude are given
 * @example airDensity({ temperatureC: 20 }).density // → 1.199314
 */
export function airDensity({
  temperatureC,
  humidityPct = STANDARD_HUMIDITY_PCT,
  pressurePa,
  altitudeM,
}: AirDensityInput): AirDensityResult {
  if (altitudeM === undefined) {
    const density = moistAirDensity({ temperatureC, humidityPct, pressurePa: pressurePa ?? STANDARD_PRESSURE_PA });
    return { density, formula: 'CIPM-2007', reason: null };
  }
  if (pressurePa !== undefined) throw new RangeError('airDensity requires a pressure or an altitude, got both');
  const isa = isaAir(altitudeM);
  const density = moistAirDensity({ temperatureC, humidityPct, pressurePa: isa.pressurePa });
  return { density, isaDensity: isa.density, formula: 'CIPM-2007', reason: null };
}
