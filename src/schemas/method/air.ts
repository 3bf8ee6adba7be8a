import { z } from 'zod';
import { between } from '#src/schemas/method/numbers.ts';

/** Air by temperature with a pressure or an altitude; the ranges are those in which the formula says anything. */
export const air = {
  temperatureC: between(-60, 60),
  humidityPct: between(0, 100).optional(),
  pressurePa: between(20_000, 120_000).optional(),
  altitudeM: between(-1000, 11_000).optional(),
};

/** A pressure is the air's own; with it an altitude would say the same thing twice. */
export const onePressure = [
  ({ pressurePa, altitudeM }: { pressurePa?: number | undefined; altitudeM?: number | undefined }) =>
    pressurePa === undefined || altitudeM === undefined,
  { path: ['altitudeM'], message: 'Give the pressure or the altitude, not both' },
] as const;

/** Wind along the shot in m/s, above 0 following. */
export const wind = () => between(-100, 100).optional();

/** A launch as a monitor gives it: m/s, degrees, revolutions a minute. */
export const launch = {
  ballSpeed: between(0, 150),
  launchDeg: between(-90, 90),
  spinRpm: between(0, 20_000),
};

/** Temperature in °C, humidity in per cent, pressure in Pa or altitude in m. */
export const airDensityRequest = z.strictObject(air).refine(onePressure[0], { ...onePressure[1], path: ['altitudeM'] });
