import { figureText, type FigureRow } from '#src/ui/words/figureRows.ts';

interface Props {
  caption: string;
  rows: readonly FigureRow[];
  /** Published values by path, where the rows are those of a worked example. */
  published?: readonly { path: string; value: number | string | boolean | null; source: string }[];
}

/** A calculator's figures, one a row, with the published ones beside them where there are some. */
export function FigureTable({ caption, rows, published = [] }: Props) {
  const beside = (path: string) => published.filter((one) => one.path === path || one.path.startsWith(`${path}.`));
  const compares = published.length > 0;
  return (
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
        {rows.map(({ path, label, lines, numeric }) => {
          const expected = beside(path);
          return (
            <tr key={path}>
              <th scope="row">{label}</th>
              <td className={numeric || lines.length === 0 ? 'n' : 'words'} data-label="Worked out">
                {lines.length === 0 ? <None /> : lines.map((line) => <div key={line}>{line}</div>)}
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
  );
}

function said(value: number | string | boolean | null): string {
  if (value === null) return 'none';
  if (typeof value === 'number') return figureText(value);
  return typeof value === 'boolean' ? (value ? 'yes' : 'no') : value;
}

function None() {
  return (
    <span className="soft">
      <span aria-hidden="true">–</span>
      <span className="sr-only">none</span>
    </span>
  );
}
