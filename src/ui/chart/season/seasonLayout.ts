import { dayNumber } from '#src/domain/calendar/dayNumber.ts';
import { linearScale } from '#src/ui/chart/linearScale.ts';
import { spreadLabels } from '#src/ui/chart/spreadLabels.ts';
import { drawSeries, laneAxis, type Axis, type Drawn } from '#src/ui/chart/season/lane.ts';
import { outrunLane, type DrawnOutrun } from '#src/ui/chart/season/outrunLane.ts';
import type { Season, SeasonPoint } from '#src/ui/chart/season/season.ts';
import type { SeasonSize } from '#src/ui/chart/season/sizes.ts';
import { termBands, type TermBand } from '#src/ui/chart/season/termBands.ts';
import { plainNumber } from '#src/ui/words/numberWords.ts';

export type SeriesKind = 'carry' | 'lead' | 'trail' | 'growth';

export interface Lane {
  key: 'carry' | 'strength' | 'growth';
  name: string;
  unit: string;
  top: number;
  height: number;
  /** Null where nothing was measured: the lane then says `without`. */
  axis: Axis | null;
  without: string;
  series: { kind: SeriesKind; drawn: Drawn }[];
  ends: { kind: SeriesKind; y: number; text: string }[];
}

export interface SeasonLayout {
  size: SeasonSize;
  height: number;
  plot: { x1: number; x2: number; top: number; bottom: number };
  bands: TermBand[];
  lanes: Lane[];
  outruns: { y: number; drawn: DrawnOutrun[] } | null;
}

const ABOVE = 32;

/**
 * Every place of a Season line in one size: a shared time axis, one lane below the other.
 *
 * @param season in date order
 * @param size   one of SEASON_SIZES
 */
export function seasonLayout(season: Season, size: SeasonSize): SeasonLayout {
  const [from, to] = season.terms.length > 0 || dates(season).length > 0 ? span(season) : [0, 1];
  const plotEnd = size.width - size.right;
  const scale = linearScale([from, to], [size.left, plotEnd]);
  const x = (date: string) => scale(dayNumber(date));
  const starts = season.terms.map(({ startsOn }) => dayNumber(startsOn));
  const termOf = (date: string) =>
    Math.max(
      0,
      starts.findLastIndex((start) => start <= dayNumber(date)),
    );

  const top = size.font.small + 14;
  let next = top;
  const place = (height: number) => {
    const laneTop = next + (size.namesAbove ? ABOVE : 12);
    next = laneTop + height + size.gap;
    return laneTop;
  };
  const lane = (
    key: Lane['key'],
    words: { name: string; unit: string; without: string },
    series: readonly { kind: SeriesKind; points: readonly SeasonPoint[]; end: (point: SeasonPoint) => string }[],
    withZero = false,
  ): Lane => {
    const height = size.lane[key];
    const laneTop = place(height);
    const all = series.flatMap(({ points }) => points);
    const axis =
      all.length > 0 ? laneAxis(all, { top: laneTop, height, count: withZero ? 3 : size.ticks, withZero }) : null;
    const drawn = axis
      ? series.map(({ kind, points }) => ({ kind, drawn: drawSeries(points, { x, y: axis.y, termOf }) }))
      : [];
    const last = axis ? series.filter(({ points }) => points.length > 0) : [];
    const ys = spreadLabels(
      last.map(({ points }) => axis!.y(points.at(-1)!.value)),
      size.font.name + 2,
    );
    const ends = last.map(({ kind, points, end }, i) => ({ kind, y: ys[i]!, text: end(points.at(-1)!) }));
    return { key, ...words, top: laneTop, height, axis, series: drawn, ends };
  };

  const { strength } = season;
  const narrow = size.namesAbove;
  const lanes = [
    lane('carry', { name: 'Carry', unit: 'm, standard', without: 'no drives yet' }, [
      {
        kind: 'carry',
        points: season.carry,
        end: (point) => (narrow ? plainNumber(point.value) : `${withError(point, 0)} m`),
      },
    ]),
    lane(
      'strength',
      { name: strength?.name ?? 'Strength', unit: strength?.unit ?? '', without: 'not tested yet' },
      (['trail', 'lead'] as const).map((kind) => ({
        kind,
        points: strength?.[kind] ?? [],
        end: ({ value }) => (narrow ? kind : `${kind} ${plainNumber(value, strength?.digits ?? 1)}`),
      })),
    ),
    lane(
      'growth',
      { name: 'Growth', unit: 'cm a year', without: 'needs two heights, months apart' },
      [
        {
          kind: 'growth',
          points: season.growth,
          end: (point) => (narrow ? plainNumber(point.value, 1) : withError(point, 1)),
        },
      ],
      true,
    ),
  ];
  const outrunY = season.outruns ? place(size.lane.event) + size.lane.event / 2 : null;
  const bottom = next - size.gap + 10;
  return {
    size,
    height: bottom + 4,
    plot: { x1: size.left, x2: plotEnd, top, bottom },
    bands: termBands(season.terms, x, plotEnd, size.font.small),
    lanes,
    outruns:
      outrunY === null
        ? null
        : { y: outrunY, drawn: outrunLane(season.outruns!, { x, end: plotEnd, font: size.font.small }) },
  };
}

/** `185 ± 3`, where the interval stands even about the value. */
export function withError({ value, interval }: SeasonPoint, digits: number): string {
  const plain = plainNumber(value, digits);
  if (!interval) return plain;
  const [below, above] = [plainNumber(value - interval[0], digits), plainNumber(interval[1] - value, digits)];
  return below === above
    ? `${plain} ± ${above}`
    : `${plain}, ${plainNumber(interval[0], digits)} to ${plainNumber(interval[1], digits)}`;
}

function dates(season: Season): string[] {
  const { carry, strength, growth, outruns = [] } = season;
  const points = [...carry, ...(strength?.lead ?? []), ...(strength?.trail ?? []), ...growth];
  return [...points, ...outruns.flatMap(({ steps }) => steps)].map(({ on }) => on);
}

function span(season: Season): [number, number] {
  const days = [...season.terms.flatMap(({ startsOn, endsOn }) => [startsOn, endsOn]), ...dates(season)].map(dayNumber);
  return [Math.min(...days), Math.max(...days)];
}
