import { SERIES_LOOK, type SeriesKind } from '#src/ui/charts/chartTheme.ts';

/** A point of a series: lead a filled circle, trail an open square. */
export function SeriesPoint({ kind, x, y, size = 9 }: { kind: SeriesKind; x: number; y: number; size?: number }) {
  const { colour, shape } = SERIES_LOOK[kind];
  if (shape === 'circle') return <circle cx={x} cy={y} r={size / 2} fill={colour} />;
  return (
    <rect
      x={x - size / 2}
      y={y - size / 2}
      width={size}
      height={size}
      fill="var(--paper)"
      stroke={colour}
      strokeWidth={2}
    />
  );
}
