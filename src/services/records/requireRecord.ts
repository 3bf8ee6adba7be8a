import { isStaff, type Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { listDriverSessions } from '#src/db/queries/driverSessions.ts';
import { findOutrunLane } from '#src/db/queries/outrunEvents.ts';
import { listTestSessions } from '#src/db/queries/testSessions.ts';
import { seasonSentence } from '#src/domain/record/seasonSentence.ts';
import { driverSeries, type DriverPoint } from '#src/services/records/driverFigures.ts';
import { velocitySeries } from '#src/services/records/growthFigures.ts';
import { loadHeader } from '#src/services/records/loadHeader.ts';
import { comparisons, newestDay, pushPerKg, type LegsPoint } from '#src/services/records/strengthFigures.ts';
import type { LegComparison } from '#src/services/records/compareLegs.ts';

/**
 * The Record: header, cautions, and the season on one time axis. Families get the same figures without any outrun,
 * mark or comparison made from one.
 *
 * @throws {AppError} forbidden, not-found
 */
export function requireRecord(viewer: Viewer, athleteId: string) {
  return asViewer(viewer, async (trx) => {
    const { header, growth } = await loadHeader(trx, viewer, athleteId);
    const compared = comparisons(await listTestSessions(trx, [athleteId]), header.leadSide);
    const carry = driverSeries(await listDriverSessions(trx, [athleteId]));
    const { terms } = header;
    const strength = pushPerKg(compared, growth);
    const newest = newestDay(compared);
    const lane = isStaff(viewer) ? await findOutrunLane(trx, athleteId) : null;
    return {
      header,
      terms,
      carry,
      strength,
      velocity: velocitySeries(growth),
      newest,
      sentence: lane ? sentenceOf({ carry, strength, newest, terms, marks: header.marks }) : null,
      outrunEvents: lane?.events ?? [],
      outrunResult: lane?.openResult ?? null,
    };
  });
}

interface Facts {
  carry: readonly DriverPoint[];
  strength: readonly LegsPoint[];
  newest: readonly LegComparison[];
  terms: readonly { name: string; startsOn: string; endsOn: string }[];
  marks: unknown;
}

function sentenceOf({ carry, strength, newest, terms, marks }: Facts): string {
  const half = ({ interval }: DriverPoint) => (interval ? (interval[1] - interval[0]) / 2 : 0);
  const ends = <T>(list: readonly T[]): [T, T] | null => (list.length < 2 ? null : [list[0]!, list.at(-1)!]);
  const drives = ends(carry);
  const pushes = ends(strength);
  const term = terms.find(
    ({ startsOn, endsOn }) => drives && startsOn <= drives[0].heldOn && drives[0].heldOn <= endsOn,
  );
  return seasonSentence({
    carry: drives && {
      first: { value: drives[0].carryM, half: half(drives[0]) },
      last: { value: drives[1].carryM, half: half(drives[1]) },
      since: term?.name ?? drives[0].heldOn,
    },
    leadPush: pushes && {
      first: { value: pushes[0].lead, half: pushes[0].leadHalf ?? 0 },
      last: { value: pushes[1].lead, half: pushes[1].leadHalf ?? 0 },
    },
    differences: newest.flatMap(({ testKey, difference, interval }) =>
      interval && ['push', 'jump', 'hop'].includes(testKey)
        ? [{ value: difference, half: (interval[1] - interval[0]) / 2 }]
        : [],
    ),
    sameSideTwice: JSON.stringify(marks ?? '').includes('same side twice'),
  });
}
