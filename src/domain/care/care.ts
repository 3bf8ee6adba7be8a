import { dayNumber } from '#src/domain/calendar/dayNumber.ts';
import { CARE_FOOTER } from '#src/domain/care/careFooter.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Where it hurts. */
export const PAIN_SITES = ['back', 'bone', 'joint', 'muscle', 'other'] as const;

/** One of the sites. */
export type PainSite = (typeof PAIN_SITES)[number];

/** One report of pain, 0 to 10, with how it was the next morning (0 to 10) once that is known. */
export interface PainReport {
  on: string;
  site: PainSite;
  pain: number;
  nextMorning?: number | null;
  nightPain?: boolean;
  numbness?: boolean;
  changesSwing?: boolean;
}

/** An athlete's reports, any order. */
export interface CareInput {
  under18: boolean;
  reports: readonly PainReport[];
}

/** Care's two levels; the second is the only place of the words Stop and refer. */
export type CareLevel = 'reduce' | 'stop-and-refer';

/** The level with its reasons as sentences, what training is allowed, and the fixed footer. */
export interface CareResult {
  level: CareLevel | null;
  reasons: string[];
  allowed: { impact: boolean; driver: boolean };
  footer: string;
}

const WEEK_DAYS = 7;
const BACK_OR_BONE_PAIN = 2;
const SETTLED_BY_MORNING = 1;
const STOP = { under18: 4, adultAbove: 5 };
const REDUCE = { under18: 2, adult: 3 };

/**
 * The care rules, judged at the newest date on which pain was reported (all reports of that date).
 * Stop and refer: pain of 4 or more; back or bone pain of 2 or more on two days within 7; night pain, numbness, or a
 * pain that changes the swing. Reduce: pain of 2 or 3, a rise over the week before, or a next morning that is missing
 * or above 1. At 18 and over pain above 5 stops and 3 to 5 reduces; the other lines are the same.
 *
 * Source: our own proposal for juniors; the adult lines after Thomeé 1997 and Silbernagel 2007 (from memory), published
 * for knee and Achilles rehabilitation and not validated in juniors or backs.
 *
 * @throws {RangeError} if there is no report, a date is none, a pain outside 0 to 10 or a site unknown
 * @example care({ under18: true, reports: [{ on: '2026-05-01', site: 'joint', pain: 5, nextMorning: 0 }] }).level // → 'stop-and-refer'
 */
export function care({ under18, reports }: CareInput): CareResult {
  if (reports.length === 0) throw new RangeError('care requires at least one report, got none');
  for (const { site, pain, nextMorning } of reports) {
    if (!PAIN_SITES.includes(site)) throw new RangeError(`care requires a known site, got ${String(site)}`);
    requireFiniteNumber('care', 'pain', pain, { min: 0, max: 10 });
    if (typeof nextMorning === 'number') requireFiniteNumber('care', 'nextMorning', nextMorning, { min: 0, max: 10 });
  }
  const newestDay = Math.max(...reports.map(({ on }) => dayNumber(on)));
  const daysAgo = ({ on }: PainReport) => newestDay - dayNumber(on);
  const newest = reports.filter((report) => daysAgo(report) === 0);
  const weekBefore = reports.filter((report) => daysAgo(report) > 0 && daysAgo(report) <= WEEK_DAYS);

  const stops = stopReasons(under18, newest, [...newest, ...weekBefore]);
  const reduces = reduceReasons(under18, newest, weekBefore);
  const stopped = stops.length > 0;
  return {
    level: stopped ? 'stop-and-refer' : reduces.length > 0 ? 'reduce' : null,
    reasons: stopped ? stops : reduces,
    allowed: { impact: !stopped, driver: !stopped },
    footer: CARE_FOOTER,
  };
}

function stopReasons(under18: boolean, newest: readonly PainReport[], week: readonly PainReport[]): string[] {
  const reasons: string[] = [];
  const pain = mostPain(newest);
  if (under18 ? pain >= STOP.under18 : pain > STOP.adultAbove) {
    reasons.push(`Pain ${pain} out of 10: ${under18 ? 'from 4' : 'above 5'}, stop impact and driver.`);
  }
  const days = new Set(
    week
      .filter(({ site, pain: felt }) => (site === 'back' || site === 'bone') && felt >= BACK_OR_BONE_PAIN)
      .map(({ on }) => dayNumber(on)),
  );
  if (days.size >= 2) reasons.push(`Back or bone pain of 2 or more on ${days.size} days within 7.`);
  if (newest.some(({ nightPain }) => nightPain)) reasons.push('Pain at night.');
  if (newest.some(({ numbness }) => numbness)) reasons.push('Numbness.');
  if (newest.some(({ changesSwing }) => changesSwing)) reasons.push('Pain that changes the swing.');
  return reasons;
}

function reduceReasons(under18: boolean, newest: readonly PainReport[], weekBefore: readonly PainReport[]): string[] {
  const reasons: string[] = [];
  const pain = mostPain(newest);
  if (pain >= (under18 ? REDUCE.under18 : REDUCE.adult)) {
    reasons.push(`Pain ${pain} out of 10: do less, and tell the coach.`);
  }
  if (roseOver(newest, weekBefore)) reasons.push('The pain rose over the week before.');
  const mornings = newest.map(({ nextMorning }) => nextMorning ?? null);
  if (mornings.some((morning) => morning !== null && morning > SETTLED_BY_MORNING)) {
    reasons.push('Not settled by the next morning.');
  }
  if (mornings.includes(null)) reasons.push('How it was the next morning is not known yet.');
  return reasons;
}

/** A rise of the worst pain over all sites, or of one site over what the same site had in the week before. */
function roseOver(newest: readonly PainReport[], weekBefore: readonly PainReport[]): boolean {
  if (weekBefore.length === 0) return false;
  if (mostPain(newest) > mostPain(weekBefore)) return true;
  return newest.some(({ site, pain }) => {
    const before = weekBefore.filter((report) => report.site === site);
    return before.length > 0 && pain > mostPain(before);
  });
}

const mostPain = (reports: readonly PainReport[]) => Math.max(...reports.map(({ pain }) => pain));
