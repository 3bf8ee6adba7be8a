import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { AthleteHistory, StrengthSession } from '#src/domain/outrun/athleteHistory.ts';
import { judgeAthlete } from '#src/domain/outrun/judgeAthlete.ts';
import { historyOf } from '#tests/unit/domain/outrun/historyOf.ts';

/** The invariances of our own rule (SCIENCE §9). */

/** Trials as they are stored: left, right and void ones; then seen as lead and trail of one who plays either way. */
interface StoredTrial {
  on: string;
  test: StrengthSession['test'];
  side: 'left' | 'right';
  value: number;
  state: 'valid' | 'void';
}

function stored(leadSide: 'left' | 'right'): StoredTrial[] {
  const trailSide = leadSide === 'left' ? 'right' : 'left';
  return historyOf().strength.flatMap(({ on, test, leadTrials, trailTrials }) => [
    ...leadTrials.map((value): StoredTrial => ({ on, test, side: leadSide, value, state: 'valid' })),
    ...trailTrials.map((value): StoredTrial => ({ on, test, side: trailSide, value, state: 'valid' })),
  ]);
}

function asHistory(trials: readonly StoredTrial[], leadSide: 'left' | 'right'): AthleteHistory {
  const sessions = historyOf().strength.map(({ on, test }): StrengthSession => {
    const ofSession = trials.filter((trial) => trial.on === on && trial.test === test && trial.state === 'valid');
    const valuesOf = (lead: boolean) =>
      ofSession.filter(({ side }) => (side === leadSide) === lead).map(({ value }) => value);
    return { on, test, leadTrials: valuesOf(true), trailTrials: valuesOf(false) };
  });
  return historyOf({ strength: sessions });
}

it('mirroring left and right together with the handedness changes nothing', () => {
  expect(judgeAthlete(asHistory(stored('right'), 'right'))).toEqual(judgeAthlete(asHistory(stored('left'), 'left')));
});

it('a void trial changes nothing', () => {
  const voided: StoredTrial = { on: '2026-01-17', test: 'push', side: 'left', value: 99, state: 'void' };
  expect(judgeAthlete(asHistory([voided, ...stored('left')], 'left'))).toEqual(
    judgeAthlete(asHistory(stored('left'), 'left')),
  );
});

it('the order of all rows and trials changes nothing, to the last digit', () => {
  const history = historyOf();
  const before = judgeAthlete(history);
  const shuffled = <Row>(rows: readonly Row[]) => fc.shuffledSubarray([...rows], { minLength: rows.length });
  fc.assert(
    fc.property(
      shuffled(history.strength),
      shuffled(history.growth),
      shuffled(history.driver),
      shuffled(history.ground[0]!.swings),
      (strength, growth, driver, swings) => {
        const turned = strength.map((session) => ({ ...session, leadTrials: session.leadTrials.toReversed() }));
        const ground = [{ ...history.ground[0]!, swings }];
        expect(judgeAthlete({ ...history, strength: turned, growth, driver, ground })).toEqual(before);
      },
    ),
    { numRuns: 25 },
  );
});

it('scaling all forces of every date by c changes no D, DR or G', () => {
  const history = historyOf();
  const before = judgeAthlete(history).result.criteria.slice(0, 3);
  fc.assert(
    fc.property(fc.double({ min: 0.2, max: 5, noNaN: true }), (c) => {
      const scaled: AthleteHistory = {
        ...history,
        strength: history.strength.map((session) =>
          session.test === 'push'
            ? {
                ...session,
                leadTrials: session.leadTrials.map((force) => force * c),
                trailTrials: session.trailTrials.map((force) => force * c),
              }
            : session,
        ),
        ground: history.ground.map((session) => ({
          ...session,
          swings: session.swings.map((swing) => ({
            ...swing,
            peakLeadTimesBodyWeight: swing.peakLeadTimesBodyWeight! * c,
          })),
        })),
      };
      judgeAthlete(scaled)
        .result.criteria.slice(0, 3)
        .forEach(({ value }, i) => {
          expect(value).toBeCloseTo(before[i]!.value!, 8);
        });
    }),
    { numRuns: 30 },
  );
});

describe('data after the judgement', () => {
  it('change nothing', () => {
    const early = historyOf({ asOf: '2025-09-17' });
    const cut = <Row extends { on: string }>(rows: readonly Row[]) => rows.filter(({ on }) => on <= early.asOf);
    const without = {
      ...early,
      strength: cut(early.strength),
      growth: cut(early.growth),
      driver: cut(early.driver),
      ground: cut(early.ground),
    };
    expect(judgeAthlete(early)).toEqual(judgeAthlete(without));
  });
});
