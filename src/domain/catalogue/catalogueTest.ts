/** What a test's value measures; trials are kept in its base unit (N, m, deg, s, repetitions, kg, N·m). */
export type TestQuantity = 'force' | 'length' | 'angle' | 'time' | 'count' | 'mass' | 'torque';

/** The age bands of first-test medians: under 11, 11–12, 13–14, 15–17 years. */
export type FirstMedians = readonly [under11: number, from11: number, from13: number, from15: number];

/** One test that an academy may put in its battery. Values in the base unit of the quantity. */
export interface CatalogueTest {
  key: string;
  name: string;
  quantity: TestQuantity;
  /** Symbol of the unit in which the test is entered and shown. */
  unit: string;
  sided: boolean;
  better: 'higher' | 'lower';
  comparesIn: 'percent' | 'degrees' | 'none';
  attempts: number;
  /** The value of a leg that is kept for decisions. */
  uses: 'mean' | 'best';
  restS: number;
  /** What a body can do at all: outside it a value is refused. Our own, no published source. */
  lowestSi: number;
  highestSi: number;
  /** Within-day coefficient of variation of one leg, %; null where none is published or agreed. */
  cvPct: number | null;
  /** Where the noise comes from, with its tag. */
  noiseSource: string;
  protocol: string;
  /** Which of the judged capacities this test measures, if any. */
  capacity: 'push' | 'jump' | 'hop' | null;
  /** Medians that a first test is compared with. Our proposal, for both sexes. */
  firstMediansSi: FirstMedians;
}
