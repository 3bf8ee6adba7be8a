import type { AthleteHistory, GroundSwing, StrengthSession } from '#src/domain/outrun/athleteHistory.ts';

/** A swing on two force plates at 500 Hz that asks 1.5 times body weight and comes back late. */
export function swing(changes: Partial<GroundSwing> = {}): GroundSwing {
  return {
    peakLeadTimesBodyWeight: 1.5,
    earlyDownswingPct: 63,
    impactPct: 52,
    afterLeadArmParallelMs: -10,
    sampleRateHz: 500,
    bothPlates: true,
    measure: 'force',
    peakLeadForceN: null,
    ...changes,
  };
}

/** Three trials around a mean, for one leg. */
export const around = (mean: number): number[] => [mean * 0.98, mean, mean * 1.02];

/** A session of a test with three trials a leg. */
export function session(on: string, test: StrengthSession['test'], lead: number, trail: number): StrengthSession {
  return { on, test, leadTrials: around(lead), trailTrials: around(trail) };
}

/**
 * An invented athlete of four terms: learning the tests in September 2024, a lead leg about 8 % weaker since, carry
 * pulling away, swings that ask 1.5 × body weight of a push of about 1.27.
 */
export function historyOf(changes: Partial<AthleteHistory> = {}): AthleteHistory {
  const terms = [
    { on: '2024-09-14', drive: '2024-09-18', push: 610, stature: 155, mass: 45, carry: 148 },
    { on: '2025-01-18', drive: '2025-01-22', push: 620, stature: 156, mass: 46, carry: 150 },
    { on: '2025-05-10', drive: '2025-05-15', push: 625, stature: 157, mass: 47, carry: 154 },
    { on: '2025-09-13', drive: '2025-09-17', push: 622, stature: 158, mass: 48, carry: 178 },
    { on: '2026-01-17', drive: '2026-01-21', push: 618, stature: 159, mass: 49.5, carry: 186 },
  ];
  return {
    asOf: '2026-01-21',
    birthDate: '2012-01-01',
    sex: 'male',
    strength: terms.flatMap(({ on, push }) => [
      session(on, 'push', push, push / 0.92),
      session(on, 'jump', 0.12, 0.13),
      session(on, 'hop', 1.32, 1.43),
    ]),
    growth: terms.map(({ on, stature, mass }) => ({ on, statureCm: stature, massKg: mass })),
    driver: terms.map(({ drive, carry }) => ({
      on: drive,
      carryStandardM: carry,
      windTooStrong: false,
      clubSpeed: 40,
      attackDeg: 1,
      dynamicLoftDeg: 14,
      carryMdcM: 8,
      clubSpeedMdc: 1.5,
    })),
    ground: [
      {
        on: '2026-01-21',
        rig: 'Plates A',
        club: 'driver',
        swings: [1.46, 1.49, 1.5, 1.51, 1.54].map((peak) => swing({ peakLeadTimesBodyWeight: peak })),
      },
    ],
    programme: { othersRaw: [], othersDemand: [], others: [] },
    ...changes,
  };
}
