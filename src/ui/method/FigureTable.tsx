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
  return (
    <div className="scroller" role="region" tabIndex={0} aria-label={caption}>
      <table className="figures table">
        <caption>{caption}</caption>
        <thead>
          <tr>
            <th scope="col">Figure</th>
            <th scope="col" className="n">
              Worked out
            </th>
            {published.length > 0 && (
              <th scope="col" className="n">
                Expected
              </th>
            )}
            {published.length > 0 && <th scope="col">From</th>}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ path, label, lines, numeric }) => (
            <tr key={path}>
              <th scope="row">{label}</th>
              <td className={numeric || lines.length === 0 ? 'n' : 'words'}>
                {lines.length === 0 ? <None /> : lines.map((line) => <div key={line}>{line}</div>)}
              </td>
              {published.length > 0 && (
                <td className="n">
                  {beside(path)
                    .map(({ value }) => (value === null ? 'none' : said(value)))
                    .join(' to ')}
                </td>
              )}
              {published.length > 0 && <td>{beside(path)[0]?.source}</td>}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const said = (value: number | string | boolean): string =>
  typeof value === 'number' ? figureText(value) : typeof value === 'boolean' ? (value ? 'yes' : 'no') : value;

function None() {
  return (
    <span className="soft">
      <span aria-hidden="true">–</span>
      <span className="sr-only">none</span>
    </span>
  );
}
