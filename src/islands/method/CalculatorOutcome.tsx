import type { Outcome } from '#src/islands/method/useCalculator.ts';
import { TracePlot } from '#src/ui/chart/trace/TracePlot.tsx';
import { FigureTable } from '#src/ui/method/FigureTable.tsx';
import { tracesOf } from '#src/ui/method/tracesOf.ts';
import { figureRows } from '#src/ui/words/figureRows.ts';

interface Props {
  name: string;
  labels: Readonly<Record<string, string>>;
  outcome: Outcome;
}

/** What a calculator found: the reason where something cannot be given, the drawing where there is one, the figures. */
export function CalculatorOutcome({ name, labels, outcome: { request, answer } }: Props) {
  const { reason } = answer as { reason?: string | null };
  return (
    <>
      {reason && <p className="say">Not everything can be given. {sentence(reason)}</p>}
      {tracesOf(name, request, answer).map((trace, i) => (
        <TracePlot key={trace.yUnit} trace={trace} tall={i === 0} />
      ))}
      <FigureTable caption="Worked out from what you entered" rows={figureRows(answer, labels)} />
    </>
  );
}

const sentence = (text: string) => `${text.charAt(0).toUpperCase()}${text.slice(1)}${text.endsWith('.') ? '' : '.'}`;
