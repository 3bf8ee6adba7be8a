import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { modelCarry } from '#src/domain/driver/modelCarry.ts';
import { shotExclusion } from '#src/domain/driver/shotExclusion.ts';
import type { JudgedShot } from '#src/domain/driver/shotExclusion.ts';

const launch = { ballSpeed: 58, launchDeg: 12, spinRpm: 2800 };
const good = (carry: number): JudgedShot => ({ ...launch, clubSpeed: 40, carry });
const rules = (shots: JudgedShot[], density = 1.2, wind = 0) =>
  shotExclusion({ shots, density, wind }).shots.map((exclusion) => exclusion?.rule ?? null);
const session = [178, 180, 181, 183, 185].map(good);

describe('shotExclusion', () => {
  it('keeps an ordinary session', () => {
    expect(shotExclusion({ shots: session, density: 1.2 })).toEqual({ shots: Array(5).fill(null), reason: null });
  });

  it('proposes a speed ratio outside 1.1 to 1.52, the limits included as plausible (our own limits, SCIENCE §7)', () => {
    const ratios = [1.09, 1.1, 1.52, 1.53].map((ratio) => ({
      ...good(181),
      clubSpeed: 40,
      ballSpeed: 40 * ratio,
      launchDeg: null,
    }));
    expect(rules(ratios)).toEqual(['speed ratio', null, null, 'speed ratio']);
    expect(rules([{ ...good(181), clubSpeed: 0 }, ...session])[0]).toBe('speed ratio');
  });

  it('proposes a carry under 70 % of the modelled one, in the air and wind of the session (our own limit)', () => {
    const air = { density: 1.2, wind: -2 };
    const modelled = modelCarry(launch, air)!;
    const shots = [
      good(0.699 * modelled),
      good(0.701 * modelled),
      good(modelled),
      good(1.01 * modelled),
      good(0.98 * modelled),
    ];
    expect(rules(shots, air.density, air.wind).slice(0, 1)).toEqual(['short of the model']);
    expect(shotExclusion({ shots, ...air }).shots[0]!.reason).toMatch(/is 69 % of/);
    expect(rules(shots, air.density, air.wind)[1]).not.toBe('short of the model');
  });

  it('proposes a carry over 3.5 scaled MAD from the median of the shots left (by hand: median 100, MAD 2, limit 10.38)', () => {
    const blind = (carry: number): JudgedShot => ({
      ...launch,
      clubSpeed: null,
      launchDeg: null,
      spinRpm: null,
      carry,
    });
    const carries = [98, 100, 102, 97, 103, 100, 110.37, 89.62];
    expect(rules(carries.map(blind))).toEqual(Array(8).fill(null));
    const far = [98, 100, 102, 97, 103, 100, 99, 101, 112].map(blind);
    // median 100, deviations 2 0 2 3 3 0 1 1 12 → MAD 2, limit 3.5 · 1.4826 · 2 = 10.3782
    expect(rules(far)).toEqual([...Array<null>(8).fill(null), 'far from the median']);
    expect(rules([...far.slice(0, 8), blind(110.37)])[8]).toBeNull();
    expect(rules([...far.slice(0, 8), blind(89.6)])[8]).toBe('far from the median');
  });

  it('judges the median after the other two rules, so that mishits do not move it', () => {
    const mishits = Array.from({ length: 6 }, () => good(60));
    const judged = rules([...mishits, ...session]);
    expect(judged).toEqual([...Array<string>(6).fill('short of the model'), ...Array<null>(5).fill(null)]);
  });

  it('does not judge a reading that was not taken', () => {
    const shots = session.map((one) => ({ ...one, clubSpeed: null, spinRpm: null }));
    expect(rules([...shots, { ...shots[0]!, carry: 60 }])).toEqual([
      ...Array<null>(5).fill(null),
      'far from the median',
    ]);
  });

  it('says why the median cannot judge: half of the carries alike, one shot, or none left', () => {
    const alike = shotExclusion({ shots: [180, 180, 180, 180, 230].map(good), density: 1.2 });
    expect(alike.shots).toEqual(Array(5).fill(null));
    expect(alike.reason).toMatch(/median absolute deviation is 0/);
    expect(shotExclusion({ shots: [good(180)], density: 1.2 }).reason).toMatch(/one shot is left/);
    expect(shotExclusion({ shots: [good(20)], density: 1.2 }).reason).toMatch(/no shot is left/);
  });

  it('gives each shot the same verdict in any order', () => {
    const shots = [...session, good(60), good(230), { ...good(180), clubSpeed: 30 }];
    const verdict = new Map(shots.map((one, i) => [one, rules(shots)[i]]));
    fc.assert(
      fc.property(fc.shuffledSubarray(shots, { minLength: shots.length }), (shuffled) => {
        expect(rules(shuffled)).toEqual(shuffled.map((one) => verdict.get(one)));
      }),
      { numRuns: 10 },
    );
  });

  it('refuses no shot and negative readings', () => {
    expect(() => shotExclusion({ shots: [], density: 1.2 })).toThrow(RangeError);
    expect(() => shotExclusion({ shots: [good(-1)], density: 1.2 })).toThrow(RangeError);
    expect(() => shotExclusion({ shots: session, density: -1 })).toThrow(RangeError);
  });
});
