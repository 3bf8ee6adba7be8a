import type { CalculatorName } from '#src/schemas/method/calculatorNames.ts';

/** What came back: the figures, or what is wrong and where. */
export type CalculatorReply =
  { answer: object; errors: null } | { answer: null; errors: readonly { path: string; message: string }[] };

interface Problem {
  title?: string;
  detail?: string;
  errors?: { path: string; message: string }[];
}

/** Asks the Method API. Never throws: what goes wrong on the way comes back as an error of the whole. */
export async function callCalculator(name: CalculatorName, body: unknown): Promise<CalculatorReply> {
  try {
    const response = await fetch(`/api/method/${name}`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify(body),
    });
    const said: unknown = await response.json();
    if (response.ok) return { answer: said as object, errors: null };
    const { errors, detail, title } = said as Problem;
    const whole = { path: '', message: detail ?? title ?? 'It could not be worked out' };
    return { answer: null, errors: errors && errors.length > 0 ? errors : [whole] };
  } catch {
    const message = 'The server could not be reached. What you entered is still here.';
    return { answer: null, errors: [{ path: '', message }] };
  }
}
