import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { reliability } from '#src/domain/reliability/reliability.ts';
import { sampleStandardDeviation } from '#src/domain/statistics/sampleStandardDeviation.ts';
import { expectRelative } from '#tests/unit/domain/expectRelative.ts';

// Shrout & Fleiss 1979, Psychol Bull 86:420–8, table 2
const shroutFleiss = [
  [9, 2, 5, 8],
  [6, 1, 3, 2],
  [8, 4, 6, 8],
  [7, 1, 2, 6],
  [10, 5, 6, 9],
  [6, 2, 4, 7],
];
// Weir 2005, J Strength Cond Res 19:231–40 (numbers from memory)
const weir = [
  [146, 140],
  [148, 152],
  [170, 152],
  [90, 99],
  [157, 145],
  [156, 153],
  [176, 167],
  [205, 218],
];

describe('reliability', () => {
  it('B1: mean squares and correlations of Shrout & Fleiss 1979', () => {
    const result = reliability({ table: shroutFleiss });
    expect(result).toMatchObject({ n: 6, k: 4, reason: null });
    const expected = {
      bms: 11.241667,
      wms: 6.263889,
      jms: 32.486111,
      ems: 1.019444,
      icc11: 0.165742,
      icc21: 0.289764,
      icc31: 0.714841,
      icc1k: 0.442797,
      icc2k: 0.620051,
      icc3k: 0.909316,
      sem: 1.009675,
      mdc95: 2.798677,
    } as const;
    for (const [name, value] of Object.entries(expected)) {
      expect(result[name as keyof typeof expected], name).toBeCloseTo(value, 6);
    }
    // as printed in the paper, two digits
    expect(
      [result.icc11, result.icc21, result.icc31, result.icc1k, result.icc2k, result.icc3k].map((v) => v!.toFixed(2)),
    ).toEqual(['0.17', '0.29', '0.71', '0.44', '0.62', '0.91']);
  });

  it.each([
    ['icc11', -0.132932, 0.72256],
    ['icc21', 0.018787, 0.761084],
    ['icc31', 0.342465, 0.945858],
    ['icc1k', -0.884442, 0.912415],
    ['icc2k', 0.071137, 0.927232],
    ['icc3k', 0.675675, 0.985892],
  ] as const)('B1: 95 %% limits of %s (formulas of Shrout & Fleiss 1979, recomputed)', (name, low, high) => {
    const limits = reliability({ table: shroutFleiss }).ci95[name]!;
    expect(limits[0]).toBeCloseTo(low, 6);
    expect(limits[1]).toBeCloseTo(high, 6);
  });

  it('B2: Weir 2005', () => {
    const result = reliability({ table: weir });
    const expected = {
      bms: 2098.535714,
      jms: 30.25,
      ems: 57.107143,
      icc21: 0.949975,
      icc31: 0.947016,
      sem: 7.556927,
      typicalError: 7.556927,
      mdc95: 20.946732,
      mdc90: 17.578729,
      logCvPct: 5.161627,
      swc: 6.554388,
    } as const;
    for (const [name, value] of Object.entries(expected)) {
      expect(result[name as keyof typeof expected], name).toBeCloseTo(value, 6);
    }
    expect(result.ci95.icc31![0]).toBeCloseTo(0.760678, 6);
    expect(result.ci95.icc31![1]).toBeCloseTo(0.989163, 6);
    expect(result.typicalErrorCi90![0]).toBeCloseTo(5.330787, 6);
    expect(result.typicalErrorCi90![1]).toBeCloseTo(13.580937, 6);
  });

  it('has the typical error of two trials as SD of the differences over √2', () => {
    fc.assert(
      fc.property(
        fc.array(fc.tuple(fc.double({ min: 1, max: 100, noNaN: true }), fc.double({ min: 1, max: 100, noNaN: true })), {
          minLength: 3,
          maxLength: 20,
        }),
        (table) => {
          const differences = table.map(([first, second]) => second - first);
          const { typicalError } = reliability({ table });
          expect(typicalError! - sampleStandardDeviation(differences) / Math.SQRT2).toBeCloseTo(0, 9);
        },
      ),
    );
  });

  it('holds each correlation and the typical error inside its limits; units and a common shift of a trial change nothing', () => {
    const cell = fc.double({ min: 1, max: 100, noNaN: true });
    const tables = fc
      .integer({ min: 2, max: 4 })
      .chain((k) => fc.array(fc.array(cell, { minLength: k, maxLength: k }), { minLength: 3, maxLength: 12 }));
    fc.assert(
      fc.property(tables, (table) => {
        const result = reliability({ table });
        for (const name of ['icc11', 'icc31', 'icc21'] as const) {
          const limits = result.ci95[name];
          if (limits === null) continue;
          expect(limits[0]).toBeLessThanOrEqual(result[name]! + 1e-9);
          if (name !== 'icc21') expect(limits[1]).toBeGreaterThanOrEqual(result[name]! - 1e-9);
        }
        expect(result.typicalErrorCi90![0]).toBeLessThanOrEqual(result.typicalError!);
        expect(result.typicalErrorCi90![1]).toBeGreaterThanOrEqual(result.typicalError!);
        const scaled = reliability({ table: table.map((row) => row.map((value) => 10 * value)) });
        const shifted = reliability({ table: table.map((row) => row.map((value, j) => value + 5 * j)) });
        expect(scaled.sem! / 10 - result.sem!).toBeCloseTo(0, 8);
        expect(shifted.sem! - result.sem!).toBeCloseTo(0, 8);
        if (result.icc31 !== null && result.ems! > 1e-6) {
          expect(scaled.icc31! - result.icc31).toBeCloseTo(0, 6);
          expect(shifted.icc31! - result.icc31).toBeCloseTo(0, 6);
        }
      }),
    );
  });

  it('has no correlation where nobody differs, and no limits without error', () => {
    const alike = reliability({ table: [[0.1, 0.1, 0.1], [0.1, 0.1, 0.1], [0.1, 0.1, 0.1]] }); // prettier-ignore
    expect(alike).toMatchObject({ bms: 0, ems: 0, icc11: null, icc31: null, icc3k: null, sem: 0, swc: 0 });
    expect(alike.ci95.icc31).toBeNull();
    expect(alike.reason).toContain('people do not differ');
    const perfect = reliability({ table: [[1.1, 2.1], [3.3, 4.3], [2.2, 3.2]] }); // prettier-ignore
    expect(perfect.icc31).toBeCloseTo(1, 12);
    expect(perfect.ci95.icc31).toBeNull();
    expect(perfect.reason).toContain('no spread to set limits by');
  });

  it('has no logarithm of 0', () => {
    const result = reliability({ table: [[0, 1], [2, 3], [4, 7]] }); // prettier-ignore
    expect(result.logCvPct).toBeNull();
    expect(result.sem).not.toBeNull();
    expect(result.reason).toContain('logarithm');
  });

  it.each([[[[1, 2]]], [[[1], [2]]]])('needs two people and two trials: %j', (table) => {
    const result = reliability({ table });
    expect(result).toMatchObject({ sem: null, icc31: null, swc: null, typicalErrorCi90: null });
    expect(result.reason).toContain('at least two people');
  });

  it('gives null, never NaN or Infinity', () => {
    const tables = fc.integer({ min: 1, max: 3 }).chain((k) =>
      fc.array(fc.array(fc.constantFrom(0, 1, 1.1, 2, 1e6), { minLength: k, maxLength: k }), {
        minLength: 1,
        maxLength: 5,
      }),
    );
    fc.assert(
      fc.property(tables, (table) => {
        const seen: unknown[] = [];
        JSON.stringify(reliability({ table }), (_, value: unknown) => (seen.push(value), value));
        expect(seen.filter((value) => typeof value === 'number' && !Number.isFinite(value))).toEqual([]);
      }),
    );
  });

  it('refuses empty and ragged tables and what is not finite', () => {
    expect(() => reliability({ table: [] })).toThrow(RangeError);
    expect(() => reliability({ table: [[], []] })).toThrow(RangeError);
    expect(() => reliability({ table: [[1, 2], [3]] })).toThrow('reliability requires rows of one length, got 2 and 1');
    expect(() =>
      reliability({
        table: [
          [1, 2],
          [3, NaN],
        ],
      }),
    ).toThrow(RangeError);
  });

  it('keeps a small error beside large people', () => {
    // by hand: offsets ±0.5 about 1e6-sized people, differences 1, −1, 1, −1: SD 2/√3, over √2 = 0.816497
    const table = [1e6, 2e6, 3e6, 4e6].map((base, i) =>
      i % 2 === 0 ? [base - 0.5, base + 0.5] : [base + 0.5, base - 0.5],
    );
    expectRelative(reliability({ table }).sem, 2 / Math.sqrt(6), 1e-8);
  });
});
