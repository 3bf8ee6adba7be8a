import { FigureLines } from '#src/ui/method/FigureLines.tsx';
import type { PartTable } from '#src/ui/words/partTables.ts';

/** One list of a calculator's answer: its parts one a row. */
export function PartsTable({ table: { list, columns, rows } }: { table: PartTable }) {
  return (
    <div className="scroller" role="region" tabIndex={0} aria-label={list}>
      <table className="stack parts table">
        <caption>{list}</caption>
        <thead>
          <tr>
            <th scope="col">
              <span className="sr-only">Which</span>
            </th>
            {columns.map(({ figure, numeric }) => (
              <th key={figure} scope="col" className={numeric ? 'n' : undefined}>
                {capital(figure)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ name, cells }, index) => (
            <tr key={index}>
              <th scope="row">{name}</th>
              {columns.map(({ figure, numeric }, column) => (
                <td key={figure} className={numeric ? 'n' : undefined} data-label={capital(figure)}>
                  <FigureLines lines={cells[column]?.lines ?? []} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const capital = (text: string) => `${text.charAt(0).toUpperCase()}${text.slice(1)}`;
