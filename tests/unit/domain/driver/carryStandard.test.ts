import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { airDensity } from '#src/domain/driver/airDensity.ts';
import { carryStandard } from '#src/domain/driver/carryStandard.ts';
import { flight } from '#src/domain/driver/flight.ts';

const shot = { ballSpeed: 58, launchDeg: 12, spinRpm: 2800, carry: 180 };

describe('carryStandard', () => {
  it('changes nothing at 20 °C, 101325 Pa, 50 % and no wind (by definition)', () => {
    const standard = { temperatureC: 20, humidityPct: 50, pressurePa: 101_325, wind: 0 };
    expect(carryStandard({ shots: [shot], conditions: standard })).toEqual({
      shots: [{ carryStandard: 180, adjustment: 1, reason: null }],
      median: 180,
      medianStandard: 180,
      reason: null,
    });
  });

  it("is the ratio of two of flight's carries (brute force through `flight`)", () => {
    const { carry: _carry, ...launch } = shot;
    const here = flight({ ...launch, density: airDensity({ temperatureC: 5, pressurePa: 100_000 }).density, wind: -1 });
    const standard = flight({ ...launch, density: airDensity({ temperatureC: 20 }).density });
    const result = carryStandard({ shots: [shot], conditions: { temperatureC: 5, pressurePa: 100_000, wind: -1 } });
    expect(result.shots[0]!.adjustment).toBeCloseTo(standard.carry! / here.carry!, 12);
    expect(result.shots[0]!.carryStandard).toBeCloseTo((180 * standard.carry!) / here.carry!, 9);
  });

  it('gives back what cold or a head wind took, and takes what heat, a tail wind or altitude gave', () => {
    const adjustment = (conditions: Parameters<typeof carryStandard>[0]['conditions']) =>
      carryStandard({ shots: [shot], conditions }).shots[0]!.adjustment!;
    expect(adjustment({ temperatureC: 5 })).toBeGreaterThan(1);
    expect(adjustment({ temperatureC: 20, wind: -2 })).toBeGreaterThan(1);
    expect(adjustment({ temperatureC: 35 })).toBeLessThan(1);
    expect(adjustment({ temperatureC: 20, wind: 2 })).toBeLessThan(1);
    expect(adjustment({ temperatureC: 20, altitudeM: 1500 })).toBeLessThan(1);
  });

  it('leaves a shot without launch or spin, with its reason, and takes the medians of what there is', () => {
    const shots = [shot, { ...shot, launchDeg: null, carry: 100 }, { ballSpeed: 58, carry: 170, launchDeg: 12 }];
    const result = carryStandard({ shots, conditions: { temperatureC: 20 } });
    expect(result.shots[1]).toEqual({ carryStandard: null, adjustment: null, reason: 'launch or spin is not known' });
    expect(result.shots[2]).toEqual(result.shots[1]);
    expect(result).toMatchObject({ median: 170, medianStandard: 180 });
    expect(result.reason).toBe('2 of 3 shots without a carry at standard conditions');
  });

  it('has no standard carry for a launch that never rises', () => {
    const flat = { ...shot, launchDeg: -3, spinRpm: 0 };
    const result = carryStandard({ shots: [flat], conditions: { temperatureC: 20 } });
    expect(result).toMatchObject({ median: 180, medianStandard: null });
    expect(result.shots[0]!.reason).toMatch(/no carry/);
  });

  it('gives one factor for one launch, whatever the carry, in the order of the shots', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 50, max: 250, noNaN: true }), { minLength: 1, maxLength: 4 }),
        (carries) => {
          const shots = carries.map((carry) => ({ ...shot, carry }));
          const result = carryStandard({ shots, conditions: { temperatureC: 8, wind: 1 } });
          result.shots.forEach((one, i) => {
            expect(one.adjustment).toBe(result.shots[0]!.adjustment);
            expect(one.carryStandard! / one.adjustment!).toBeCloseTo(carries[i]!, 9);
          });
        },
      ),
      { numRuns: 10 },
    );
  });

  it('refuses no shot, a negative carry, both pressure and altitude', () => {
    const conditions = { temperatureC: 20 };
    expect(() => carryStandard({ shots: [], conditions })).toThrow(RangeError);
    expect(() => carryStandard({ shots: [{ ...shot, carry: -1 }], conditions })).toThrow(RangeError);
    expect(() => carryStandard({ shots: [{ ...shot, ballSpeed: NaN }], conditions })).toThrow(RangeError);
    const both = { temperatureC: 20, pressurePa: 101_325, altitudeM: 0 };
    expect(() => carryStandard({ shots: [shot], conditions: both })).toThrow(RangeError);
  });
});
