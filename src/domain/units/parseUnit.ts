import { UNITS } from '#src/domain/units/unitTable.ts';
import type { Unit } from '#src/domain/units/unitTable.ts';

const BY_SPELLING: ReadonlyMap<string, Unit> = new Map(
  UNITS.flatMap((unit) => unit.spellings.map((spelling): [string, Unit] => [spelling, unit])),
);

const SUPERSCRIPT_MINUS_ONE = /⁻¹/g;
const ENCLOSED = /^(?:\((.*)\)|\[(.*)\])$/;

/**
 * Recognises a unit as files write it: any case, any spaces, in brackets or not, with a full stop after an abbreviation.
 *
 * @param text the unit alone, as `yds`, `M/S`, `(cm)`, `in.`, `º`
 * @returns the unit, or null where the text is none of the table's
 * @example parseUnit(' Yards ')?.symbol // → 'yd'
 */
export function parseUnit(text: string): Unit | null {
  const bare = text.toLowerCase().replace(SUPERSCRIPT_MINUS_ONE, '-1').replace(/−/g, '-').replace(/\s+/g, '');
  const enclosed = ENCLOSED.exec(bare);
  const inner = enclosed ? (enclosed[1] ?? enclosed[2] ?? '') : bare;
  return BY_SPELLING.get(inner) ?? BY_SPELLING.get(inner.replace(/\.$/, '')) ?? null;
}
