import { bandPath, linePath } from '#src/ui/chart/paths.ts';
import { runs } from '#src/ui/chart/runs.ts';
import { spreadLabels } from '#src/ui/chart/spreadLabels.ts';
import { SERIES_LOOK } from '#src/ui/charts/chartTheme.ts';
import type { LayerProps, PlotDatum } from '#src/ui/charts/LinePlot.tsx';
import { SeriesPoint } from '#src/ui/charts/SeriesPoint.tsx';

// What nivo hands to a custom layer has passed its own copies; the scales are the part that we take from it.
function placed({ data, xScale, yScale }: LayerProps) {
  const y = (value: number) => Number(yScale(value));
  return data.map(({ kind, label, data: points }) => ({
    kind,
    label,
    runs: runs(points.map((point) => (point.y === null ? null : at(point, point.y)))),
  }));

  function at({ x, interval }: PlotDatum, value: number) {
    return {
      x: Number(xScale(x)),
      y: y(value),
      upper: interval ? y(interval[1]) : null,
      lower: interval ? y(interval[0]) : null,
    };
  }
}

/** 90 % intervals: a whisker a point, or a band along the line. */
export function Intervals({ as, ...layer }: LayerProps & { as: 'whiskers' | 'band' }) {
  return placed(layer).map(({ kind, label, runs: parts }) => {
    const { colour } = SERIES_LOOK[kind];
    const sure = parts.map((run) =>
      run.flatMap(({ x, upper, lower }) => (upper === null || lower === null ? [] : [{ x, upper, lower }])),
    );
    if (as === 'band') return <path key={label} d={bandPath(sure)} fill={colour} fillOpacity={0.15} />;
    return sure
      .flat()
      .map(({ x, upper, lower }) => (
        <line key={`${label} ${x}`} x1={x} x2={x} y1={upper} y2={lower} stroke={colour} strokeWidth={1.5} />
      ));
  });
}

/** The lines, broken where a value is missing. */
export function Lines(layer: LayerProps) {
  return placed(layer).map(({ kind, label, runs: parts }) => {
    const { colour, dash } = SERIES_LOOK[kind];
    return (
      <path key={label} d={linePath(parts)} fill="none" stroke={colour} strokeWidth={2.5} strokeDasharray={dash} />
    );
  });
}

/** The points. */
export function Points(layer: LayerProps) {
  return placed(layer).flatMap(({ kind, label, runs: parts }) =>
    parts.flat().map(({ x, y }) => <SeriesPoint key={`${label} ${x}`} kind={kind} x={x} y={y} />),
  );
}

/** Each line's name at its end, in place of a legend. */
export function Ends(layer: LayerProps) {
  const lines = placed(layer).flatMap(({ kind, label, runs: parts }) => {
    const last = parts.at(-1)?.at(-1);
    return last ? [{ kind, label, y: last.y }] : [];
  });
  const ys = spreadLabels(
    lines.map(({ y }) => y),
    17,
    [0, layer.innerHeight],
  );
  return lines.map(({ kind, label }, i) => (
    <text
      key={label}
      x={layer.innerWidth + 11}
      y={ys[i]! + 4.5}
      fontSize={14}
      fontWeight={600}
      fill={SERIES_LOOK[kind].colour}
    >
      {label}
    </text>
  ));
}

/** Named moments as thin upright lines; a name goes up a row where it would run into the one before. */
export function Events({
  events,
  xScale,
  innerHeight,
  innerWidth,
}: LayerProps & { events: readonly { x: number; label: string }[] }) {
  const ends = [-Infinity, -Infinity];
  return events.map(({ x, label }) => {
    const at = Number(xScale(x));
    const half = label.length * 3.2;
    const middle = Math.max(half, Math.min(innerWidth + 20 - half, at));
    const row = ends.findIndex((end) => middle - half > end + 8);
    if (row >= 0) ends[row] = middle + half;
    return (
      <g key={label}>
        <line x1={at} x2={at} y1={row === 1 ? -18 : -4} y2={innerHeight} stroke="var(--edge)" strokeDasharray="2 3" />
        {row >= 0 && (
          <text
            x={middle}
            y={row === 1 ? -23 : -8}
            textAnchor="middle"
            fontSize={12.5}
            fill="var(--soft)"
            stroke="var(--paper)"
            strokeWidth={4}
            paintOrder="stroke"
          >
            {label}
          </text>
        )}
      </g>
    );
  });
}
