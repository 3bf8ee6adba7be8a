import katex from 'katex';
import { describe, expect, it } from 'vitest';
import { airDensity } from '#src/domain/driver/airDensity.ts';
import { flight } from '#src/domain/driver/flight.ts';
import { mooreOffset } from '#src/domain/growth/mooreOffset.ts';
import { CALCULATOR_NAMES } from '#src/schemas/method/calculatorNames.ts';
import { CALCULATORS } from '#src/services/method/calculators.ts';
import { carryStandardPage } from '#src/services/method/content/carryStandard.ts';
import { maturityPage } from '#src/services/method/content/maturity.ts';
import { METHOD_GROUPS, TAG_WORDS } from '#src/services/method/methodPage.ts';

/** Words that are never a label here (the product's list). */
const NEVER = /\b(readiness|wellness|recovery|scores?|grades?|leaderboards?)\b|red\s*\/\s*amber/i;

/** Every text of a page, however deep, requests left out. */
function textsIn(part: unknown, key = ''): string[] {
  if (key === 'request') return [];
  if (typeof part === 'string') return [part];
  if (part === null || typeof part !== 'object') return [];
  return Object.entries(part).flatMap(([name, value]) => textsIn(value, name));
}

it('a page for each calculator, in a group of the list, under a title of its own', () => {
  expect(Object.keys(CALCULATORS).sort()).toEqual([...CALCULATOR_NAMES].sort());
  const pages = CALCULATOR_NAMES.map((name) => CALCULATORS[name].page);
  expect(new Set(pages.map(({ title }) => title)).size).toBe(CALCULATOR_NAMES.length);
  expect(new Set(pages.map(({ group }) => group))).toEqual(new Set(METHOD_GROUPS));
});

describe.each(CALCULATOR_NAMES)('the words of %s', (name) => {
  const { page } = CALCULATORS[name];

  it.each(page.formulas)('the formula is set, and said in words: $says', ({ says, tex }) => {
    const markup = katex.renderToString(tex, { output: 'mathml', throwOnError: true, strict: 'error' });
    expect(markup).toContain('<math');
    expect(says).toMatch(/\w{3}/);
  });

  it('every source is named and tagged', () => {
    for (const { of, source, tag } of page.sources) {
      expect(of).toMatch(/\w/);
      expect(source).toMatch(/\w{3}/);
      expect(Object.keys(TAG_WORDS)).toContain(tag);
    }
  });

  it('says it in one sentence, and without a word that is never a label', () => {
    expect(page.sentence).toMatch(/^[A-Z][^.]+\.$/);
    expect(textsIn(page).filter((text) => NEVER.test(text))).toEqual([]);
    expect(textsIn(page).filter((text) => text.trim() === '' || /\s{2}|^\s|\s$/.test(text))).toEqual(
      Object.values(page.outputs).filter((label) => label === ''),
    );
  });

  it('every row of a table is as long as its head', () => {
    for (const { columns, rows } of page.tables ?? []) {
      for (const row of rows) expect(row).toHaveLength(columns.length);
    }
  });
});

describe('what the words claim', () => {
  const carryAt = (temperatureC: number) =>
    flight({
      ballSpeed: 130 * 0.44704,
      launchDeg: 12,
      spinRpm: 2800,
      density: airDensity({ temperatureC, humidityPct: 50, pressurePa: 101325 }).density,
    }).carry!;

  it('carry a degree, as the page of carry-standard says it', () => {
    // by hand: (180.054 − 174.553) m over 40 °C of this model (no measured truth)
    const perDegree = (carryAt(40) - carryAt(0)) / 40;
    expect(perDegree).toBeCloseTo(0.138, 3);
    expect(textsIn(carryStandardPage).join(' ')).toContain(`About ${perDegree.toFixed(2)} m a degree`);
  });

  it.each([
    // by hand: a sweep of this model at 10°, 2 800 rpm (no measured truth)
    { ballSpeed: 40, further: 'against' },
    { ballSpeed: 50, further: 'following' },
  ])('a ball of $ballSpeed m/s launched at 10° goes further with a wind $further', ({ ballSpeed, further }) => {
    const carry = (wind: number) => flight({ ballSpeed, launchDeg: 10, spinRpm: 2800, wind }).carry!;
    expect(carry(-2) > carry(2) ? 'against' : 'following').toBe(further);
  });

  it('Moore’s formulas are printed as they are worked out: sitting height B for boys, height H else', () => {
    const tex = maturityPage.formulas.find(({ says }) => says.startsWith('Moore'))!.tex;
    const printed = [...tex.matchAll(/(-[\d.]+) \+ ([\d.]+)\\,A([BH])/g)].map(([, intercept, slope, height]) => {
      const centimetres = height === 'B' ? 78 : 150;
      return Number(intercept) + Number(slope) * 12 * centimetres;
    });
    const of = (sex: 'male' | 'female') => mooreOffset({ sex, age: 12, stature: 150, sittingHeight: 78 })!;
    expect(printed).toHaveLength(3);
    expect(printed[0]).toBeCloseTo(of('male'), 12);
    // recomputed from the printed formula (check E1)
    expect(printed[1]).toBeCloseTo(-1.497674, 5);
    expect(printed[2]).toBeCloseTo(of('female'), 12);
  });
});
