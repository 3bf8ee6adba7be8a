import type { Season, SeasonPoint } from '#src/ui/chart/season/season.ts';
import { dateWords } from '#src/ui/words/dateWords.ts';
import { intervalWords, plainNumber } from '#src/ui/words/numberWords.ts';

const LEVEL_WORDS = { look: 'Look', act: 'Act' } as const;

/** The Season line in words: what a person hears in place of the drawing. */
export function seasonSentence({ terms, carry, strength, growth, outruns }: Season): string {
  const over = terms.length > 0 ? `, ${terms[0]!.name} to ${terms.at(-1)!.name}` : '';
  const parts = [
    `Season line${over}.`,
    fromTo('Carry', carry, 'm', 0),
    ...(strength
      ? [
          fromTo(`${strength.name}, lead`, strength.lead, strength.unit, strength.digits),
          fromTo(`${strength.name}, trail`, strength.trail, strength.unit, strength.digits),
        ]
      : ['Strength: not tested yet.']),
    fromTo('Growth', growth, 'cm a year', 1),
  ];
  for (const { steps } of outruns ?? []) {
    const said = steps.map(
      ({ on, level, word }) => `${word ?? (level ? LEVEL_WORDS[level] : 'cleared')} ${dateWords(on)}`,
    );
    parts.push(`Outrun: ${said.join(', ')}.`);
  }
  return parts.join(' ');
}

function fromTo(name: string, points: readonly SeasonPoint[], unit: string, digits: number): string {
  const [first, last] = [points[0], points.at(-1)];
  if (!first || !last) return `${name}: no value yet.`;
  if (points.length === 1) return `${name} ${plainNumber(first.value, digits)} ${unit} on ${dateWords(first.on)}.`;
  const values = `${plainNumber(first.value, digits)} to ${plainNumber(last.value, digits)} ${unit}`;
  return `${name} ${values}, ${dateWords(first.on)} to ${dateWords(last.on)}.`;
}

export interface SeasonTable {
  columns: { header: string; unit?: string; numeric?: boolean }[];
  rows: (string | null)[][];
}

/** The same figures as a table: a row a date, each value with its 90 % interval. */
export function seasonTable({ carry, strength, growth, outruns }: Season): SeasonTable {
  const columns = [
    { header: 'Date', points: null, digits: 0 },
    { header: 'Carry', unit: 'm', points: carry, digits: 0 },
    ...(strength
      ? [
          { header: `${strength.name}, lead`, unit: strength.unit, points: strength.lead, digits: strength.digits },
          { header: `${strength.name}, trail`, unit: strength.unit, points: strength.trail, digits: strength.digits },
        ]
      : []),
    { header: 'Growth', unit: 'cm a year', points: growth, digits: 1 },
  ];
  const steps = (outruns ?? []).flatMap((outrun) => outrun.steps);
  const days = [...new Set([...columns.flatMap(({ points }) => points ?? []), ...steps].map(({ on }) => on))].sort();
  return {
    columns: [
      ...columns.map(({ header, points, ...rest }) => ({
        header,
        unit: 'unit' in rest ? rest.unit : undefined,
        numeric: points !== null,
      })),
      ...(outruns ? [{ header: 'Outrun' }] : []),
    ],
    rows: days.map((on) => [
      ...columns.map(({ points, digits }) =>
        points === null
          ? dateWords(on)
          : cell(
              points.filter((point) => point.on === on),
              digits,
            ),
      ),
      ...(outruns ? [stepWords(steps.filter((step) => step.on === on))] : []),
    ]),
  };
}

// Two sessions on one day share its row.
function cell(points: readonly SeasonPoint[], digits: number): string | null {
  const said = points.map(({ value, interval }) => {
    const plain = plainNumber(value, digits);
    return interval ? `${plain} (${intervalWords(interval, digits)})` : plain;
  });
  return said.length > 0 ? said.join('; ') : null;
}

const stepWords = (steps: readonly { level: 'look' | 'act' | null; word?: string }[]): string | null =>
  steps.length === 0
    ? null
    : steps.map(({ level, word }) => word ?? (level ? LEVEL_WORDS[level] : 'cleared')).join(', ');
