import type { SeededAcademy } from '#db/seed/academy.ts';
import { measuredBody, trueBody } from '#db/seed/body.ts';
import type { SeededPeople } from '#db/seed/people.ts';
import type { Random } from '#db/seed/random.ts';
import { inSlices, type SeedDb } from '#db/seed/seedDb.ts';
import { generateTrials, type GeneratedTrial } from '#db/seed/trials.ts';
import { TERMS, TRUTHS, type Truth } from '#db/seed/truth.ts';
import { CATALOGUE } from '#src/domain/catalogue/catalogue.ts';
import { fromSi } from '#src/domain/units/fromSi.ts';
import { parseUnit } from '#src/domain/units/parseUnit.ts';

/** Values typed ten times off in the newest term: asked, and left out until someone confirms or voids them. */
const SLIPS: Readonly<Record<string, Pick<GeneratedTrial, 'testKey' | 'side' | 'attempt'>>> = {
  'Bram Castellanos': { testKey: 'hop', side: 'left', attempt: 2 },
  'Rafe Dubois': { testKey: 'push', side: 'right', attempt: 3 },
};
/** A true value that looks unlike the athlete: the one to confirm. */
const SURPRISE = { name: 'Priya Raghunathan', testKey: 'push', side: 'right', attempt: 3, times: 1.56 } as const;

export const nameOf = ({ givenName, familyName }: Truth): string => `${givenName} ${familyName}`;
export const presentIn = (term: number): Truth[] => TRUTHS.filter(({ missesTerms }) => !missesTerms?.includes(term));

/** The testing day of a term in both squads, closed: trials and growth measures of everyone who came. */
export async function seedTestingDay(
  db: SeedDb,
  random: Random,
  { academyId, squads, athletes, tests, batteryId }: SeededAcademy,
  { ids }: SeededPeople,
  term: number,
): Promise<string[]> {
  const { testedOn } = TERMS[term]!;
  const own = { academy_id: academyId };
  const days = new Map([...squads].map(([name, squadId]) => [name, { id: random.uuid(), squadId }]));
  await db
    .insertInto('testing_day')
    .values(
      [...days.values()].map(({ id, squadId }) => ({
        ...{ ...own, id, squad_id: squadId, battery_id: batteryId, held_on: testedOn, state: 'closed' },
        ...{ closed_at: `${testedOn}T16:30:00Z`, closed_by: ids['strength'], recorded_by: ids['strength'] },
      })),
    )
    .execute();
  const units = new Map(CATALOGUE.map(({ key, unit }) => [key, unit]));
  const isNewest = term === TERMS.length - 1;
  const trials = presentIn(term).flatMap((truth) => {
    const name = nameOf(truth);
    return generateTrials(truth, term, random).map((trial) => {
      const slipped = isNewest && same(SLIPS[name], trial);
      const surprise = isNewest && name === SURPRISE.name && same(SURPRISE, trial);
      const valueSi = trial.valueSi * (slipped ? 10 : surprise ? SURPRISE.times : 1);
      const unit = units.get(trial.testKey)!;
      const asked = slipped
        ? 'ten times the athlete’s own median'
        : surprise
          ? 'over 1½ times the athlete’s own median'
          : null;
      return {
        ...{ ...own, id: random.uuid(), testing_day_id: days.get(truth.squad)!.id, athlete_id: athletes.get(name)! },
        ...{ test_id: tests.get(trial.testKey)!, side: trial.side, attempt: trial.attempt, value_si: valueSi },
        entered_value: fromSi(valueSi, parseUnit(unit)!).toFixed(1),
        entered_unit: unit,
        state: asked ? ('asked' as const) : trial.voidReason ? ('void' as const) : ('valid' as const),
        asked_reason: asked,
        void_reason: asked ? null : (trial.voidReason ?? null),
        recorded_by: ids['strength'],
        recorded_at: `${testedOn}T10:00:00Z`,
      };
    });
  });
  await inSlices(trials, (slice) => db.insertInto('trial').values(slice).execute());
  const growth = presentIn(term).map((truth) => {
    const { statureM, sittingHeightM, massKg } = measuredBody(trueBody(truth, testedOn), random);
    const entered = { stature: `${(statureM * 100).toFixed(1)} cm`, mass: `${massKg.toFixed(1)} kg` };
    return {
      ...{ ...own, id: random.uuid(), athlete_id: athletes.get(nameOf(truth))!, measured_on: testedOn },
      ...{ stature_m: statureM, sitting_height_m: sittingHeightM, mass_kg: massKg },
      entered: JSON.stringify(entered),
      recorded_by: ids['strength'],
    };
  });
  await db.insertInto('growth_measure').values(growth).execute();
  return presentIn(term).map((truth) => athletes.get(nameOf(truth))!);
}

function same(
  wanted: Pick<GeneratedTrial, 'testKey' | 'side' | 'attempt'> | undefined,
  { testKey, side, attempt }: GeneratedTrial,
): boolean {
  return wanted?.testKey === testKey && wanted.side === side && wanted.attempt === attempt;
}
