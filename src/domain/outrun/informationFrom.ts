import { GROWTH_BAND_MIN_DAYS, growthBand } from '#src/domain/growth/growthBand.ts';
import { growthVelocity, type GrowthVelocityResult } from '#src/domain/growth/growthVelocity.ts';
import type { AthleteHistory, Built, DataLine } from '#src/domain/outrun/athleteHistory.ts';
import type { CountedSession } from '#src/domain/outrun/countedSessions.ts';
import { GROWTH_WITHIN_DAYS } from '#src/domain/outrun/divergenceFrom.ts';
import { figure } from '#src/domain/outrun/figure.ts';
import { FRESH_WITHIN_DAYS } from '#src/domain/outrun/groundFrom.ts';
import { newestTwo } from '#src/domain/outrun/leadDeficitFrom.ts';
import { DEFICIT_WITHIN_DAYS } from '#src/domain/outrun/leadDeficitFrom.ts';
import { daysBetween, upTo } from '#src/domain/outrun/nearestInTime.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { Z90 } from '#src/domain/statistics/z90.ts';

/** ahead-of-strength's block: the newest counted push and the newest club speed, both within 42 days. */
export function aheadOfStrengthFrom(
  { asOf, driver, programme }: AthleteHistory,
  pushes: readonly CountedSession[],
): Built<NonNullable<OutrunInput['aheadOfStrength']>> {
  const fresh = ({ on }: { on: string }) => daysBetween(on, asOf) <= FRESH_WITHIN_DAYS;
  const push = pushes.findLast(fresh);
  const drive = upTo(driver, asOf).findLast((session) => session.clubSpeed !== null && fresh(session));
  const none = (what: string) => ({
    block: undefined,
    reason: `No ${what} within ${FRESH_WITHIN_DAYS} days.`,
    used: [],
  });
  if (!push) return none('push that counts');
  if (!drive || drive.clubSpeed === null) return none('club speed of the driver');
  return {
    block: { others: programme.others, athlete: { strength: push.lead, clubSpeed: drive.clubSpeed } },
    reason: null,
    used: [
      { what: 'lead push', on: push.on, value: `${figure(push.lead, 0)} N` },
      { what: 'club speed, driver', on: drive.on, value: `${figure(drive.clubSpeed)} m/s` },
    ],
  };
}

/**
 * delivery's block: the newest two driver sessions with a carry within 400 days, and whether the lead push rose beyond
 * its detectable change (z·√(TE² + TE²) of the newest two counted sessions).
 */
export function deliveryFrom(
  { asOf, driver }: AthleteHistory,
  pushes: readonly CountedSession[],
): Built<NonNullable<OutrunInput['delivery']>> {
  const none = (reason: string) => ({ block: undefined, reason, used: [] });
  const [before, newest] = upTo(driver, asOf)
    .filter((session) => session.carryStandardM !== null && !session.windTooStrong)
    .filter(({ on }) => daysBetween(on, asOf) <= DEFICIT_WITHIN_DAYS)
    .slice(-2);
  if (!before || !newest)
    return none(`Two driver sessions with a carry within ${DEFICIT_WITHIN_DAYS} days are needed.`);
  if (before.clubSpeed === null || newest.clubSpeed === null)
    return none('Club speed was not measured at both sessions.');
  const { carryMdcM, clubSpeedMdc } = newest;
  if (typeof carryMdcM !== 'number' || typeof clubSpeedMdc !== 'number') {
    return none('The detectable change of carry or club speed is not known for the newest driver session.');
  }
  const [weaker, later] = newestTwo(pushes, asOf);
  if (!weaker || !later) return none('Two pushes that count are needed, to know whether the leg got stronger.');

  const risePct = 100 * Math.log(later.lead / weaker.lead);
  const change = (now: number | null, then: number | null) => (now === null || then === null ? null : now - then);
  const figuresOf = (session: typeof newest): DataLine => ({
    what: 'carry and club speed, driver',
    on: session.on,
    value: `${figure(session.carryStandardM!)} m and ${figure(session.clubSpeed!)} m/s`,
  });
  return {
    block: {
      carryChange: newest.carryStandardM! - before.carryStandardM!,
      carryMdc: carryMdcM,
      clubSpeedChange: newest.clubSpeed - before.clubSpeed,
      clubSpeedMdc,
      attackChangeDeg: change(newest.attackDeg, before.attackDeg),
      loftChangeDeg: change(newest.dynamicLoftDeg, before.dynamicLoftDeg),
      strengthRisen: risePct >= Z90 * Math.hypot(weaker.teLeadPct, later.teLeadPct),
    },
    reason: null,
    used: [figuresOf(before), figuresOf(newest)],
  };
}

/**
 * Growth velocity as of a date: the newest stature within 150 days, against the newest one at least 150 and at most
 * 400 days before it; null where there are not two such.
 */
export function velocityAsOf({ growth, asOf }: Pick<AthleteHistory, 'growth' | 'asOf'>): GrowthVelocityResult | null {
  const measured = upTo(growth, asOf).flatMap(({ on, statureCm }) =>
    statureCm === null ? [] : [{ on, stature: statureCm }],
  );
  const newest = measured.at(-1);
  if (!newest || daysBetween(newest.on, asOf) > GROWTH_WITHIN_DAYS) return null;
  const before = measured.findLast(({ on }) => {
    const days = daysBetween(on, newest.on);
    return days >= GROWTH_BAND_MIN_DAYS && days <= DEFICIT_WITHIN_DAYS;
  });
  if (!before) return null;
  const ofBothDates = measured.filter(({ on }) => on === newest.on || on === before.on);
  return growthVelocity({ measures: ofBothDates });
}

/** context's block: hip rotation of the newest two dates within 400 days, growth band, driver balls of 42 days, pain. */
export function contextFrom(history: AthleteHistory): Built<NonNullable<OutrunInput['context']>> {
  const { asOf, driver, hipRotation = [], pain, sex } = history;
  const used: DataLine[] = [];
  const hips = upTo(hipRotation, asOf)
    .filter(({ on }) => daysBetween(on, asOf) <= DEFICIT_WITHIN_DAYS)
    .slice(-2);
  for (const { on, lead, trail } of hips) {
    used.push({
      what: 'hip internal rotation, lead and trail',
      on,
      value: `${figure(lead, 0)}° and ${figure(trail, 0)}°`,
    });
  }
  const velocity = velocityAsOf(history);
  const perYear = velocity?.perYear ?? null;
  if (velocity && perYear !== null) {
    used.push({ what: `growth over ${velocity.days} days`, on: asOf, value: `${figure(perYear)} cm a year` });
  }
  const drive = upTo(driver, asOf).at(-1);
  const balls = drive && daysBetween(drive.on, asOf) <= FRESH_WITHIN_DAYS ? (drive.ballsWeekChangePct ?? null) : null;
  if (drive && balls !== null) {
    used.push({
      what: 'driver balls on the week before',
      on: drive.on,
      value: `${balls > 0 ? '+' : ''}${figure(balls, 0)} %`,
    });
  }
  const velocityInSpurtBand =
    velocity && perYear !== null ? growthBand(sex, perYear, velocity.days ?? 0) === 'spurt-like' : null;
  // no evidence line for pain: the lines are shown to swing coaches too
  const block = {
    hipRotation: hips.map(({ lead, trail }) => ({ lead, trail })),
    pain: pain ?? null,
    velocityInSpurtBand,
    driverBallsChangePct: balls,
  };
  return { block, reason: null, used };
}
