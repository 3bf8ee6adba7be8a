import { expect, it } from 'vitest';
import { suspectGrowth } from '#src/domain/growth/suspectGrowth.ts';

const earlier = { on: '2025-09-13', statureM: 1.5, sittingHeightM: 0.785, massKg: 40 };
const at = (part: object) => ({ on: '2026-01-17', statureM: 1.52, sittingHeightM: 0.79, massKg: 42, ...part });
const judge = (part: object, before: typeof earlier | null = earlier) =>
  suspectGrowth({ measure: at(part), birthDate: '2013-01-01', earlier: before });

// By hand, from the limits in the function's own words.
it.each([
  [{}, null],
  [{ statureM: 1.481 }, null],
  [{ statureM: 1.47 }, 'the height fell by 3.0 cm'],
  [{ statureM: 1.6 }, 'the height rose by 10.0 cm'],
  [{ massKg: 33 }, 'the mass went from 40.0 to 33.0 kg'],
  [{ massKg: 55 }, 'the mass went from 40.0 to 55.0 kg'],
  [{ statureM: null, sittingHeightM: null }, null],
])('%j', (part, reason) => expect(judge(part)).toBe(reason));

it('looks at the share of the sitting height, and at a first measure by age', () => {
  expect(judge({ sittingHeightM: 1.1 }, null)).toBe('the sitting height is 72 % of the height');
  expect(judge({ statureM: 0.85, sittingHeightM: 0.45, massKg: 20 }, null)).toBe(
    'the height is far from any at this age; the mass is far from any at this age',
  );
  expect(judge({}, null)).toBeNull();
});
