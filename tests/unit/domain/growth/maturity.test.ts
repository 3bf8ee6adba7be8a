import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fransenRatio } from '#src/domain/growth/fransenRatio.ts';
import { maturity } from '#src/domain/growth/maturity.ts';
import type { MaturityInput } from '#src/domain/growth/maturity.ts';
import { mirwaldOffset } from '#src/domain/growth/mirwaldOffset.ts';
import { mooreOffset } from '#src/domain/growth/mooreOffset.ts';
import { mooreStatureOffset } from '#src/domain/growth/mooreStatureOffset.ts';

/** SCIENCE §5, recomputed from the published formulas; tolerance 1e-5. */
const cases = [
  {
    id: 'E1',
    age: 12,
    stature: 150,
    sittingHeight: 78,
    mass: 40,
    offsets: [-1.786643, -1.544355, -1.497674],
    ratio: 0.870463,
    ageAtPhv: 13.7858,
  },
  {
    id: 'E2',
    age: 13,
    stature: 156.2,
    sittingHeight: 81.4,
    mass: 44.9,
    offsets: [-0.909465, -0.684727, -0.664655],
    ratio: 0.941113,
    ageAtPhv: 13.8134,
  },
  {
    id: 'E4',
    age: 15,
    stature: 170,
    sittingHeight: 88.5,
    mass: 58,
    offsets: [1.045412, 1.209691, 1.211626],
    ratio: 1.082793,
    ageAtPhv: 13.8531,
  },
] as const;

const girls = [
  { id: 'E5', age: 11, stature: 144, sittingHeight: 75, mass: 37, mirwald: -1.018572, moore: -1.019584 },
  { id: 'E6', age: 12, stature: 151.5, sittingHeight: 79.5, mass: 41.8, mirwald: -0.036325, moore: -0.031355 },
] as const;

const within = (actual: number | undefined, expected: number, tolerance = 1e-5) =>
  expect(Math.abs((actual ?? NaN) - expected)).toBeLessThanOrEqual(tolerance);

describe('maturity', () => {
  it.each(cases)('$id, a boy: Mirwald, Moore, Moore from stature, Fransen (SCIENCE §5, recomputed)', (boy) => {
    const { age, stature, sittingHeight, mass, offsets, ratio, ageAtPhv } = boy;
    const result = maturity({ sex: 'male', age, stature, sittingHeight, mass });
    within(result.mirwald?.offset, offsets[0]);
    within(result.moore?.offset, offsets[1]);
    within(result.mooreStature?.offset, offsets[2]);
    within(result.fransen?.ratio, ratio);
    within(result.fransen?.ageAtPhv, ageAtPhv, 5e-5);
    within(result.mirwald?.ageAtPhv, age - offsets[0]);
    expect(result.reason).toBeNull();
  });

  it.each(girls)('$id, a girl: Mirwald and Moore, no boys-only formula (SCIENCE §5, recomputed)', (girl) => {
    const { age, stature, sittingHeight, mass } = girl;
    const result = maturity({ sex: 'female', age, stature, sittingHeight, mass });
    within(result.mirwald?.offset, girl.mirwald);
    within(result.moore?.offset, girl.moore);
    expect(result.mooreStature).toBeNull();
    expect(result.fransen).toBeNull();
  });

  it('T1: the Fransen intercept is positive; with the misprinted minus the ratio would be about −13', () => {
    const ratio = fransenRatio({ age: 12, stature: 150, sittingHeight: 78, mass: 40 });
    within(ratio, 0.870463);
    within(ratio - 2 * 6.986547255416, -13.1026, 1e-3);
  });

  it('T2: the intercepts of Moore, by the formulas at age 0 (8.128741, not 8.125741; 7.999994)', () => {
    expect(mooreOffset({ sex: 'male', age: 0, stature: 150, sittingHeight: 78 })).toBe(-8.128741);
    expect(mooreOffset({ sex: 'female', age: 0, stature: 150 })).toBe(-7.709133);
    expect(mooreStatureOffset({ age: 0, stature: 150 })).toBe(-7.999994);
  });

  it('T3: weight for height is a percentage; the ratio without ×100 gives −2.391731 in E1 (SCIENCE §5)', () => {
    const boy = { sex: 'male', age: 12, stature: 150, sittingHeight: 78, mass: 40 } as const;
    within(mirwaldOffset(boy), -1.786643);
    within(mirwaldOffset(boy) - 0.02292 * 99 * (40 / 150), -2.391731);
  });

  it('gives what the inputs allow, and the band from the best of it', () => {
    const boy: MaturityInput = { sex: 'male', age: 15, stature: 170 };
    expect(maturity(boy)).toMatchObject({ mirwald: null, moore: null, fransen: null, band: 'post' });
    expect(maturity(boy).reason).toBe('without the sitting height and the mass not every estimate can be given');
    expect(maturity({ ...boy, mass: 58 })).toMatchObject({ mirwald: null, moore: null, fransen: null });
    expect(maturity({ ...boy, sittingHeight: 88.5 }).moore).not.toBeNull();
    const girl = maturity({ sex: 'female', age: 12, stature: 151.5 });
    expect(girl).toMatchObject({ mirwald: null, mooreStature: null, fransen: null, band: 'circa' });
    expect(girl.reason).toBe('without the sitting height and the mass not every estimate can be given');
    within(girl.moore?.offset, -0.031355);
  });

  it('calls E1 pre, E2 circa and E4 post', () => {
    const bands = cases.map(
      ({ age, stature, sittingHeight, mass }) => maturity({ sex: 'male', age, stature, sittingHeight, mass }).band,
    );
    expect(bands).toEqual(['pre', 'circa', 'post']);
  });

  it('says what limits the estimate', () => {
    const text = (input: MaturityInput) => maturity(input).cautions.join('\n');
    const near = text({ sex: 'male', age: 13, stature: 156.2, sittingHeight: 81.4, mass: 44.9 });
    expect(near).toMatch(/one year either side/);
    expect(near).toMatch(/towards the mean/);
    expect(near).toMatch(/Fransen ratio is criticised/);
    expect(near).not.toMatch(/outside 8 to 16|more than a year/);
    const far = text({ sex: 'male', age: 17, stature: 178 });
    expect(far).toMatch(/outside 8 to 16/);
    expect(far).toMatch(/boys of 12 to 16/);
    expect(far).toMatch(/more than a year/);
    expect(far).not.toMatch(/Fransen/);
    expect(text({ sex: 'female', age: 8.5, stature: 130, sittingHeight: 70 })).toMatch(/girls of 9 to 13/);
  });

  it('gives no age at PHV from a ratio that is not positive, and says so', () => {
    const absurd = maturity({ sex: 'male', age: 12, stature: 400, sittingHeight: 200, mass: 40 });
    expect(absurd.fransen).toBeNull();
    expect(absurd.reason).toMatch(/Fransen ratio has no meaning/);
  });

  it.each<[string, MaturityInput]>([
    ['age 0', { sex: 'male', age: 0, stature: 150 }],
    ['a stature that is no number', { sex: 'male', age: 12, stature: NaN }],
    ['a negative mass', { sex: 'male', age: 12, stature: 150, mass: -1 }],
    ['a sitting height as tall as the child', { sex: 'female', age: 12, stature: 150, sittingHeight: 150 }],
  ])('refuses %s', (_, input) => {
    expect(() => maturity(input)).toThrow(RangeError);
  });

  it('never gives NaN, and offset and age at PHV add up to the age', () => {
    fc.assert(
      fc.property(
        fc.constantFrom('male' as const, 'female' as const),
        fc.double({ min: 5, max: 20, noNaN: true }),
        fc.double({ min: 90, max: 210, noNaN: true }),
        fc.double({ min: 0.45, max: 0.6, noNaN: true }),
        fc.double({ min: 15, max: 130, noNaN: true }),
        (sex, age, stature, part, mass) => {
          const result = maturity({ sex, age, stature, sittingHeight: part * stature, mass });
          for (const estimate of [result.mirwald, result.moore, result.mooreStature]) {
            if (estimate) expect(estimate.offset + estimate.ageAtPhv).toBeCloseTo(age, 9);
          }
          if (result.fransen) expect(result.fransen.ratio * result.fransen.ageAtPhv).toBeCloseTo(age, 9);
          expect(['pre', 'circa', 'post']).toContain(result.band);
        },
      ),
    );
  });
});
