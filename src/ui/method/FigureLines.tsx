/** A figure in its lines, or a dash that is read out as none. */
export function FigureLines({ lines }: { lines: readonly string[] }) {
  if (lines.length > 0) return lines.map((line) => <div key={line}>{line}</div>);
  return (
    <span className="soft">
      <span aria-hidden="true">–</span>
      <span className="sr-only">none</span>
    </span>
  );
}
