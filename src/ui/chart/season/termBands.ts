import { textWidth } from '#src/ui/chart/textWidth.ts';
import type { SeasonTerm } from '#src/ui/chart/season/season.ts';

/**
 * A term's name where the whole name has no room: `Autumn 2024` → `Aut 24`.
 *
 * @example shortTermName('Spring 25') // → 'Spr 25'
 */
export function shortTermName(name: string): string {
  const [first = '', ...rest] = name.trim().split(/\s+/);
  const year = rest.map((word) => /(\d{2})$/.exec(word)?.[1]).find(Boolean);
  return [/^\d/.test(first) ? first : first.slice(0, 3), year].filter(Boolean).join(' ');
}

export interface TermBand {
  x: number;
  width: number;
  shaded: boolean;
  label: string;
  name: string;
}

/**
 * The terms as bands side by side, each from its first day to the next one's, with labels that fit: whole names, else
 * short ones, else every second or third.
 *
 * @param x place of a day number
 */
export function termBands(
  terms: readonly SeasonTerm[],
  x: (date: string) => number,
  end: number,
  font: number,
): TermBand[] {
  const edges = [...terms.map(({ startsOn }) => x(startsOn)), end];
  const widths = terms.map((_, i) => edges[i + 1]! - edges[i]!);
  const room = Math.min(...widths) - 6;
  const fits = (names: readonly string[], bands: number) =>
    names.every((name) => textWidth(name, font) <= room * bands + (bands - 1) * 6);
  const whole = terms.map(({ name }) => name);
  const labels = fits(whole, 1) ? whole : whole.map(shortTermName);
  const each = [1, 2, 3, 4].find((bands) => fits(labels, bands)) ?? terms.length;
  return terms.map(({ name }, i) => ({
    x: edges[i]!,
    width: widths[i]!,
    shaded: i % 2 === 0,
    label: i % each === 0 ? labels[i]! : '',
    name,
  }));
}
