import { Radar, type GridLabelProps, type RadarCustomLayerProps } from '@nivo/radar';
import { spreadLabels } from '#src/ui/chart/spreadLabels.ts';
import { CHART_THEME, SERIES_LOOK, type SeriesKind } from '#src/ui/charts/chartTheme.ts';
import { SeriesPoint } from '#src/ui/charts/SeriesPoint.tsx';

export interface RadarChartProps {
  /** Short names of the axes, from the top clockwise; at least three. */
  axes: readonly string[];
  /** One value an axis, all in one unit (percent of the squad's median), so that the axes compare. */
  series: readonly { kind: SeriesKind; label: string; values: readonly number[] }[];
  /** The drawing in words. */
  says: string;
  unit: string;
  /** The rings, least first; the last is the outer edge. */
  rings?: readonly number[];
  width?: number;
  height?: number;
}

type Datum = Record<string, string | number>;

/**
 * Lead and trail over several tests, each axis in percent of one reference. The centre is 0: a shape's size is honest,
 * and differences are small, so the table beside it says them. Give it no client directive.
 */
export function RadarChart({ axes, series, says, unit, rings, width = 328, height = 300 }: RadarChartProps) {
  if (axes.length < 3) return null;
  const data: Datum[] = axes.map((axis, i) => ({
    axis,
    ...Object.fromEntries(series.map(({ label, values }) => [label, values[i]!])),
  }));
  const most = Math.max(...series.flatMap(({ values }) => values));
  const levels = rings ?? [50, 100, Math.max(125, Math.ceil(most / 25) * 25)];
  const highest = levels.at(-1)!;
  return (
    <div className="plot">
      <Radar
        width={width}
        height={height}
        margin={{ top: 34, right: 54, bottom: 30, left: 54 }}
        data={data}
        keys={series.map(({ label }) => label)}
        indexBy="axis"
        maxValue={highest}
        gridShape="linear"
        gridLevels={1}
        gridLabelOffset={14}
        gridLabel={AxisName}
        theme={CHART_THEME}
        colors="var(--ink)"
        layers={['grid', Shapes]}
        animate={false}
        isInteractive={false}
        renderWrapper={false}
        role="img"
        ariaLabel={says}
      />
    </div>
  );

  function Shapes({ centerX, centerY, radiusScale, angleStep }: RadarCustomLayerProps<Datum>) {
    const at = (value: number, i: number) => {
      const angle = i * angleStep - Math.PI / 2;
      return { x: radiusScale(value) * Math.cos(angle), y: radiusScale(value) * Math.sin(angle) };
    };
    const outline = (values: readonly number[]) =>
      `M${values.map((value, i) => `${at(value, i).x.toFixed(1)},${at(value, i).y.toFixed(1)}`).join('L')}Z`;
    const labelYs = spreadLabels(
      series.map(({ values }) => at(values[0]!, 0).y),
      16,
      [-radiusScale(highest) - 8, 0],
    );
    const labelX = radiusScale(highest) * 0.46;
    return (
      <g transform={`translate(${centerX} ${centerY})`}>
        {levels.map((level) => (
          <path key={level} d={outline(axes.map(() => level))} fill="none" stroke="var(--rule)" />
        ))}
        {series.map(({ kind, label, values }) => (
          <path
            key={label}
            d={outline(values)}
            fill="none"
            stroke={SERIES_LOOK[kind].colour}
            strokeWidth={2.5}
            strokeDasharray={SERIES_LOOK[kind].dash}
          />
        ))}
        {series
          .filter(({ kind }) => kind !== 'other')
          .flatMap(({ kind, label, values }) =>
            values.map((value, i) => (
              <SeriesPoint key={`${label} ${axes[i]}`} kind={kind} {...at(value, i)} size={8} />
            )),
          )}
        {levels.map((level) => (
          <text
            key={level}
            x={-9}
            y={at(level, 0).y + 4}
            textAnchor="end"
            fontSize={12.5}
            fill="var(--soft)"
            stroke="var(--paper)"
            strokeWidth={4}
            paintOrder="stroke"
          >
            {level === highest ? `${level} ${unit}` : level}
          </text>
        ))}
        {series.map(({ kind, label, values }, i) => (
          <g key={label}>
            <path
              d={`M9,${at(values[0]!, 0).y.toFixed(1)}L${labelX - 5},${labelYs[i]!.toFixed(1)}`}
              stroke="var(--edge)"
              fill="none"
            />
            <text x={labelX} y={labelYs[i]! + 4.5} fontSize={14} fontWeight={600} fill={SERIES_LOOK[kind].colour}>
              {label}
            </text>
          </g>
        ))}
      </g>
    );
  }
}

function AxisName({ id, anchor, x, y, angle }: GridLabelProps) {
  const words = id.split(' ');
  const half = Math.ceil(words.length / 2);
  const lines =
    id.length > 12 && words.length > 1 ? [words.slice(0, half).join(' '), words.slice(half).join(' ')] : [id];
  // Above the middle the lines grow upwards, below it downwards.
  const start = y - (angle < 0 ? (lines.length - 1) * 15 : 0) + (angle > 0 ? 8 : 0);
  return (
    <text textAnchor={anchor} fontSize={13} fill="var(--ink)">
      {lines.map((line, i) => (
        <tspan key={line} x={x} y={start + i * 15}>
          {line}
        </tspan>
      ))}
    </text>
  );
}
