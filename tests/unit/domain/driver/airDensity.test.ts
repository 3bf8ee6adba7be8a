import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { airDensity } from '#src/domain/driver/airDensity.ts';
import { isaAir } from '#src/domain/driver/isaAir.ts';

describe('airDensity', () => {
  it.each([
    { temperatureC: 20, humidityPct: 50, expected: 1.199314 },
    { temperatureC: 20, humidityPct: 0, expected: 1.204557 },
    { temperatureC: 15, humidityPct: 0, expected: 1.225521 },
    { temperatureC: 25, humidityPct: 50, expected: 1.177315 },
    { temperatureC: 30, humidityPct: 50, expected: 1.155513 },
    // the source's 21.11 °C is 70 °F rounded: its six decimals hold at 21.1111
    { temperatureC: (70 - 32) / 1.8, humidityPct: 50, expected: 1.194402 },
  ])('G11: $temperatureC °C, $humidityPct %, 101325 Pa: $expected (SCIENCE §7, CIPM-2007)', ({ expected, ...air }) => {
    const { density } = airDensity({ ...air, pressurePa: 101_325 });
    expect(Math.abs(density - expected)).toBeLessThanOrEqual(1e-6);
  });

  it('takes 50 % and 101325 Pa where nothing is said, and names its formula', () => {
    expect(airDensity({ temperatureC: 20 })).toEqual({
      density: airDensity({ temperatureC: 20, humidityPct: 50, pressurePa: 101_325 }).density,
      formula: 'CIPM-2007',
      reason: null,
    });
  });

  it("takes the standard atmosphere's pressure at an altitude, with the given temperature", () => {
    const { density, isaDensity } = airDensity({ temperatureC: 8.5, altitudeM: 1000 });
    expect(density).toBe(airDensity({ temperatureC: 8.5, pressurePa: isaAir(1000).pressurePa }).density);
    expect(isaDensity).toBe(isaAir(1000).density);
    expect(airDensity({ temperatureC: 20, altitudeM: 0 }).density).toBe(airDensity({ temperatureC: 20 }).density);
  });

  it('comes near the ideal-gas law for dry air (brute force: p·M/(R·T) within 0.1 %)', () => {
    const ideal = (101_325 * 0.02896546) / (8.314472 * 293.15);
    expect(Math.abs(airDensity({ temperatureC: 20, humidityPct: 0 }).density / ideal - 1)).toBeLessThan(1e-3);
  });

  it('falls with temperature, with humidity and with altitude', () => {
    const celsius = fc.double({ min: 0, max: 45, noNaN: true });
    fc.assert(
      fc.property(celsius, fc.double({ min: 0, max: 90, noNaN: true }), (temperatureC, humidityPct) => {
        const { density } = airDensity({ temperatureC, humidityPct });
        expect(airDensity({ temperatureC: temperatureC + 1, humidityPct }).density).toBeLessThan(density);
        expect(airDensity({ temperatureC, humidityPct: humidityPct + 10 }).density).toBeLessThan(density);
        const high = airDensity({ temperatureC, humidityPct, altitudeM: 500 });
        expect(high.density).toBeLessThan(density);
      }),
    );
  });

  it.each([
    [{ temperatureC: 20, humidityPct: 101 }],
    [{ temperatureC: 20, humidityPct: -1 }],
    [{ temperatureC: NaN }],
    [{ temperatureC: 20, pressurePa: 0 }],
    [{ temperatureC: 20, altitudeM: 20_000 }],
    [{ temperatureC: 20, altitudeM: 100, pressurePa: 100_000 }],
  ])('refuses %j', (input) => {
    expect(() => airDensity(input)).toThrow(RangeError);
  });
});

describe('isaAir', () => {
  it.each([
    [0, 1.225],
    [500, 1.167269],
    [1000, 1.111643],
    [1609.344, 1.046619],
    [3000, 0.909122],
  ])('G10: %s m: %s kg/m³ (SCIENCE §7, geopotential altitude, tolerance 1e-5)', (altitudeM, expected) => {
    expect(Math.abs(isaAir(altitudeM).density - expected)).toBeLessThanOrEqual(1e-5);
  });
});
