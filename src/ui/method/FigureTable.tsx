import { FigureLines } from '#src/ui/method/FigureLines.tsx';
import { PartsTable } from '#src/ui/method/PartsTable.tsx';
import { figureText, type FigureRow } from '#src/ui/words/figureRows.ts';
import { partTables } from '#src/ui/words/partTables.ts';

interface Props {
  caption: string;
  rows: readonly FigureRow[];
  /** Published values by path, where the rows are those of a worked example. */
  published?: readonly { path: string; value: number | string | boolean | null; source: string }[];
}

/**
 * A calculator's figures, one a row, with the published ones beside them where there are some. A list of parts (shots,
 * criteria) stands below as a table of its own; above, only those of its figures that have a published one.
 */
export function FigureTable({ caption, rows, published = [] }: Props) {
  const beside = (path: string) => published.filter((one) => one.path === path || one.path.startsWith(`${path}.`));
  const compares = published.length > 0;
  const single = rows.filter(({ path, part }) => !part || beside(path).length > 0);
  return (
    <>
      {single.length > 0 && (
        <table className="stack figures table">
          <caption>{caption}</caption>
          <thead>
            <tr>
              <th scope="col">Figure</th>
              <th scope="col" className="n">
                Worked out
              </th>
              {compares && (
                <th scope="col" className="n">
                  Expected
                </th>
              )}
              {compares && <th scope="col">From</th>}
            </tr>
          </thead>
          <tbody>
            {single.map(({ path, label, lines, numeric }) => {
              const expected = beside(path);
              return (
                <tr key={path}>
                  <th scope="row">{label}</th>
                  <td className={numeric || lines.length === 0 ? 'n' : 'words'} data-label="Worked out">
                    <FigureLines lines={lines} />
                  </td>
                  {compares && (
                    <td className="n" data-label="Expected">
                      {expected.map(({ value }) => said(value)).join(' to ')}
                    </td>
                  )}
                  {compares && (
                    <td className="from" data-label="From">
                      {expected[0]?.source}
                    </td>
                  )}
                </tr>
              );
            })}
          </tbody>
        </table>
      )}
      {partTables(rows).map((table) => (
        <PartsTable key={table.list} table={table} />
      ))}
    </>
  );
}

function said(value: number | string | boolean | null): string {
  if (value === null) return 'none';
  if (typeof value === 'number') return figureText(value);
  return typeof value === 'boolean' ? (value ? 'yes' : 'no') : value;
}
