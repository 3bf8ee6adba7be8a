import type { PartialTheme } from '@nivo/theming';

/** The tokens for nivo: variables of the style sheet, so that a drawing made on the server is right in both schemes. */
export const CHART_THEME: PartialTheme = {
  background: 'transparent',
  text: { fill: 'var(--ink)', fontFamily: 'var(--text)', fontSize: 13 },
  axis: {
    domain: { line: { stroke: 'transparent' } },
    ticks: { line: { stroke: 'transparent' }, text: { fill: 'var(--soft)', fontSize: 13 } },
    legend: { text: { fill: 'var(--soft)', fontSize: 13 } },
  },
  grid: { line: { stroke: 'var(--rule)', strokeWidth: 1 } },
};

export type SeriesKind = 'lead' | 'trail' | 'carry' | 'other';

/** How each kind of series is drawn. Lead and trail differ by fill, dash and shape as well as by colour. */
export const SERIES_LOOK: Readonly<Record<SeriesKind, { colour: string; dash?: string; shape: 'circle' | 'square' }>> =
  {
    lead: { colour: 'var(--marram)', shape: 'circle' },
    trail: { colour: 'var(--dune)', dash: '7 4', shape: 'square' },
    carry: { colour: 'var(--tide)', shape: 'circle' },
    other: { colour: 'var(--soft)', dash: '2 3', shape: 'circle' },
  };
