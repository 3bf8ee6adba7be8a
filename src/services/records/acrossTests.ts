import type { AthleteRow } from '#src/db/queries/athletes.ts';
import type { TestSession } from '#src/db/queries/testSessions.ts';
import { agreement, type Agreement } from '#src/domain/reliability/agreement.ts';
import { median } from '#src/domain/statistics/median.ts';
import { ageYears } from '#src/domain/growth/ageYears.ts';
import { compareLegs, leadSideOf, type LegComparison } from '#src/services/records/compareLegs.ts';

type Weaker = 'lead' | 'trail' | 'none';

export interface TestAgreement {
  testKey: string;
  testName: string;
  /** The weaker side of each session, oldest first; `none` inside noise. */
  sides: { on: string; weaker: Weaker }[];
  /** Cohen's kappa of one session with the next; null with fewer than three sessions. */
  kappa: Agreement | null;
}

/** How steadily each test points to the same leg, session after session. One test never settles the side. */
export function agreementOfTests(all: readonly LegComparison[]): TestAgreement[] {
  const keys = [...new Set(all.map(({ testKey }) => testKey))];
  return keys.map((testKey) => {
    const own = all.filter((compared) => compared.testKey === testKey);
    const sides = own.map(({ heldOn, difference, beyondNoise }) => ({
      on: heldOn,
      weaker: (beyondNoise ? (difference < 0 ? 'lead' : 'trail') : 'none') as Weaker,
    }));
    const pairs = sides.slice(1).map(({ weaker }, i): [Weaker, Weaker] => [sides[i]!.weaker, weaker]);
    return { testKey, testName: own[0]!.testName, sides, kappa: pairs.length < 2 ? null : agreement({ pairs }) };
  });
}

export interface SquadMedian {
  testKey: string;
  /** Median of the legs' means over the others of the squad within a year of age at their newest test, SI. */
  lead: number;
  trail: number;
  athletes: number;
}

const AGE_BAND_YEARS = 1;
const FEWEST_OTHERS = 3;

/** Squad medians near the athlete's age, a test; left out where fewer than three others were tested. */
export function squadMedians(
  sessions: readonly TestSession[],
  squad: readonly AthleteRow[],
  { id, birthDate }: { id: string; birthDate: string },
): SquadMedian[] {
  const near = squad.filter(
    (other) =>
      other.id !== id &&
      Math.abs(ageYears('2000-01-01', other.birthDate) - ageYears('2000-01-01', birthDate)) <= AGE_BAND_YEARS,
  );
  const newest = near.flatMap(({ id: otherId, plays }) => {
    const own = sessions.filter(({ athleteId }) => athleteId === otherId);
    const keys = [...new Set(own.map(({ testKey }) => testKey))];
    return keys.flatMap((key) => {
      const last = own.findLast(({ testKey }) => testKey === key);
      return (last && compareLegs(last, leadSideOf(plays))) ?? [];
    });
  });
  return [...new Set(newest.map(({ testKey }) => testKey))].flatMap((testKey) => {
    const values = newest.filter((compared) => compared.testKey === testKey);
    if (values.length < FEWEST_OTHERS) return [];
    const of = (leg: 'leadMean' | 'trailMean') => median(values.map((compared) => compared[leg]));
    return [{ testKey, lead: of('leadMean'), trail: of('trailMean'), athletes: values.length }];
  });
}
