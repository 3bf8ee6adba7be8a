import { describe, expect, it } from 'vitest';
import type { TestSession } from '#src/db/queries/testSessions.ts';
import { compareLegs, leadSideOf } from '#src/services/records/compareLegs.ts';
import { massNear, velocitySeries, type GrowthRow } from '#src/services/records/growthFigures.ts';
import { newestDay, pushPerKg } from '#src/services/records/strengthFigures.ts';

const session: TestSession = {
  ...{ athleteId: 'a', testingDayId: 'd', heldOn: '2026-09-12', testKey: 'push', testName: 'Push', unit: 'N' },
  ...{ quantity: 'force', better: 'higher', comparesIn: 'percent', cvPct: 4, noiseSource: '', capacity: 'push' },
  ...{ left: [490, 500, 510], right: [555, 560, 565], asked: 0 },
};
const growth = (measuredOn: string, statureCm: number, massKg = 50): GrowthRow => ({
  ...{ athleteId: 'a', measuredOn, place: 'academy', statureM: statureCm / 100, sittingHeightM: null, massKg },
});

describe('compareLegs', () => {
  it('compares the means with the typical error between days', () => {
    const compared = compareLegs(session, 'left')!;
    // SCIENCE A13: lead 500, trail 560 → −10.714286; TE of a push at n = 3: 3.403430 (§9)
    expect(compared.difference).toBeCloseTo(-10.714286, 6);
    expect(compared.typicalErrorPct!.lead).toBeCloseTo(3.40343, 5);
    // METHOD_API: SE = (min/max)·√(TE² + TE²), ± 1.644854·SE
    const se = (500 / 560) * Math.SQRT2 * 3.40343;
    expect(compared.interval![0]).toBeCloseTo(-10.714286 - 1.644854 * se, 4);
    expect(compared.beyondNoise).toBe(true);
  });

  it('is the mirror image when left, right and handedness are turned together', () => {
    const turned = compareLegs({ ...session, left: session.right, right: session.left }, 'right');
    expect(turned).toEqual(compareLegs(session, 'left'));
    expect(leadSideOf('right')).toBe('left');
    expect(leadSideOf('left')).toBe('right');
  });

  it('gives each leg the error of its own number of trials', () => {
    const { typicalErrorPct } = compareLegs({ ...session, left: [500] }, 'left')!;
    expect(typicalErrorPct!.lead).toBeCloseTo(Math.sqrt(16 + 2.5 ** 2), 9);
    expect(typicalErrorPct!.trail).toBeCloseTo(3.40343, 5);
  });

  it('compares joint angles in degrees, and nothing with a leg missing', () => {
    const degrees = { ...session, comparesIn: 'degrees' as const, left: [20], right: [30] };
    expect(compareLegs(degrees, 'left')).toMatchObject({ differenceUnit: '°', interval: null, beyondNoise: null });
    expect(compareLegs(degrees, 'left')!.difference).toBeCloseTo(-10, 9);
    expect(compareLegs({ ...session, left: [] }, 'left')).toBeNull();
  });
});

describe('growth figures', () => {
  it('spans at least five months, from the nearest such measure', () => {
    const rows = [
      growth('2025-09-13', 150),
      growth('2026-01-17', 152),
      growth('2026-05-09', 154.5),
      growth('2026-09-12', 156),
    ];
    expect(velocitySeries(rows).map(({ from, on }) => [from, on])).toEqual([
      ['2025-09-13', '2026-05-09'],
      ['2026-01-17', '2026-09-12'],
    ]);
  });

  it('leaves a height at home out of the velocity', () => {
    expect(velocitySeries([growth('2025-09-13', 150), { ...growth('2026-05-09', 170), place: 'home' }])).toEqual([]);
  });

  it('takes the mass nearest in time, within the days asked', () => {
    const rows = [growth('2026-09-01', 150, 49), growth('2026-09-20', 150, 51)];
    expect(massNear(rows, '2026-09-12', 31)).toBe(51);
    expect(massNear(rows, '2026-12-12', 31)).toBeNull();
  });
});

describe('strength figures', () => {
  it('divides the push by the mass of the day, and leaves out days without one', () => {
    const compared = [compareLegs(session, 'left')!, compareLegs({ ...session, heldOn: '2027-09-12' }, 'left')!];
    const [point, ...rest] = pushPerKg(compared, [growth('2026-09-12', 150, 50)]);
    expect(rest).toEqual([]);
    expect(point).toMatchObject({ on: '2026-09-12', lead: 10 });
    expect(point!.trail).toBeCloseTo(11.2, 9);
    expect(newestDay(compared).map(({ heldOn }) => heldOn)).toEqual(['2027-09-12']);
  });
});
