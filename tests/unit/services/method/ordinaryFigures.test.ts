import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { AppError } from '#src/errors/appError.ts';
import { CALCULATOR_NAMES } from '#src/schemas/method/calculatorNames.ts';
import { CALCULATORS } from '#src/services/method/calculators.ts';
import { runCalculator } from '#src/services/method/runCalculator.ts';
import { arbitraryOf, type Shape } from '#tests/unit/services/method/arbitraryRequest.ts';

/** The same body with figures that a person could mean: 0, or between a millionth and a million. */
function ordinary(value: unknown): unknown {
  if (typeof value === 'number') {
    const size = Math.abs(value);
    return size < 1e-6 ? 0 : Math.sign(value) * Math.min(size, 1e6);
  }
  if (Array.isArray(value)) return value.map(ordinary);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([key, part]) => [key, ordinary(part)]));
}

describe.each(CALCULATOR_NAMES)('%s', (name) => {
  const { schema, run } = CALCULATORS[name];
  const bodies = arbitraryOf(z.toJSONSchema(schema, { unrepresentable: 'any' }) as Shape).map(ordinary);

  // The service refuses an answer that is not finite. That is for figures beyond a double's reach, not for a formula
  // that was forgotten to be undefined somewhere: with ordinary figures it must never happen.
  it('needs no refusal of what is not finite', async () => {
    let answered = 0;
    await fc.assert(
      fc.asyncProperty(bodies, async (body) => {
        const parsed = schema.safeParse(JSON.parse(JSON.stringify(body)));
        if (!parsed.success) return;
        const answer: unknown = await runCalculator({ run }, parsed.data as object).catch((error: unknown) => {
          if (!(error instanceof AppError)) throw error;
          expect(error.message).not.toContain('too large or too small');
          return null;
        });
        if (answer !== null) answered += 1;
      }),
      { numRuns: 300 },
    );
    expect(answered).toBeGreaterThan(0);
  });
});
