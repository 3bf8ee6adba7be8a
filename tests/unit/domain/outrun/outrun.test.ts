import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CRITERION_NAMES } from '#src/domain/outrun/criterion.ts';
import { CRITERION_LABELS } from '#src/domain/outrun/criterionLabels.ts';
import { CARRY_NOISE_WARNING } from '#src/domain/outrun/falseAlarms.ts';
import { judgeCriteria } from '#src/domain/outrun/judgeCriteria.ts';
import { levelOf } from '#src/domain/outrun/level.ts';
import { outrun } from '#src/domain/outrun/outrun.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';
import { DEFAULT_POLICY, type OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { criterionOf, W1, W2, W3, W4, W6, W7, W8, W9 } from '#tests/unit/domain/outrun/workedExamples.ts';

describe('levels of the worked examples (SCIENCE §9)', () => {
  it.each([
    { name: 'W1 alone', input: W1, level: null, points: 2, gate: false },
    { name: 'W1+W9', input: { ...W1, ...W9 }, level: null, points: 3, gate: false },
    { name: 'W3+W7+W9 without a deficit', input: { ...W3, ...W7, ...W9 }, level: null, points: 5, gate: false },
    { name: 'W2+W7', input: { ...W2, ...W7 }, level: 'look', points: 3, gate: true },
    { name: 'W2+W8+W9', input: { ...W2, ...W8, ...W9 }, level: 'look', points: 3, gate: true },
    { name: 'W1+W3', input: { ...W1, ...W3 }, level: 'act', points: 4, gate: true },
    // by hand: strong divergence less one for the demand that was measured and not met: 2 + 1
    { name: 'W1+W3+W6', input: { ...W1, ...W3, ...W6 }, level: 'look', points: 3, gate: true },
    { name: 'W2+W4+W6', input: { ...W2, ...W4, ...W6 }, level: null, points: 1, gate: false },
    { name: 'all', input: { ...W1, ...W3, ...W7, ...W9 }, level: 'act', points: 7, gate: true },
    { name: 'nothing', input: {}, level: null, points: 0, gate: false },
  ])('$name: $level ($points)', ({ input, level, points, gate }) => {
    const result = outrun(input);
    expect({ level: result.level, points: result.points, gate: result.gate }).toEqual({ level, points, gate });
    expect(result.reason === null).toBe(level !== null);
  });
});

describe('the level from the points alone (SCIENCE §9)', () => {
  const of = (deficit: number, divergence: number, demand: number, back: number, policy: Partial<OutrunPolicy> = {}) =>
    levelOf(
      [
        criterionOf('lead-deficit', deficit),
        criterionOf('divergence', divergence),
        criterionOf('demand', demand),
        criterionOf('late-return', back),
      ],
      { ...DEFAULT_POLICY, ...policy },
    ).level;

  it.each([
    { points: [1, 1, 0, 0], level: null },
    { points: [1, 1, 0, 1], level: 'look' },
    { points: [1, 1, 1, 1], level: 'look' },
    { points: [1, 2, 0, 1], level: 'look' },
    { points: [1, 2, 1, 1], level: 'act' },
    { points: [2, 1, 0, 1], level: 'look' },
    { points: [2, 1, 1, 0], level: 'look' },
    { points: [2, 0, 2, 0], level: 'act' },
    { points: [2, 2, 0, 0], level: 'act' },
    { points: [2, 1, 1, 1], level: 'act' },
    { points: [2, 0, 0, 1], level: null },
    { points: [0, 2, 2, 1], level: null },
  ] as const)('$points → $level', ({ points: [a, b, c, d], level }) => expect(of(a, b, c, d)).toBe(level));

  it('follows the policy, and gives no Act below Look', () => {
    expect(of(1, 1, 0, 0, { look: 2 })).toBe('look');
    expect(of(2, 2, 0, 0, { look: 5 })).toBe(null);
    expect(of(2, 2, 0, 1, { look: 5 })).toBe('act');
  });

  it('a strong divergence reduced to one point is no longer worth two: 2 + 1 + 0 + 1 is Look', () => {
    const criteria = [
      criterionOf('lead-deficit', 2),
      criterionOf('divergence', 1, 'strong'),
      criterionOf('demand', 0),
      criterionOf('late-return', 1),
    ];
    expect(levelOf(criteria, DEFAULT_POLICY)).toMatchObject({ level: 'look', points: 4, gate: true });
  });
});

describe('the answer', () => {
  it('has all eight criteria in their order, each with a label, a reason and finite or null figures', () => {
    for (const input of [{}, { ...W1, ...W3, ...W7, ...W9 }]) {
      const { criteria } = outrun(input);
      expect(criteria.map(({ name }) => name)).toEqual(CRITERION_NAMES);
      for (const criterion of criteria) {
        expect(CRITERION_LABELS[criterion.name]).toBeTruthy();
        expect(criterion.reason).toMatch(/^\S.*\.$/s);
        if (criterion.verdict === 'cannot say')
          expect(criterion).toMatchObject({ value: null, points: 0, interval90: null });
      }
    }
  });

  it('lists the false alarms of what is met, and on a flag the warning about carry noise', () => {
    expect(outrun({}).falseAlarms).toEqual([]);
    expect(outrun(W1).falseAlarms).not.toContain(CARRY_NOISE_WARNING);
    const flagged = outrun({ ...W1, ...W3 }).falseAlarms;
    expect(flagged.at(-1)).toBe(CARRY_NOISE_WARNING);
    expect(flagged.some((text) => text.includes('club and the ball'))).toBe(true);
    expect(flagged.some((text) => text.includes('tee height'))).toBe(false);
    const all = outrun({ ...W1, ...W3, ...W7, ...W9 }).falseAlarms;
    expect(new Set(all).size).toBe(all.length);
  });

  it('returns the full policy in force', () => {
    expect(outrun({ policy: { look: 4 } }).policy).toEqual({ ...DEFAULT_POLICY, look: 4 });
  });
});

describe('properties', () => {
  const rank = { null: 0, look: 1, act: 2 };
  const rankOf = (input: OutrunInput) => rank[`${judgeCriteria(input).level}`];
  const legs = fc.record({
    lead: fc.double({ min: 60, max: 120, noNaN: true }),
    trail: fc.constant(100),
    teLeadPct: fc.double({ min: 0.5, max: 6, noNaN: true }),
    teTrailPct: fc.double({ min: 0.5, max: 6, noNaN: true }),
  });
  const pairs = fc
    .array(fc.double({ min: 120, max: 200, noNaN: true }), { minLength: 3, maxLength: 6 })
    .map((carries) => carries.map((carry, i) => ({ day: i * 100, carry, strength: 600, stature: 150, age: 13 })));
  const summary = (n: number) =>
    fc.record({
      mean: fc.double({ min: 0.5, max: 2.5, noNaN: true }),
      cvPct: fc.double({ min: 1, max: 8, noNaN: true }),
      n: fc.constant(n),
    });
  const shares = fc.array(fc.double({ min: 20, max: 80, noNaN: true }), { minLength: 5, maxLength: 5 });
  const blocks = fc.record(
    {
      leadDeficit: fc.record({ values: fc.array(legs, { minLength: 2, maxLength: 6 }) }),
      divergence: fc.record({ pairs }),
      demand: fc.record({ peakLead: summary(5), capacity: summary(3) }),
      lateReturn: fc.record({ earlyDownswing: shares, impact: shares }),
      latePeak: fc.record({ afterLeadArmParallelMs: fc.array(fc.integer({ min: -80, max: 80 }), { minLength: 1 }) }),
      context: fc.record({ pain: fc.integer({ min: 0, max: 10 }) }),
    },
    { requiredKeys: [] },
  );

  it('adding a criterion never lowers the level, but for a measured demand that is not met (our own rule)', () => {
    fc.assert(
      fc.property(blocks, (input) => {
        const verdict = judgeCriteria(input).criteria.find(({ name }) => name === 'demand')!.verdict;
        for (const key of Object.keys(input) as (keyof typeof input)[]) {
          if (key === 'demand' && verdict === 'not met') continue;
          const { [key]: _, ...without } = input;
          expect(rankOf(input)).toBeGreaterThanOrEqual(rankOf(without));
        }
      }),
      { numRuns: 300 },
    );
  });

  it('scaling all forces of every date by the same factor changes no value, verdict or level', () => {
    fc.assert(
      fc.property(blocks, fc.double({ min: 0.3, max: 3, noNaN: true }), (input, factor) => {
        const scaled: OutrunInput = {
          ...input,
          leadDeficit: input.leadDeficit && {
            values: input.leadDeficit.values.map((value) => ({
              ...value,
              lead: value.lead * factor,
              trail: value.trail * factor,
            })),
          },
          divergence: input.divergence && {
            pairs: input.divergence.pairs.map((pair) => ({ ...pair, strength: pair.strength * factor })),
          },
          demand: input.demand && {
            peakLead: { ...input.demand.peakLead, mean: input.demand.peakLead.mean * factor },
            capacity: { ...input.demand.capacity, mean: input.demand.capacity.mean * factor },
          },
        };
        const before = judgeCriteria(input).criteria;
        judgeCriteria(scaled).criteria.forEach(({ value }, i) => {
          const then = before[i]!.value;
          if (then === null) expect(value).toBeNull();
          else expect(value).toBeCloseTo(then, 8);
        });
      }),
    );
  });

  it('the order of the rows changes nothing', () => {
    fc.assert(
      fc.property(blocks, (input) => {
        const turned: OutrunInput = {
          ...input,
          leadDeficit: input.leadDeficit && { values: input.leadDeficit.values.toReversed() },
          divergence: input.divergence && { pairs: input.divergence.pairs.toReversed() },
          lateReturn: input.lateReturn && {
            earlyDownswing: input.lateReturn.earlyDownswing.toReversed(),
            impact: input.lateReturn.impact.toReversed(),
          },
        };
        const before = judgeCriteria(input);
        const after = judgeCriteria(turned);
        expect([after.level, after.points]).toEqual([before.level, before.points]);
        after.criteria.forEach(({ value }, i) => {
          if (value !== null) expect(value).toBeCloseTo(before.criteria[i]!.value!, 9);
        });
      }),
    );
  });
});
