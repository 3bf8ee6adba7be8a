import { linearScale } from '#src/ui/chart/linearScale.ts';
import { niceTicks } from '#src/ui/chart/niceTicks.ts';
import { linePath } from '#src/ui/chart/paths.ts';
import { textWidth } from '#src/ui/chart/textWidth.ts';
import { markRows } from '#src/ui/chart/trace/markRows.ts';
import { thinned } from '#src/ui/chart/trace/thinned.ts';
import type { Trace } from '#src/ui/chart/trace/trace.ts';
import { plainNumber } from '#src/ui/words/numberWords.ts';

const FONT = 13;
const ROW = 16;

/** A curve with its moments marked, at one size. */
function TraceSvg({ trace, width, height }: { trace: Trace; width: number; height: number }) {
  const { says, xUnit, yUnit, lines, marks, trueShape = false } = trace;
  const all = lines.flatMap(({ points }) => points);
  const xs = all.map(([x]) => x);
  const ys = all.map(([, y]) => y);
  const [xFrom, xTo] = [least(xs), greatest(xs)];
  const yTicks = niceTicks(Math.min(0, least(ys)), Math.max(greatest(ys), trueShape ? (xTo - xFrom) / 5 : 0), 4);
  const xTicks = niceTicks(xFrom, xTo, width > 500 ? 6 : 4).filter((tick) => tick >= xFrom && tick <= xTo);
  const digits = decimalsOf(yTicks);
  const left = 12 + Math.max(...yTicks.map((tick) => textWidth(plainNumber(tick, digits), FONT)));
  const labelled = lines.some(({ label }) => label);
  const right = width - (labelled ? 8 + Math.max(...lines.map(({ label = '' }) => textWidth(label, FONT))) : 4);
  const x = linearScale([xFrom, xTo], [left, right]);
  const placed = markRows(
    marks.map(({ at, label }) => ({ x: x(at), label })),
    width,
    FONT,
  );
  const top = 32 + ROW * placed.reduce((most, { row }) => Math.max(most, row + 1), 0);
  const bottom = height - 22;
  const y = linearScale([yTicks[0]!, yTicks.at(-1)!], [bottom, top]);
  return (
    <svg className="chart trace" viewBox={`0 0 ${width} ${height}`} role="img" aria-label={says} fontSize={FONT}>
      {yTicks.map((tick) => (
        <g key={tick}>
          <path className="rule" d={`M${left},${y(tick)}H${right}`} />
          <text className="t-soft" x={left - 6} y={y(tick) + 4} textAnchor="end">
            {plainNumber(tick, digits)}
          </text>
        </g>
      ))}
      <text className="t-soft" x={0} y={FONT}>
        {yUnit}
      </text>
      {xTicks.map((tick) => (
        <text key={tick} className="t-soft" x={x(tick)} y={height - 5} textAnchor={tick === xFrom ? 'start' : 'middle'}>
          {plainNumber(tick, decimalsOf(xTicks))}
          {tick === xTicks.at(-1) && ` ${xUnit}`}
        </text>
      ))}
      {placed.map(({ x: at, label, row, anchor }) => (
        <g key={`${label} ${at}`}>
          <path className="trace-mark" d={`M${at},${23 + ROW * row}V${bottom}`} />
          <text x={at + (anchor === 'start' ? 4 : -4)} y={21 + ROW * row + FONT} textAnchor={anchor}>
            {label}
          </text>
        </g>
      ))}
      {lines.map(({ points, look, label }) => {
        const shown = thinned(points, Math.round(right - left)).map(([px, py]) => ({ x: x(px), y: y(py) }));
        return (
          <g key={`${look} ${label ?? ''}`}>
            <path className={`trace-${look}`} d={linePath([shown])} />
            {label && (
              <text className={`t-end t-${look}`} x={right + 6} y={(shown.at(-1)?.y ?? 0) + 4}>
                {label}
              </text>
            )}
          </g>
        );
      })}
    </svg>
  );
}

/** A curve drawn in two sizes; the width of the place decides which one shows. */
export function TracePlot({ trace, tall = false }: { trace: Trace; tall?: boolean }) {
  if (trace.lines.every(({ points }) => points.length < 2)) return null;
  return (
    <div className="plot">
      <div className="plot-narrow">
        <TraceSvg trace={trace} width={328} height={tall ? 250 : 160} />
      </div>
      <div className="plot-wide">
        <TraceSvg trace={trace} width={640} height={tall ? 280 : 170} />
      </div>
    </div>
  );
}

// A long curve has more points than a call has room for arguments.
const least = (values: readonly number[]) => values.reduce((a, b) => Math.min(a, b), Infinity);
const greatest = (values: readonly number[]) => values.reduce((a, b) => Math.max(a, b), -Infinity);

function decimalsOf(ticks: readonly number[]): number {
  return Math.max(...ticks.map((tick) => (String(tick).split('.')[1] ?? '').length));
}
