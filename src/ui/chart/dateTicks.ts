import { dayNumber } from '#src/domain/calendar/dayNumber.ts';
import { dateWords } from '#src/ui/words/dateWords.ts';

/**
 * First days of months between two dates, about `count` of them at even steps, as an axis says them: the year stands at
 * the first and at each January.
 *
 * @param from YYYY-MM-DD
 * @param to   YYYY-MM-DD, not before `from`
 * @example dateTicks('2025-01-10', '2026-02-01', 4).map(({ label }) => label) // → ['May 25', 'Sep', 'Jan 26']
 */
export function dateTicks(from: string, to: string, count: number): { day: number; label: string }[] {
  const [first, last] = [monthIndex(from), monthIndex(to)];
  const step = [1, 2, 3, 4, 6, 12, 24, 48].find((months) => (last - first) / months <= count) ?? 96;
  const ticks: { day: number; label: string }[] = [];
  for (let month = Math.ceil(first / step) * step; month <= last; month += step) {
    const date = `${Math.floor(month / 12)}-${String((month % 12) + 1).padStart(2, '0')}-01`;
    const day = dayNumber(date);
    if (day >= dayNumber(from) && day <= dayNumber(to)) {
      const year = ticks.length === 0 || date.slice(5, 7) === '01' ? ` ${date.slice(2, 4)}` : '';
      ticks.push({ day, label: `${dateWords(date, 'short').slice(2)}${year}` });
    }
  }
  return ticks;
}

const monthIndex = (date: string): number => Number(date.slice(0, 4)) * 12 + Number(date.slice(5, 7)) - 1;
