import { LinePlot, type LinePlotProps } from '#src/ui/charts/LinePlot.tsx';

export type LineChartProps = Omit<LinePlotProps, 'width' | 'height'> & {
  /** Sizes of the two drawings; the width of the place decides which one shows. */
  sizes?: { narrow: readonly [number, number]; wide: readonly [number, number] };
};

// Up to here a drawing fits the half of a page (see chart.css).
const SMALL_WIDTH = 540;

/** A line chart drawn on the server, in two sizes, so that its words are never shrunk. Give it no client directive. */
export function LineChart({ sizes = { narrow: [328, 240], wide: [640, 300] }, ...plot }: LineChartProps) {
  const fits = sizes.narrow[0] === sizes.wide[0];
  return (
    <div className={sizes.wide[0] <= SMALL_WIDTH ? 'plot small' : 'plot'}>
      {!fits && (
        <div className="plot-narrow">
          <LinePlot {...plot} width={sizes.narrow[0]} height={sizes.narrow[1]} />
        </div>
      )}
      <div className={fits ? undefined : 'plot-wide'}>
        <LinePlot {...plot} width={sizes.wide[0]} height={sizes.wide[1]} />
      </div>
    </div>
  );
}
