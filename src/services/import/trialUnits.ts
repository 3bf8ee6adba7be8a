import type { TestQuantity } from '#src/domain/catalogue/catalogueTest.ts';
import { median } from '#src/domain/statistics/median.ts';
import { parseUnit } from '#src/domain/units/parseUnit.ts';
import type { Unit } from '#src/domain/units/unitTable.ts';
import type { RawTrial, TrialReading } from '#src/services/import/readBattery.ts';
import type { Reading } from '#src/services/import/reading.ts';
import { siValue, unitBySize } from '#src/services/import/siValue.ts';

/** What reading needs to know of one of the academy's tests. */
export interface TrialTest {
  key: string;
  name: string;
  quantity: TestQuantity;
  unit: string;
  sided: boolean;
  firstMediansSi: readonly number[] | null;
}

const COUNTS = /^(|reps?|repetitions?|count|n|x|times)$/i;

/**
 * Turns the values of one file into the base units of their tests. A test of which no cell of the file names a unit
 * is read in the only unit that its values fit, which is noted.
 */
export function trialUnits(raw: readonly Reading<RawTrial>[], tests: readonly TrialTest[]) {
  const byKey = new Map(tests.map((test) => [test.key, test]));
  const unnamed = new Map<string, number[]>();
  for (const { value: trial } of raw) {
    if (trial === null || trial.value === null || trial.unitText !== '') continue;
    unnamed.set(trial.testKey, [...(unnamed.get(trial.testKey) ?? []), trial.value]);
  }
  const assumed = new Map([...unnamed].map(([key, values]) => [key, assumedUnit(byKey.get(key)!, values)]));
  const notes = [...assumed].flatMap(([key, unit]) =>
    unit === null ? [] : [`${byKey.get(key)!.name}: no unit is named; by their size the values are in ${unit.symbol}`],
  );
  const readings = raw.map((reading): Reading<TrialReading> => {
    if (reading.value === null) return reading;
    const { value, unitText, ...trial } = reading.value;
    const test = byKey.get(trial.testKey)!;
    const done = (valueSi: number | null, enteredUnit: string): Reading<TrialReading> => ({
      ...reading,
      value: { ...trial, valueSi, enteredUnit },
      refused: null,
    });
    if (value === null) return done(null, unitText);
    const refuse = (refused: string): Reading<TrialReading> => ({ ...reading, value: null, refused });
    if (test.quantity === 'count')
      return COUNTS.test(unitText) ? done(value, 'reps') : refuse(`${unitText} is no count`);
    const unit = unitText === '' ? (assumed.get(trial.testKey) ?? null) : parseUnit(unitText);
    if (unit === null) return refuse(unitText === '' ? 'no unit is named' : `no unit is called “${unitText}”`);
    const valueSi = siValue(value, unit, test.quantity);
    return valueSi === null ? refuse(`${unit.symbol} is no unit of ${test.quantity}`) : done(valueSi, unit.symbol);
  });
  return { readings, notes };
}

function assumedUnit(test: TrialTest, values: readonly number[]): Unit | null {
  const typical = test.firstMediansSi === null ? null : median(test.firstMediansSi);
  return typical === null || test.quantity === 'count' ? null : unitBySize(values, typical, test.quantity);
}
