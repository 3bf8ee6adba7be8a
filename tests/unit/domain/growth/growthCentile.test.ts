import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { CDC2000 } from '#src/domain/growth/cdc2000.ts';
import { cdc2000Lms } from '#src/domain/growth/cdc2000Lms.ts';
import { growthCentile } from '#src/domain/growth/growthCentile.ts';
import { lmsValue } from '#src/domain/growth/lmsValue.ts';
import { lmsZ } from '#src/domain/growth/lmsZ.ts';
import { normalQuantile } from '#src/domain/statistics/normalQuantile.ts';

describe('the CDC 2000 table', () => {
  it.each([
    ['stature', 'male', 96.5, 0.455267507, 128.1237104, 0.045127088],
    ['stature', 'male', 120.5, 0.505564115, 138.8234114, 0.047610108],
    ['stature', 'male', 216.5, 1.399999187, 176.1850208, 0.04064364],
    ['stature', 'female', 96.5, -0.079283065, 127.8262759, 0.045968169],
    ['stature', 'female', 144.5, 1.303044695, 151.4865636, 0.048599314],
    ['stature', 'female', 216.5, 1.047571238, 163.1307866, 0.039687311],
    ['weight', 'male', 120.5, -1.206688407, 32.08799062, 0.17892874],
    ['weight', 'male', 168.5, -0.631876912, 51.23096332, 0.190808471],
    ['weight', 'female', 120.5, -0.846872805, 33.06392318, 0.195947008],
    ['weight', 'female', 168.5, -1.111606122, 49.49075409, 0.188559804],
    ['bmi', 'male', 144.5, -2.447426113, 17.81463359, 0.131389042],
    ['bmi', 'male', 168.5, -2.227362173, 19.15758672, 0.135251083],
    ['bmi', 'female', 144.5, -1.975521156, 18.10148804, 0.148361495],
    ['bmi', 'female', 168.5, -1.977073595, 19.35257209, 0.151255713],
  ] as const)(
    'has the published row of %s, %s, %s months (CDC files, SCIENCE §5)',
    (measure, sex, ageMonths, l, m, s) => {
      expect(cdc2000Lms({ measure, sex, ageMonths })).toEqual({ l, m, s });
    },
  );

  it('runs from 72.5 to 240 months, every third month, in each of the six charts', () => {
    for (const chart of Object.values(CDC2000).flatMap((bySex) => Object.values(bySex))) {
      const ages = chart.map(([age]) => age);
      expect(ages).toEqual([...Array.from({ length: 56 }, (_, i) => 72.5 + 3 * i), 240]);
    }
  });

  it('is linear between rows (by hand: the middle of two rows is their mean)', () => {
    const [low, mid, high] = [120.5, 122, 123.5].map((ageMonths) =>
      cdc2000Lms({ measure: 'stature', sex: 'male', ageMonths }),
    );
    expect(mid!.l).toBeCloseTo((low!.l + high!.l) / 2, 12);
    expect(mid!.m).toBeCloseTo((low!.m + high!.m) / 2, 10);
    expect(mid!.s).toBeCloseTo((low!.s + high!.s) / 2, 12);
  });
});

describe('growthCentile', () => {
  it.each([
    { measure: 'stature', sex: 'male', ageMonths: 120.5, value: 145, z: 0.9245 },
    { measure: 'weight', sex: 'male', ageMonths: 168.5, value: 45, z: -0.7083 },
    { measure: 'weight', sex: 'female', ageMonths: 120.5, value: 40, z: 0.8976 },
    { measure: 'bmi', sex: 'male', ageMonths: 144.5, value: 22, z: 1.2544 },
  ] as const)('E10: $measure of a $sex, $ageMonths months, $value (SCIENCE §5, tolerance 1e-4)', ({ z, ...input }) => {
    const result = growthCentile(input);
    expect(Math.abs(result.z! - z)).toBeLessThanOrEqual(1e-4);
    expect(result.reason).toBeNull();
  });

  it('E10: the centile of the first is 82.24 (SCIENCE §5)', () => {
    const { centile } = growthCentile({ measure: 'stature', sex: 'male', ageMonths: 120.5, value: 145 });
    expect(Math.abs(centile! - 82.24)).toBeLessThanOrEqual(0.01);
  });

  it.each([
    { what: 'boy 144 months, 140 cm', lms: { l: 1, m: 149.0807, s: 0.04753 }, value: 140, z: -1.2815 },
    { what: 'girl 168 months, BMI 17', lms: { l: -1.2266, m: 19.5647, s: 0.137 }, value: 17, z: -1.1193 },
    { what: 'boy 120 months, 40 kg', lms: { l: -0.6764, m: 31.1586, s: 0.16305 }, value: 40, z: 1.4096 },
  ])('E10, WHO 2007 rows given as L, M, S: $what (SCIENCE §5, tolerance 1e-4)', ({ lms, value, z }) => {
    const result = growthCentile({ lms, value });
    expect(Math.abs(result.z! - z)).toBeLessThanOrEqual(1e-4);
    expect(result).toMatchObject(lms);
  });

  it("E11: WHO's own test file, a boy of 166.59 months, 153.7 cm: height z −1.13, to 0.01 (SCIENCE §5)", () => {
    const part = 0.59;
    const lms = { l: 1, m: 162.0505 + part * (162.6207 - 162.0505), s: 0.04725 + part * (0.0472 - 0.04725) };
    expect(Math.abs(growthCentile({ lms, value: 153.7 }).z! - -1.13)).toBeLessThanOrEqual(0.01);
  });

  it.each([72.49, 0, 240.01])('is null with a reason at %s months', (ageMonths) => {
    expect(growthCentile({ measure: 'bmi', sex: 'female', ageMonths, value: 18 })).toEqual({
      l: null,
      m: null,
      s: null,
      z: null,
      centile: null,
      reason: 'the CDC 2000 table covers 72.5 to 240 months of age',
    });
  });

  it.each([72.5, 240])('is given at the limit of %s months', (ageMonths) => {
    expect(growthCentile({ measure: 'bmi', sex: 'female', ageMonths, value: 18 }).z).toEqual(expect.any(Number));
  });

  it('gives no standard score where the power overflows', () => {
    const result = growthCentile({ lms: { l: -100, m: 100, s: 0.1 }, value: 1e-6 });
    expect(result).toMatchObject({ z: null, centile: null, reason: expect.stringContaining('too far') as string });
  });

  it('refuses a value of 0, a negative age, an M of 0', () => {
    expect(() => growthCentile({ lms: { l: 1, m: 100, s: 0.1 }, value: 0 })).toThrow(RangeError);
    expect(() => growthCentile({ lms: { l: 1, m: 0, s: 0.1 }, value: 5 })).toThrow(RangeError);
    const negative = { measure: 'bmi', sex: 'female', ageMonths: -1, value: 18 } as const;
    expect(() => growthCentile(negative)).toThrow(RangeError);
  });
});

describe('lmsValue', () => {
  it.each([
    { what: 'boy stature 120.5 P3', at: ['stature', 'male', 120.5] as const, p: 0.03, value: 126.6677753 },
    { what: 'boy stature 120.5 P97', at: ['stature', 'male', 120.5] as const, p: 0.97, value: 151.5294179 },
    { what: 'girl BMI 144.5 P3', at: ['bmi', 'female', 144.5] as const, p: 0.03, value: 14.4941525 },
    { what: 'boy BMI 168.5 P95', at: ['bmi', 'male', 168.5] as const, p: 0.95, value: 26.0466222 },
  ])('E9: $what = $value (percentile columns of the CDC files, tolerance 1e-6)', ({ at, p, value }) => {
    const lms = cdc2000Lms({ measure: at[0], sex: at[1], ageMonths: at[2] })!;
    expect(Math.abs(lmsValue(lms, normalQuantile(p))! - value)).toBeLessThanOrEqual(1e-6);
  });

  it('inverts lmsZ, and agrees with L = 0 as L goes to 0', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -3, max: 3, noNaN: true }),
        fc.double({ min: 0.02, max: 0.2, noNaN: true }),
        fc.double({ min: -1.6, max: 1.6, noNaN: true }),
        (l, s, z) => {
          const value = lmsValue({ l, m: 50, s }, z);
          if (value !== null) expect(lmsZ({ l, m: 50, s }, value)).toBeCloseTo(z, 7);
        },
      ),
    );
    expect(lmsValue({ l: 1e-13, m: 50, s: 0.1 }, 2)).toBeCloseTo(lmsValue({ l: 0, m: 50, s: 0.1 }, 2)!, 9);
    expect(lmsZ({ l: 1e-13, m: 50, s: 0.1 }, 60)).toBeCloseTo(lmsZ({ l: 0, m: 50, s: 0.1 }, 60), 9);
  });

  it('agrees with the formula as printed, ((X/M)^L − 1)/(LS) (brute force)', () => {
    const lms = { l: -1.2, m: 19.3, s: 0.15 };
    expect(lmsZ(lms, 25)).toBeCloseTo(((25 / 19.3) ** -1.2 - 1) / (-1.2 * 0.15), 12);
    expect(lmsValue(lms, 1.5)).toBeCloseTo(19.3 * (1 + -1.2 * 0.15 * 1.5) ** (1 / -1.2), 10);
  });

  it('is null where the reference does not reach', () => {
    expect(lmsValue({ l: -2.5, m: 18, s: 0.14 }, 3)).toBeNull();
    expect(lmsValue({ l: 1, m: 18, s: 0.5 }, -2)).toBeNull();
  });
});
