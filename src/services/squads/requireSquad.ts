import { requirePermission } from '#src/access/permissions.ts';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { listAthletesOfSquad } from '#src/db/queries/athletes.ts';
import { listDriverSessions } from '#src/db/queries/driverSessions.ts';
import { listGrowthMeasures } from '#src/db/queries/growthMeasures.ts';
import { findSquad } from '#src/db/queries/squads.ts';
import { listTestSessions } from '#src/db/queries/testSessions.ts';
import { notFound } from '#src/errors/appError.ts';
import type { LegComparison } from '#src/services/records/compareLegs.ts';
import { driverSeries, type DriverPoint } from '#src/services/records/driverFigures.ts';
import { headerOf, type RecordHeader } from '#src/services/records/loadHeader.ts';
import { comparisons } from '#src/services/records/strengthFigures.ts';
import { todayIn } from '#src/services/today.ts';

export interface SquadRow {
  athlete: RecordHeader;
  /** Lead against trail in the push of the squad's newest testing day; null if not tested then. */
  push: LegComparison | null;
  /** Standard carry of each of the newest seven session dates of the squad; null where the athlete was not there. */
  carry: (DriverPoint | null)[];
}

const SESSIONS_SHOWN = 7;

/**
 * A squad with one row an athlete.
 *
 * @throws {AppError} forbidden, not-found
 */
export function requireSquad(viewer: Viewer, squadId: string) {
  requirePermission(viewer, 'squad:see');
  return asViewer(viewer, async (trx) => {
    const squad = (await findSquad(trx, squadId)) ?? notFound('squad');
    const athletes = await listAthletesOfSquad(trx, squadId);
    if (athletes.length === 0) return { squad, rows: [] };
    const ids = athletes.map(({ id }) => id);
    const growth = grouped(await listGrowthMeasures(trx, ids));
    const tests = grouped(await listTestSessions(trx, ids));
    const drives = grouped(await listDriverSessions(trx, ids));
    const dates = [...new Set([...drives.values()].flat().map(({ heldOn }) => heldOn))].sort().slice(-SESSIONS_SHOWN);
    const today = todayIn(viewer.timeZone);
    const rows = athletes.map((row): SquadRow => {
      const athlete = headerOf(row, growth.get(row.id) ?? [], today);
      const points = driverSeries(drives.get(row.id) ?? []);
      const pushes = comparisons(tests.get(row.id) ?? [], athlete.leadSide).filter(({ testKey }) => testKey === 'push');
      return {
        athlete,
        push: pushes.findLast(({ heldOn }) => heldOn === squad.testedOn) ?? null,
        carry: dates.map((date) => points.find(({ heldOn }) => heldOn === date) ?? null),
      };
    });
    return { squad, rows };
  });
}

function grouped<T extends { athleteId: string }>(rows: readonly T[]): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const row of rows) groups.set(row.athleteId, [...(groups.get(row.athleteId) ?? []), row]);
  return groups;
}
