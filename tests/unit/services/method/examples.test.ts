import { describe, expect, it } from 'vitest';
import { CALCULATOR_NAMES } from '#src/schemas/method/calculatorNames.ts';
import { bodyOf } from '#src/schemas/method/form/bodyOf.ts';
import { textsOf } from '#src/schemas/method/form/textsOf.ts';
import { CALCULATORS } from '#src/services/method/calculators.ts';
import { listCalculators } from '#src/services/method/listCalculators.ts';
import { runCalculator } from '#src/services/method/runCalculator.ts';

const valueAt = (answer: unknown, path: string): unknown =>
  path.split('.').reduce<unknown>((part, key) => (part as Record<string, unknown>)[key], answer);

const answers = new Map<string, object>();
for (const name of CALCULATOR_NAMES) {
  const { schema, page } = CALCULATORS[name];
  answers.set(name, await runCalculator(CALCULATORS[name], schema.parse(page.example.request) as object));
}

describe.each(CALCULATOR_NAMES)('the worked example of %s', (name) => {
  const { schema, page } = CALCULATORS[name];
  const answer = answers.get(name);

  // The value, its tolerance and its source stand beside each other in the page's content, where readers see them too.
  it.each(page.example.published)('$path is $value: $source', ({ path, value, tolerance, source }) => {
    const found = valueAt(answer, path);
    expect(source).not.toBe('');
    if (typeof value !== 'number') expect(found).toBe(value);
    else expect(Math.abs((found as number) - value)).toBeLessThanOrEqual(tolerance * (Math.abs(value) || 1));
  });

  it('is a request that the form writes and reads back', () => {
    const texts = textsOf(page.fields, page.example.request);
    expect(schema.parse(bodyOf(page.fields, texts))).toEqual(withoutNulls(page.example.request));
  });

  it('has words, formulas, tagged sources and limits', () => {
    for (const list of [page.purpose, page.formulas, page.sources, page.limits, page.fields, page.example.published]) {
      expect(list.length).toBeGreaterThan(0);
    }
  });
});

/** A form leaves out what is not known; the API also takes null. */
function withoutNulls(value: unknown): unknown {
  return JSON.parse(JSON.stringify(value, (_, part: unknown) => (part === null ? undefined : part)));
}

it('lists every calculator once', () => {
  const names = listCalculators().map(({ name }) => name);
  expect([...names].sort()).toEqual([...CALCULATOR_NAMES].sort());
});
