import { describe, expect, it } from 'vitest';
import { changedInput } from '#src/domain/outrun/changedInput.ts';
import { clearsWhen } from '#src/domain/outrun/clearsWhen.ts';
import { impossibleBefore } from '#src/domain/outrun/impossibleBefore.ts';
import { judgeCriteria } from '#src/domain/outrun/judgeCriteria.ts';
import { isClear } from '#src/domain/outrun/level.ts';
import { smallestChanges } from '#src/domain/outrun/smallestChanges.ts';
import { W1, W2, W3, W7, W8, W9 } from '#tests/unit/domain/outrun/workedExamples.ts';

const flags = [
  { name: 'W1+W3', input: { ...W1, ...W3 } },
  { name: 'W2+W7', input: { ...W2, ...W7 } },
  { name: 'W2+W8+W9', input: { ...W2, ...W8, ...W9 } },
  { name: 'W1+W3+W7+W9', input: { ...W1, ...W3, ...W7, ...W9 } },
];

describe.each(flags)('$name', ({ input }) => {
  const clear = (change: object) => isClear(judgeCriteria(changedInput(input, change)));

  it('each change clears when judged again, and no tenth of a per cent less of any part does', () => {
    const changes = smallestChanges(input);
    expect(changes.length).toBeGreaterThan(0);
    for (const change of changes) {
      expect(clear(change)).toBe(true);
      for (const [lever, amount] of Object.entries(change))
        expect(clear({ ...change, [lever]: amount - 1 })).toBe(false);
    }
  });

  it('says them as plain sentences with figures', () => {
    const sentences = clearsWhen(input);
    expect(sentences.length).toBeGreaterThan(1);
    for (const sentence of sentences) expect(sentence).toMatch(/^[A-Z].*\.$/);
    expect(sentences[0]).toMatch(/\d/);
    expect(sentences.at(-1)).toContain('two testing days running');
  });
});

it('says nothing where there is no level', () => {
  expect(clearsWhen(W1)).toEqual([]);
  expect(clearsWhen({})).toEqual([]);
});

it('W2+W7: the smallest swing alone is found as a brute search over hundredths finds it', () => {
  const input = { ...W2, ...W7 };
  const swing = smallestChanges(input).find((change) => Object.keys(change).join() === 'swing')!.swing!;
  let brute = 0;
  while (!isClear(judgeCriteria(changedInput(input, { swing: brute })))) brute += 1;
  expect(swing).toBe(brute);
});

it('names the tests when it knows them, rounded so that the figure is enough', () => {
  const newestLead = [{ test: 'push', mean: 505, unit: ' N', decimals: 0 }];
  const [first] = clearsWhen({ ...W2, ...W7 }, { newestLead });
  const lead = smallestChanges({ ...W2, ...W7 })[0]!.lead!;
  expect(first).toContain(`push about ${Math.ceil(505 * (1 + lead / 1000))} N, now 505 N`);
});

it('leaves the input as it is', () => {
  const input = { ...W1, ...W3, ...W7, ...W9 };
  const before = JSON.stringify(input);
  clearsWhen(input);
  expect(JSON.stringify(input)).toBe(before);
});

describe('impossibleBefore (our own rule)', () => {
  const W1_LEVEL_AFTER = (testingDays: number) => {
    const level = W1.leadDeficit.values.slice(-3).map((value) => ({ ...value, lead: value.trail }));
    return testingDays === 1 ? [...W1.leadDeficit.values.slice(-3), ...level] : [...level, ...level];
  };

  it('W1 by hand: one level day halves −7 to about −3.5, above −4; the carry still needs two', () => {
    // q of the newest two exceed the earlier mean by 11.8; with one explained carry the mean of the newest two still
    // exceeds an earlier mean that has risen: 14.6/2 − 9.1/4 ≈ 5, met; with the deficit gone one point is left
    const one = impossibleBefore({ ...W1, ...W3 }, '2026-05-09', { valuesAfter: W1_LEVEL_AFTER });
    expect(one).toEqual({ testingDays: 1, date: null });
  });

  it('takes the planned testing day', () => {
    const known = { valuesAfter: W1_LEVEL_AFTER, plannedTestingDays: ['2027-01-16', '2026-09-12', '2026-05-09'] };
    expect(impossibleBefore({ ...W1, ...W3 }, '2026-05-09', known)?.date).toBe('2026-09-12');
  });

  it('a deeper deficit stands after one level day, and takes two: 21 days apart without a plan', () => {
    const deep = W1.leadDeficit.values.map((value) => ({ ...value, lead: value.lead * 0.85 }));
    const after = (days: number) =>
      days === 1
        ? [...deep.slice(-3), ...deep.slice(-3).map((value) => ({ ...value, lead: value.trail }))]
        : deep.map((value) => ({ ...value, lead: value.trail }));
    const input = { ...W3, leadDeficit: { values: deep } };
    const two = impossibleBefore(input, '2026-05-09', { valuesAfter: after });
    expect(two).toEqual({ testingDays: 2, date: '2026-05-30' });
    const sentences = clearsWhen(input, { asOf: '2026-05-09', valuesAfter: after });
    expect(sentences).toContain(
      'Data already taken keep their points until two more testing days have replaced them: not before 30 May 2026.',
    );
  });
});
