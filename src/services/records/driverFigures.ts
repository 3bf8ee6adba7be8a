import type { DriverSessionRow } from '#src/db/queries/driverSessions.ts';
import { robustCarry } from '#src/domain/driver/robustCarry.ts';
import { median } from '#src/domain/statistics/median.ts';
import { trend, type Trend } from '#src/domain/trend/trend.ts';
import { dayNumber } from '#src/domain/calendar/dayNumber.ts';

export interface DriverPoint {
  sessionId: string;
  heldOn: string;
  place: string;
  /** Median carry of the counted drives in standard conditions, m, with its 90 % interval. */
  carryM: number;
  interval: readonly [number, number] | null;
  /** Median carry as measured that day, m. */
  measuredM: number | null;
  drives: number;
  excluded: number;
  clubSpeedMps: number | null;
  ballSpeedMps: number | null;
  launchDeg: number | null;
  spinRpm: number | null;
  attackDeg: number | null;
  temperatureC: number | null;
  windMps: number | null;
  /** Over 3 m/s along the line: shown, but left out of the trend (SCIENCE §7). */
  windTooStrong: boolean;
}

const STRONGEST_WIND_MPS = 3;
const medianOf = (values: readonly number[]): number | null => (values.length === 0 ? null : median(values));

/** One point a session that has a drive with a standard carry, oldest first. */
export function driverSeries(rows: readonly DriverSessionRow[]): DriverPoint[] {
  return rows.flatMap((row) => {
    if (row.carryStandardM.length === 0) return [];
    const carry = robustCarry(row.carryStandardM);
    if (carry.median === null) return [];
    return [
      {
        sessionId: row.sessionId,
        heldOn: row.heldOn,
        place: row.place,
        carryM: carry.median,
        interval: carry.interval90,
        measuredM: medianOf(row.carryM),
        drives: row.carryM.length,
        excluded: row.excluded,
        clubSpeedMps: medianOf(row.clubSpeedMps),
        ballSpeedMps: medianOf(row.ballSpeedMps),
        launchDeg: medianOf(row.launchDeg),
        spinRpm: medianOf(row.spinRpm),
        attackDeg: medianOf(row.attackDeg),
        temperatureC: row.temperatureC,
        windMps: row.windMps,
        windTooStrong: row.windMps !== null && Math.abs(row.windMps) > STRONGEST_WIND_MPS,
      },
    ];
  });
}

/** Theil–Sen trend of standard carry, metres a year; null with fewer than three sessions in still enough air. */
export function carryTrend(points: readonly DriverPoint[]): Trend | null {
  const still = points.filter(({ windTooStrong }) => !windTooStrong);
  if (still.length < 3) return null;
  const first = dayNumber(still[0]!.heldOn);
  return trend({
    x: still.map(({ heldOn }) => (dayNumber(heldOn) - first) / 365.25),
    y: still.map(({ carryM }) => carryM),
  });
}
