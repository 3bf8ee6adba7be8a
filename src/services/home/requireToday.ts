import { may, requirePermission } from '#src/access/permissions.ts';
import { isStaff, type Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { listOwnAthletes } from '#src/db/queries/athletes.ts';
import { countWaiting, listOpenDays } from '#src/db/queries/home.ts';
import { listGrowthMeasures } from '#src/db/queries/growthMeasures.ts';
import { headerOf } from '#src/services/records/loadHeader.ts';
import { todayIn } from '#src/services/today.ts';

/** What needs the viewer now: staff see open outruns, restrictions, values that wait; families their own children. */
export function requireToday(viewer: Viewer) {
  requirePermission(viewer, 'today:see');
  return asViewer(viewer, async (trx) => {
    const athletes = await listOwnAthletes(trx);
    const today = todayIn(viewer.timeZone);
    if (!isStaff(viewer)) {
      const growth =
        athletes.length === 0
          ? []
          : await listGrowthMeasures(
              trx,
              athletes.map(({ id }) => id),
            );
      return {
        kind: 'family' as const,
        children: athletes.map((row) =>
          headerOf(
            row,
            growth.filter(({ athleteId }) => athleteId === row.id),
            today,
          ),
        ),
      };
    }
    const headers = athletes.map((row) => headerOf(row, [], today));
    const settles = may(viewer, 'trial:settle');
    return {
      kind: 'staff' as const,
      today,
      outruns: headers.filter(({ outrun }) => outrun !== null).sort(byNeed),
      restricted: headers.filter(({ cautions }) => cautions.restrictions.length > 0),
      waiting: settles ? await countWaiting(trx) : null,
      openDays: settles ? await listOpenDays(trx) : [],
    };
  });
}

type Header = ReturnType<typeof headerOf>;

// Act before Look, what nobody has discussed before what is in hand, then the newest.
function byNeed(a: Header, b: Header): number {
  const rank = ({ outrun }: Header) =>
    (outrun?.level === 'act' ? 0 : 3) + ['raised', 'discussed', 'in hand'].indexOf(outrun?.state ?? '');
  return rank(a) - rank(b) || (b.outrun?.levelSince ?? '').localeCompare(a.outrun?.levelSince ?? '');
}
