import type { Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { listAthletesOfSquad } from '#src/db/queries/athletes.ts';
import { listDriverSessions, listExcludedShots } from '#src/db/queries/driverSessions.ts';
import { listGroundTraces } from '#src/db/queries/groundTraces.ts';
import { listTestSessions } from '#src/db/queries/testSessions.ts';
import { agreementOfTests, squadMedians } from '#src/services/records/acrossTests.ts';
import { carryTrend, driverSeries } from '#src/services/records/driverFigures.ts';
import { centilesOf, newestMaturity, velocitySeries } from '#src/services/records/growthFigures.ts';
import { groundSessions } from '#src/services/records/groundFigures.ts';
import { loadHeader } from '#src/services/records/loadHeader.ts';
import { comparisons, newestDay } from '#src/services/records/strengthFigures.ts';

/**
 * Strength of one athlete: every comparison of the legs, the newest day, how often the tests agree on the side, and
 * the squad's medians at the same age band for the radar.
 *
 * @throws {AppError} forbidden, not-found
 */
export function requireStrength(viewer: Viewer, athleteId: string) {
  return asViewer(viewer, async (trx) => {
    const { header } = await loadHeader(trx, viewer, athleteId);
    const squad = await listAthletesOfSquad(trx, header.squadId);
    const sessions = await listTestSessions(trx, [...new Set([athleteId, ...squad.map(({ id }) => id)])]);
    const own = sessions.filter((session) => session.athleteId === athleteId);
    const all = comparisons(own, header.leadSide);
    return {
      header,
      sessions: own,
      all,
      newest: newestDay(all),
      agreement: agreementOfTests(all),
      medians: squadMedians(sessions, squad, header),
    };
  });
}

/**
 * Driver sessions of one athlete with the trend of standard carry and the shots left out, each with its reason.
 *
 * @throws {AppError} forbidden, not-found
 */
export function requireDriver(viewer: Viewer, athleteId: string) {
  return asViewer(viewer, async (trx) => {
    const { header } = await loadHeader(trx, viewer, athleteId);
    const points = driverSeries(await listDriverSessions(trx, [athleteId]));
    return { header, points, trend: carryTrend(points), excluded: await listExcludedShots(trx, athleteId) };
  });
}

/**
 * Ground traces of one athlete by day and club, newest first.
 *
 * @throws {AppError} forbidden, not-found
 */
export function requireGround(viewer: Viewer, athleteId: string) {
  return asViewer(viewer, async (trx) => {
    const { header, growth } = await loadHeader(trx, viewer, athleteId);
    return { header, sessions: groundSessions(await listGroundTraces(trx, athleteId), header.leadSide, growth) };
  });
}

/**
 * Growth of one athlete: measures with centiles, velocity, maturity as a band.
 *
 * @throws {AppError} forbidden, not-found
 */
export function requireGrowth(viewer: Viewer, athleteId: string) {
  return asViewer(viewer, async (trx) => {
    const { header, growth } = await loadHeader(trx, viewer, athleteId);
    return {
      header,
      measures: centilesOf(growth, header),
      velocity: velocitySeries(growth),
      maturity: newestMaturity(growth, header),
    };
  });
}
