import { dayNumber } from '#src/domain/calendar/dayNumber.ts';

/** A term of the academy, dates YYYY-MM-DD, both included. */
export interface NewTerm {
  name: string;
  startsOn: string;
  endsOn: string;
}

/** Dates further apart than this belong to two terms. */
const GAP_DAYS = 45;
const LAST_TERM_DAYS = 90;
const SEASONS = [
  'Spring',
  'Spring',
  'Spring',
  'Spring',
  'Summer',
  'Summer',
  'Summer',
  'Summer',
  'Autumn',
  'Autumn',
  'Autumn',
  'Autumn',
];

/**
 * Terms as a season's dates show them: each begins with its first date and lasts until the day before the next.
 *
 * @param dates YYYY-MM-DD in any order
 */
export function termsOf(dates: readonly string[]): NewTerm[] {
  const sorted = [...new Set(dates)].sort();
  const starts = sorted.filter((date, i) => i === 0 || dayNumber(date) - dayNumber(sorted[i - 1]!) > GAP_DAYS);
  const names = new Map<string, number>();
  return starts.map((startsOn, i) => {
    const next = starts[i + 1];
    const last = sorted.at(-1)!;
    const endsOn =
      next === undefined
        ? dateOf(Math.max(dayNumber(startsOn) + LAST_TERM_DAYS, dayNumber(last)))
        : dateOf(dayNumber(next) - 1);
    const name = `${SEASONS[Number(startsOn.slice(5, 7)) - 1]!} ${startsOn.slice(0, 4)}`;
    const used = (names.get(name) ?? 0) + 1;
    names.set(name, used);
    return { name: used === 1 ? name : `${name} ${used}`, startsOn, endsOn };
  });
}

const dateOf = (day: number): string => new Date(day * 86_400_000).toISOString().slice(0, 10);
