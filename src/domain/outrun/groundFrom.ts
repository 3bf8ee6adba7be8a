import type { AthleteHistory, GroundSession, GroundSwing } from '#src/domain/outrun/athleteHistory.ts';
import { MIN_SWINGS } from '#src/domain/outrun/demand.ts';
import { daysBetween, upTo } from '#src/domain/outrun/nearestInTime.ts';

/** How old strength and ground data may be at the judgement, days, inclusive. */
export const FRESH_WITHIN_DAYS = 42;

/** A swing's figure with the session it belongs to. */
export type SwingsOfSession<Value> =
  { session: GroundSession; values: Value[]; reason: null } | { session: null; values: []; reason: string };

/**
 * The newest driver ground session within 42 days that has at least five swings with both plates and a usable figure.
 *
 * @param usable the figure of a swing (its session beside it), or null where the swing cannot give it
 */
export function driverSwings<Value>(
  { ground, asOf }: Pick<AthleteHistory, 'ground' | 'asOf'>,
  usable: (swing: GroundSwing, session: GroundSession) => Value | null,
): SwingsOfSession<Value> {
  const none = (reason: string): SwingsOfSession<Value> => ({ session: null, values: [], reason });
  const sessions = upTo(ground, asOf)
    .filter(({ club, on }) => club === 'driver' && daysBetween(on, asOf) <= FRESH_WITHIN_DAYS)
    .sort((a, b) => daysBetween(b.on, a.on) || (a.rig ?? '').localeCompare(b.rig ?? ''))
    .map((session) => ({
      session,
      values: session.swings
        .filter(({ bothPlates }) => bothPlates)
        .map((swing) => usable(swing, session))
        .filter((value): value is Awaited<Value> & NonNullable<Value> => value !== null),
    }));
  const enough = sessions.findLast(({ values }) => values.length >= MIN_SWINGS);
  if (enough) return { ...enough, reason: null };

  const newest = sessions.at(-1);
  if (!newest) return none(`No driver swings on plates within ${FRESH_WITHIN_DAYS} days.`);
  const { session, values } = newest;
  const onePlate = session.swings.some(({ bothPlates }) => !bothPlates) ? ' (a plate is missing in some)' : '';
  return none(
    `Five usable driver swings of one session are needed: ${session.on} has ${values.length} of ${session.swings.length}${onePlate}.`,
  );
}
