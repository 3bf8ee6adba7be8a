import { airDensity } from '#src/domain/driver/airDensity.ts';
import { carryStandard, type CarryConditions } from '#src/domain/driver/carryStandard.ts';
import { shotExclusion, type ShotExclusion } from '#src/domain/driver/shotExclusion.ts';

/** One athlete's drive of one session as measured: m/s, degrees, rpm, m. */
export interface MeasuredDrive {
  ballSpeedMps: number | null;
  clubSpeedMps: number | null;
  launchDeg: number | null;
  spinRpm: number | null;
  carryM: number;
}

/** The air of a session; null where not noted. */
export interface SessionAir {
  temperatureC: number | null;
  humidityPct: number | null;
  pressurePa: number | null;
  altitudeM: number | null;
  windMps: number | null;
}

const UNKNOWN_TEMPERATURE_C = 20;
/** Launch and spin beyond these have no meaning in the flight model; a rule without them does not judge. */
const MOST_BALL_SPEED_MPS = 150;

/**
 * Which of one athlete's drives of a session are proposed for exclusion, in the session's air; 20 °C where the
 * temperature was not noted.
 *
 * @returns null for each that stays, in the order given
 */
export function excludedDrives(drives: readonly MeasuredDrive[], air: SessionAir): (ShotExclusion | null)[] {
  if (drives.length === 0) return [];
  const conditions = conditionsOf({ ...air, temperatureC: air.temperatureC ?? UNKNOWN_TEMPERATURE_C })!;
  const { wind, ...density } = conditions;
  return shotExclusion({
    shots: drives.map((drive) => {
      const measured = drive.ballSpeedMps !== null && drive.ballSpeedMps <= MOST_BALL_SPEED_MPS;
      return {
        // Without a ball speed neither the ratio nor the model judges; the median still does.
        ballSpeed: drive.ballSpeedMps ?? 0,
        clubSpeed: drive.ballSpeedMps === null ? null : drive.clubSpeedMps,
        launchDeg: measured ? drive.launchDeg : null,
        spinRpm: measured ? drive.spinRpm : null,
        carry: drive.carryM,
      };
    }),
    density: airDensity(density).density,
    wind: wind ?? 0,
  }).shots;
}

/**
 * Carries at standard conditions, m; null without a temperature, a ball speed, a launch or a spin.
 *
 * @returns one value a drive, in the order given
 */
export function standardCarries(drives: readonly MeasuredDrive[], air: SessionAir): (number | null)[] {
  const conditions = conditionsOf(air);
  if (conditions === null) return drives.map(() => null);
  return drives.map(({ ballSpeedMps, launchDeg, spinRpm, carryM }) => {
    if (ballSpeedMps === null || ballSpeedMps > MOST_BALL_SPEED_MPS) return null;
    const shots = [{ ballSpeed: ballSpeedMps, launchDeg, spinRpm, carry: carryM }];
    return carryStandard({ shots, conditions }).shots[0]!.carryStandard;
  });
}

/** A measured pressure goes before an altitude: it is the air that was there. */
function conditionsOf(air: SessionAir): CarryConditions | null {
  if (air.temperatureC === null) return null;
  return {
    temperatureC: air.temperatureC,
    ...(air.humidityPct === null ? {} : { humidityPct: air.humidityPct }),
    ...(air.pressurePa !== null ? { pressurePa: air.pressurePa } : {}),
    ...(air.pressurePa === null && air.altitudeM !== null ? { altitudeM: air.altitudeM } : {}),
    wind: air.windMps ?? 0,
  };
}
