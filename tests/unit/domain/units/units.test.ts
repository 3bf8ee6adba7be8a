import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fromSi } from '#src/domain/units/fromSi.ts';
import { parseUnit } from '#src/domain/units/parseUnit.ts';
import { toSi } from '#src/domain/units/toSi.ts';
import { BASE_SYMBOL, UNITS } from '#src/domain/units/unitTable.ts';

const unit = (text: string) => {
  const found = parseUnit(text);
  if (!found) throw new Error(`no unit ${text}`);
  return found;
};

describe('conversions', () => {
  it.each([
    { value: 1, symbol: 'kgf', base: 9.80665, source: 'exact: standard gravity, CGPM 1901' },
    { value: 1, symbol: 'lbf', base: 4.4482216152605, source: 'exact: 0.45359237 kg × 9.80665 m/s²' },
    { value: 1, symbol: 'in', base: 0.0254, source: 'exact: international inch, 1959' },
    { value: 1, symbol: 'ft', base: 0.3048, source: 'exact: international foot, 1959' },
    { value: 100, symbol: 'yd', base: 91.44, source: 'exact: international yard, 1959' },
    { value: 100, symbol: 'mph', base: 44.704, source: 'exact: 1609.344 m / 3600 s' },
    { value: 36, symbol: 'km/h', base: 10, source: 'exact: 1000 m / 3600 s' },
    { value: 10, symbol: 'ft/s', base: 3.048, source: 'exact: international foot' },
    { value: 1, symbol: 'lb', base: 0.45359237, source: 'exact: international pound, 1959' },
    { value: 45.93, symbol: 'g', base: 0.04593, source: 'exact' },
    { value: 150, symbol: 'cm', base: 1.5, source: 'exact' },
    { value: 42.67, symbol: 'mm', base: 0.04267, source: 'exact' },
    { value: 350, symbol: 'ms', base: 0.35, source: 'exact' },
    { value: 212, symbol: '°F', base: 100, source: 'exact: 180 °F are 100 °C, from 32 °F' },
    { value: -40, symbol: '°F', base: -40, source: 'exact: by hand, (−40 − 32)·5/9' },
    { value: 1013.25, symbol: 'hPa', base: 101325, source: 'exact: standard atmosphere' },
    { value: 101.325, symbol: 'kPa', base: 101325, source: 'exact: standard atmosphere' },
    { value: 1013.25, symbol: 'mbar', base: 101325, source: 'exact: 1 mbar = 1 hPa' },
    {
      value: 1,
      symbol: 'inHg',
      base: 3386.388640341,
      source: 'exact: 13595.1 × 9.80665 × 0.0254, conventional mercury',
    },
    { value: 2800, symbol: 'rpm', base: 2800, source: 'kept as it is' },
    { value: 12.5, symbol: 'deg', base: 12.5, source: 'kept as it is' },
  ])('$value $symbol = $base: $source', ({ value, symbol, base }) => {
    expect(Math.abs(toSi(value, unit(symbol)) - base)).toBeLessThanOrEqual(1e-13 * Math.abs(base));
    expect(Math.abs(fromSi(base, unit(symbol)) - value)).toBeLessThanOrEqual(1e-12 * Math.abs(value));
  });

  it('converts there and back', () => {
    fc.assert(
      fc.property(fc.constantFrom(...UNITS), fc.double({ min: -1e6, max: 1e6, noNaN: true }), (one, value) => {
        expect(Math.abs(fromSi(toSi(value, one), one) - value)).toBeLessThanOrEqual(1e-9 + 1e-12 * Math.abs(value));
      }),
    );
  });

  it('refuses what is no finite number', () => {
    expect(() => toSi(NaN, unit('m'))).toThrow(RangeError);
    expect(() => fromSi(Infinity, unit('m'))).toThrow(RangeError);
  });
});

describe('parseUnit', () => {
  it.each([
    ['yds', 'yd'],
    [' Yards ', 'yd'],
    ['INCHES', 'in'],
    ['"', 'in'],
    ['in.', 'in'],
    ["'", 'ft'],
    ['M/S', 'm/s'],
    ['mps', 'm/s'],
    ['m s⁻¹', 'm/s'],
    ['m·s−1', 'm/s'],
    ['kph', 'km/h'],
    ['Km / h', 'km/h'],
    ['°', 'deg'],
    ['º', 'deg'],
    ['Degrees', 'deg'],
    ['° C', '°C'],
    ['ºF', '°F'],
    ['in Hg', 'inHg'],
    ['(cm)', 'cm'],
    ['[N]', 'N'],
    ['lbs', 'lb'],
    ['LBF', 'lbf'],
    ['1/min', 'rpm'],
    ['sec', 's'],
    ['hPa', 'hPa'],
    ['kg', 'kg'],
  ])('reads "%s" as %s', (text, symbol) => {
    expect(parseUnit(text)?.symbol).toBe(symbol);
  });

  it.each(['', ' ', 'furlong', 'cm2', 'm/s/s', '(cm', '5', '()', 'constructor'])('knows no "%s"', (text) => {
    expect(parseUnit(text)).toBeNull();
  });

  it('reads every symbol and every spelling as its own unit, in upper case too', () => {
    for (const one of UNITS) {
      for (const spelling of [one.symbol, ...one.spellings, one.symbol.toUpperCase()]) {
        expect(parseUnit(spelling)).toBe(one);
      }
    }
  });

  it('has no spelling twice, and one base unit a quantity with factor 1', () => {
    const spellings = UNITS.flatMap((one) => one.spellings);
    expect(new Set(spellings).size).toBe(spellings.length);
    for (const [quantity, symbol] of Object.entries(BASE_SYMBOL)) {
      expect(parseUnit(symbol)).toMatchObject({ quantity, factor: 1, offset: 0 });
    }
  });
});
