import type { AthleteHistory, Built, DataLine } from '#src/domain/outrun/athleteHistory.ts';
import { CATALOGUE_CV_PCT, type CountedSession } from '#src/domain/outrun/countedSessions.ts';
import { figure } from '#src/domain/outrun/figure.ts';
import { driverSwings, FRESH_WITHIN_DAYS } from '#src/domain/outrun/groundFrom.ts';
import { daysBetween, nearestInTime, upTo } from '#src/domain/outrun/nearestInTime.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import type { OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { coefficientOfVariationPct } from '#src/domain/statistics/coefficientOfVariationPct.ts';
import { mean } from '#src/domain/statistics/mean.ts';
import { median } from '#src/domain/statistics/median.ts';

/** How far body mass may lie from the swing and from the push, days, inclusive. */
export const MASS_WITHIN_DAYS = 14;
const GRAVITY = 9.81;

/** demand's block with the rig its swings were measured on. */
export type BuiltDemand = Built<NonNullable<OutrunInput['demand']>> & { rig: string | null };

/**
 * demand's block from dated data: the newest driver ground session with five swings on force plates and the newest
 * counted push, both within 42 days, each in times body weight with a body mass within 14 days. A force in newtons is
 * preferred to a ratio made elsewhere, since its mass is then known. The push's CV is the catalogue's, since two or
 * three trials do not tell their own.
 */
export function demandFrom(
  history: AthleteHistory,
  pushes: readonly CountedSession[],
  policy: OutrunPolicy,
): BuiltDemand {
  const { asOf, growth, programme } = history;
  const used: DataLine[] = [];
  const none = (reason: string): BuiltDemand => ({ block: undefined, reason, used, rig: null });
  const masses = upTo(growth, asOf).filter((row) => row.massKg !== null && row.massKg > 0);
  const massOn = (on: string) => nearestInTime(masses, on, MASS_WITHIN_DAYS)?.massKg ?? null;

  let massMissingOn: string | null = null;
  const swings = driverSwings(history, ({ measure, peakLeadForceN, peakLeadTimesBodyWeight }, { on }) => {
    if (measure !== 'force') return null;
    if (peakLeadForceN === null) return peakLeadTimesBodyWeight;
    const mass = massOn(on);
    if (mass === null) massMissingOn = on;
    return mass === null ? null : peakLeadForceN / (mass * GRAVITY);
  });
  if (swings.session === null) {
    return none(massMissingOn ? noMass('driver swings', massMissingOn) : swings.reason);
  }
  const push = pushes.findLast(({ on }) => daysBetween(on, asOf) <= FRESH_WITHIN_DAYS);
  if (!push) return none(`No push that counts within ${FRESH_WITHIN_DAYS} days.`);
  const pushMass = massOn(push.on);
  if (pushMass === null) return none(noMass('push', push.on));

  const values = [...swings.values].sort((a, b) => a - b);
  const cvPct = coefficientOfVariationPct(values);
  if (cvPct === null) return none('The force under the lead foot is 0 in every driver swing.');
  const peakLead = { mean: mean(values), cvPct, n: values.length };
  const capacity = { mean: push.lead / (pushMass * GRAVITY), cvPct: CATALOGUE_CV_PCT.push, n: push.nLead };
  const { rig, on } = swings.session;
  const onRig = rig === null ? '' : ` on ${rig}`;
  used.push(
    { what: `peak lead force, driver, ${values.length} swings${onRig}`, on, value: times(peakLead.mean) },
    { what: `lead push (mean of ${push.nLead})`, on: push.on, value: times(capacity.mean) },
  );
  const { othersDemand } = programme;
  const programmeMedian = othersDemand.length >= Math.max(1, policy.minOthersDemand) ? median(othersDemand) : null;
  return { block: { peakLead, capacity, programmeMedian }, reason: null, used, rig };
}

const times = (value: number) => `${figure(value, 2)} × body weight`;
const noMass = (what: string, on: string) => `No body mass within ${MASS_WITHIN_DAYS} days of the ${what} of ${on}.`;
