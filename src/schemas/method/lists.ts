import { z } from 'zod';
import { LARGEST } from '#src/schemas/method/numbers.ts';

interface NumberListRules {
  /** What to say of an empty or missing list. */
  empty: string;
  /** Fewest numbers, default 1. */
  least?: number;
  /** Most numbers. */
  most: number;
  min?: number;
  max?: number;
}

const ENOUGH_ISSUES = 20;

/**
 * A list of finite numbers. Checked in one plain pass that stops at the twentieth wrong one, since a body of 2 MB can
 * hold a million.
 */
export function numberList({ empty, least = 1, most, min = -LARGEST, max = LARGEST }: NumberListRules) {
  return z
    .custom<number[]>()
    .check((context) => {
      const list: unknown = context.value;
      const wrong = (message: string, path: number[] = []) =>
        context.issues.push({ code: 'custom', message, path, input: list, continue: false });
      if (list === undefined) return void wrong(empty);
      if (!Array.isArray(list)) return void wrong('Give a list of numbers');
      if (list.length < least) return void wrong(list.length === 0 ? empty : `Give at least ${least} numbers`);
      if (list.length > most) return void wrong(`Give ${most} numbers at most`);
      let count = 0;
      for (let i = 0; i < list.length && count < ENOUGH_ISSUES; i += 1) {
        const problem = problemOf(list[i], min, max);
        if (problem === null) continue;
        wrong(problem, [i]);
        count += 1;
      }
    })
    .meta({ type: 'array', items: { type: 'number', minimum: min, maximum: max }, minItems: least, maxItems: most });
}

function problemOf(value: unknown, min: number, max: number): string | null {
  if (typeof value !== 'number' || !Number.isFinite(value)) return 'Give a number';
  if (value < min) return `Give ${min} or more`;
  return value > max ? `Give ${max} or less` : null;
}

/**
 * A list of rows, counted before any row is looked at.
 *
 * @param empty what to say of an empty or missing list
 */
export function rowList<T extends z.ZodType>(
  row: T,
  { empty, least = 1, most }: { empty: string; least?: number; most: number },
) {
  return z
    .custom<z.input<T>[]>()
    .check((context) => {
      const list: unknown = context.value;
      const wrong = (message: string) =>
        context.issues.push({ code: 'custom', message, path: [], input: list, continue: false });
      if (list === undefined) wrong(empty);
      else if (!Array.isArray(list)) wrong('Give a list');
      else if (list.length < least) wrong(list.length === 0 ? empty : `Give at least ${least} rows`);
      else if (list.length > most) wrong(`Give ${most} rows at most`);
    })
    .pipe(z.array(row).min(least).max(most));
}
