import type { SeriesKind } from '#src/ui/charts/chartTheme.ts';

export interface ChartPoint {
  /** A number, or a date as YYYY-MM-DD where the x axis is of dates. */
  x: number | string;
  /** `null` leaves a gap. */
  y: number | null;
  /** 90 % interval of y. */
  interval?: readonly [number, number] | null;
}

export interface ChartSeries {
  kind: SeriesKind;
  /** Stands at the end of the line. */
  label: string;
  points: readonly ChartPoint[];
}

/** A moment on the x axis with its name: an event of a swing. */
export interface ChartEvent {
  x: number | string;
  label: string;
}
