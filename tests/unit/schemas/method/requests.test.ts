import { describe, expect, it } from 'vitest';
import { AppError } from '#src/errors/appError.ts';
import { parse } from '#src/http/parseBody.ts';
import { CALCULATOR_NAMES } from '#src/schemas/method/calculatorNames.ts';
import { CALCULATORS } from '#src/services/method/calculators.ts';
import { BAD, GOOD } from '#tests/unit/schemas/method/bodies.ts';

/** What a request with this text as its body is refused for: paths and messages, or none. */
function refusalsOf(name: keyof typeof CALCULATORS, text: string): { path: string; message: string }[] {
  try {
    parse(JSON.parse(text), CALCULATORS[name].schema);
    return [];
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    return [...error.fields];
  }
}

describe.each(CALCULATOR_NAMES)('a request of %s', (name) => {
  const good = GOOD[name];
  const whole = good[0]!;

  it.each(good.map((body) => [JSON.stringify(body), body]))('may be %s', (text, body) => {
    expect(parse(JSON.parse(text), CALCULATORS[name].schema)).toEqual(body);
  });

  // The number that JSON can write and a double cannot hold comes as text.
  it.each(BAD[name].map(([text, ...paths]) => [text, paths] as const))('may not be %s', (text, paths) => {
    const refusals = refusalsOf(name, text);
    expect(refusals.map(({ path }) => path)).toEqual(paths);
    for (const { message } of refusals) expect(message).toMatch(/^[A-Z][^{}]*[^.]$/);
  });

  it('has no field beside its own', () => {
    expect(refusalsOf(name, JSON.stringify({ ...whole, more: 1 }))).toEqual([
      { path: 'more', message: 'There is no such field' },
    ]);
    const polluting = `{"__proto__":{"a":1},${JSON.stringify(whole).slice(1)}`;
    expect(refusalsOf(name, polluting).map(({ path }) => path)).toEqual(['__proto__']);
  });

  it.each(['null', '[]', '1', '"text"', 'true'])('is not %s', (text) => {
    expect(refusalsOf(name, text)).toHaveLength(1);
  });
});

it('a wrong list of a million numbers is refused for its first ones', () => {
  const text = JSON.stringify({ sampleRate: 1000, force: Array.from({ length: 500_000 }, () => null) });
  expect(refusalsOf('jump-curve', text).map(({ path }) => path)).toEqual(
    Array.from({ length: 20 }, (_, i) => `force.${i}`),
  );
});

it('a body that is wrong all over is refused for a hundred of its fields', () => {
  const body = Object.fromEntries(Array.from({ length: 5000 }, (_, i) => [`k${i}`, 1]));
  expect(refusalsOf('week-change', JSON.stringify(body))).toHaveLength(100);
});
