import type { FigureRow } from '#src/ui/words/figureRows.ts';

/** A list of an answer as a table: a row for each of its parts, a column for each of their figures. */
export interface PartTable {
  list: string;
  columns: { figure: string; numeric: boolean }[];
  /** `cells` in the order of the columns; undefined where a part has no such figure. */
  rows: { name: string; cells: (FigureRow | undefined)[] }[];
}

/** The lists among an answer's figures, in order, each with its parts in order. */
export function partTables(figures: readonly FigureRow[]): PartTable[] {
  const lists = [...new Set(figures.flatMap(({ part }) => (part ? [part.list] : [])))];
  return lists.map((list) => {
    const inList = figures.filter(({ part }) => part?.list === list);
    const names = new Map(inList.map(({ part }) => [part!.index, part!.name]));
    const columns = [...new Set(inList.map(({ part }) => part!.figure))].map((figure) => ({
      figure,
      numeric: inList.some(({ part, numeric }) => part!.figure === figure && numeric),
    }));
    const cell = (index: number, figure: string) =>
      inList.find(({ part }) => part!.index === index && part!.figure === figure);
    return {
      list,
      columns,
      rows: [...names].map(([index, name]) => ({ name, cells: columns.map(({ figure }) => cell(index, figure)) })),
    };
  });
}
