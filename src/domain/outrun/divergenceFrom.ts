import { ageYears } from '#src/domain/growth/ageYears.ts';
import type {
  AthleteHistory,
  Built,
  CapacityTest,
  DataLine,
  DriverSession,
} from '#src/domain/outrun/athleteHistory.ts';
import type { CountedSession } from '#src/domain/outrun/countedSessions.ts';
import { figure } from '#src/domain/outrun/figure.ts';
import { PAIR_WITHIN_DAYS } from '#src/domain/outrun/impossibleBefore.ts';
import { daysBetween, nearestInTime, upTo } from '#src/domain/outrun/nearestInTime.ts';
import type { CarryPair, OutrunInput } from '#src/domain/outrun/outrunInput.ts';

/** How far stature and body mass may lie from the driver session, days, inclusive. */
export const GROWTH_WITHIN_DAYS = 150;

/** A driver session with a usable carry. */
type WithCarry = DriverSession & { carryStandardM: number };

/**
 * Each strength session with its nearest driver session, at most 21 days apart (the earlier on a tie), each used once:
 * where two strength sessions have the same nearest one, the nearer takes it (the earlier on a tie) and the other its
 * next.
 */
export function pairSessions<Strength extends { on: string }, Driver extends { on: string }>(
  strength: readonly Strength[],
  driver: readonly Driver[],
): { strength: Strength; driver: Driver }[] {
  const apart = (pair: { strength: Strength; driver: Driver }) =>
    Math.abs(daysBetween(pair.strength.on, pair.driver.on));
  const candidates = strength
    .flatMap((one) => driver.map((other) => ({ strength: one, driver: other })))
    .filter((pair) => apart(pair) <= PAIR_WITHIN_DAYS)
    .sort(
      (a, b) =>
        apart(a) - apart(b) || daysBetween(b.strength.on, a.strength.on) || daysBetween(b.driver.on, a.driver.on),
    );
  const used = new Set<object>();
  return candidates
    .filter((pair) => {
      if (used.has(pair.strength) || used.has(pair.driver)) return false;
      used.add(pair.strength).add(pair.driver);
      return true;
    })
    .sort((a, b) => daysBetween(b.driver.on, a.driver.on));
}

/**
 * divergence's block from dated data: carry of sessions without too strong a wind, lead push peak of the counted
 * sessions (without any counted push, mass × lead jump height), stature nearest within 150 days of the driver session,
 * age at the driver session.
 */
export function divergenceFrom(
  { asOf, birthDate, growth, driver, programme }: AthleteHistory,
  counted: Readonly<Record<CapacityTest, readonly CountedSession[]>>,
): Built<NonNullable<OutrunInput['divergence']>> {
  const known = upTo(growth, asOf);
  const statures = known.filter((row) => row.statureCm !== null);
  const masses = known.filter((row) => row.massKg !== null);
  const byJump = counted.push.length === 0;
  const drives = upTo(driver, asOf)
    .filter((session): session is WithCarry => session.carryStandardM !== null && !session.windTooStrong)
    .sort((a, b) => daysBetween(b.on, a.on) || a.carryStandardM - b.carryStandardM);

  const pairs: CarryPair[] = [];
  const used: DataLine[] = [];
  let withoutGrowth = 0;
  for (const pair of pairSessions(byJump ? counted.jump : counted.push, drives)) {
    const { on, carryStandardM } = pair.driver;
    const stature = nearestInTime(statures, on, GROWTH_WITHIN_DAYS)?.statureCm;
    const mass = nearestInTime(masses, on, GROWTH_WITHIN_DAYS)?.massKg;
    if (stature === undefined || stature === null || (byJump && (mass === undefined || mass === null))) {
      withoutGrowth += 1;
      continue;
    }
    const strength = byJump ? mass! * pair.strength.lead : pair.strength.lead;
    pairs.push({ day: on, carry: carryStandardM, strength, stature, age: ageYears(birthDate, on) });
    const capacity = byJump ? `${figure(strength)} kg·m, mass × lead jump` : `lead push ${figure(strength, 0)} N`;
    used.push({
      what: `carry, strength (tested ${pair.strength.on}) and height`,
      on,
      value: `${figure(carryStandardM)} m, ${capacity}, ${figure(stature)} cm`,
    });
  }
  if (pairs.length === 0) {
    const reason =
      withoutGrowth > 0
        ? `No ${byJump ? 'height and body mass' : 'height'} within ${GROWTH_WITHIN_DAYS} days of a driver session.`
        : `No driver session within ${PAIR_WITHIN_DAYS} days of a strength test that counts.`;
    return { block: undefined, reason, used };
  }
  return { block: { pairs, othersRaw: programme.othersRaw, asOf }, reason: null, used };
}
