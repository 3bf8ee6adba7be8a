import { Line, type LineCustomSvgLayerProps } from '@nivo/line';
import { dayNumber } from '#src/domain/calendar/dayNumber.ts';
import { dateTicks } from '#src/ui/chart/dateTicks.ts';
import { niceTicks } from '#src/ui/chart/niceTicks.ts';
import { CHART_THEME, type SeriesKind } from '#src/ui/charts/chartTheme.ts';
import { Ends, Events, Intervals, Lines, Points } from '#src/ui/charts/lineLayers.tsx';
import type { ChartEvent, ChartSeries } from '#src/ui/charts/lineSeries.ts';

export interface LinePlotProps {
  series: readonly ChartSeries[];
  /** The drawing in words. */
  says: string;
  yUnit: string;
  /** Names the x axis where it is not of dates: `s from takeaway`. */
  xUnit?: string;
  xKind?: 'date' | 'number';
  /** Whiskers for measured days, a band for a curve of many samples. */
  intervals?: 'whiskers' | 'band';
  /** Points are left out of curves of many samples. */
  points?: boolean;
  events?: readonly ChartEvent[];
  /** Values that must be on the y axis. */
  yHolds?: readonly number[];
  width: number;
  height: number;
}

/** A datum as nivo carries it through to our layers. */
export interface PlotDatum {
  x: number;
  y: number | null;
  interval: readonly [number, number] | null;
}

export interface PlotSeries {
  id: string;
  kind: SeriesKind;
  label: string;
  data: PlotDatum[];
}

export type LayerProps = LineCustomSvgLayerProps<PlotSeries>;

/** A nivo line of one fixed size: its scales, grid and axes, with our own lines, points, intervals and labels on them. */
export function LinePlot(props: LinePlotProps) {
  const {
    series,
    says,
    yUnit,
    xUnit,
    xKind = 'date',
    intervals = 'whiskers',
    points = true,
    events = [],
    width,
    height,
  } = props;
  const place = (x: number | string) => (typeof x === 'string' ? dayNumber(x) : x);
  const data: PlotSeries[] = series.map((one, i) => ({
    id: `${i}`,
    kind: one.kind,
    label: one.label,
    data: one.points.map(({ x, y, interval = null }) => ({ x: place(x), y, interval })),
  }));
  const all = data.flatMap((one) => one.data).filter(({ y }) => y !== null);
  if (all.length === 0) return <p className="soft">no value yet</p>;
  const xs = all.map(({ x }) => x);
  const ys = [...all.flatMap(({ y, interval }) => [y!, ...(interval ?? [])]), ...(props.yHolds ?? [])];
  const y = niceTicks(Math.min(...ys), Math.max(...ys), height < 260 ? 4 : 5);
  const x = { low: Math.min(...xs), high: Math.max(...xs) };
  // The first day's whisker must not stand on the axis's own numbers; a curve fills its axis.
  const roomX = x.high === x.low ? 1 : points ? (x.high - x.low) * 0.03 : 0;
  const xTicks = xKind === 'date' ? datesOf(series, width) : numbersOf(x, width);
  const digits = Math.max(...y.map((tick) => (String(tick).split('.')[1] ?? '').length));
  const longest = Math.max(...series.map(({ label }) => label.length));
  return (
    <Line
      width={width}
      height={height}
      margin={{ top: events.length > 0 ? 58 : 28, right: 14 + longest * 7.4, bottom: xUnit ? 46 : 28, left: 44 }}
      data={data}
      xScale={{ type: 'linear', min: x.low - roomX, max: x.high + roomX }}
      yScale={{ type: 'linear', min: y[0]!, max: y.at(-1)! }}
      theme={CHART_THEME}
      colors="var(--ink)"
      enableGridX={false}
      gridYValues={y}
      axisLeft={{
        tickValues: y,
        tickSize: 0,
        tickPadding: 8,
        format: (v) => Number(v).toFixed(digits).replace('-', '−'),
      }}
      axisBottom={{
        tickValues: xTicks.map(({ at }) => at),
        tickSize: 0,
        tickPadding: 10,
        format: (v) => xTicks.find(({ at }) => at === v)?.label ?? '',
        ...(xUnit ? { legend: xUnit, legendOffset: 36, legendPosition: 'middle' as const } : {}),
      }}
      layers={[
        'grid',
        'axes',
        () => (
          <text x={-44} y={events.length > 0 ? -42 : -14} fontSize={13} fill="var(--soft)">
            {yUnit}
          </text>
        ),
        (layer: LayerProps) => <Events {...layer} events={events.map(({ x, label }) => ({ x: place(x), label }))} />,
        (layer: LayerProps) => <Intervals {...layer} as={intervals} />,
        Lines,
        ...(points ? [Points] : []),
        Ends,
      ]}
      animate={false}
      isInteractive={false}
      isFocusable={false}
      renderWrapper={false}
      role="img"
      ariaLabel={says}
    />
  );
}

function datesOf(series: readonly ChartSeries[], width: number): { at: number; label: string }[] {
  const dates = series.flatMap(({ points }) => points.map(({ x }) => String(x))).sort();
  const ticks = dateTicks(dates[0]!, dates.at(-1)!, Math.max(2, Math.floor(width / 62)));
  if (ticks.length > 0) return ticks.map(({ day, label }) => ({ at: day, label }));
  // All within one month: the days themselves.
  return [...new Set(dates)].map((date) => ({ at: dayNumber(date), label: date.slice(5) }));
}

function numbersOf({ low, high }: { low: number; high: number }, width: number): { at: number; label: string }[] {
  return niceTicks(low, high, Math.max(4, Math.floor(width / 90)))
    .filter((tick) => tick >= low && tick <= high)
    .map((at) => ({ at, label: String(at).replace('-', '−') }));
}
