/** Most points a trend takes: every pair is looked at, two million of them here. */
export const TREND_MOST_POINTS = 2000;
