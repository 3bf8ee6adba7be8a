import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { jumpHeight } from '#src/domain/jump/jumpHeight.ts';
import { expectRelative } from '#tests/unit/domain/expectRelative.ts';

describe('jumpHeight', () => {
  it('C1: half a second in the air (closed form)', () => {
    expectRelative(jumpHeight({ flightTime: 0.5 }).height, 0.3065625);
    expect(jumpHeight({ flightTime: 0.5, g: 9.80665 }).height).toBeCloseTo(0.3064578, 7);
    expect(jumpHeight({ flightTime: 0.5 })).toMatchObject({ rsiMod: null, reason: null });
  });

  it('C3: twice body weight for .30 s from rest (closed form)', () => {
    const { height, flightTime } = jumpHeight({ takeoffVelocity: 2.943 });
    expectRelative(height, 0.44145);
    expectRelative(flightTime, 0.6);
  });

  it('C4: height over time to take-off (closed form)', () => {
    const { height, flightTime, rsiMod } = jumpHeight({ takeoffVelocity: 2.2918312, timeToTakeoff: 0.7 });
    expect(height).toBeCloseTo(0.267711, 6);
    expect(flightTime).toBeCloseTo(0.467244, 6);
    expect(rsiMod).toBeCloseTo(0.382444, 6);
  });

  it('reads a single-leg jump of .35 s within 3.6 mm at 240 frames a second', () => {
    // dh = g·t·dt/4 (closed form)
    const error = jumpHeight({ flightTime: 0.35 + 1 / 240 }).height - jumpHeight({ flightTime: 0.35 }).height;
    expect(error).toBeCloseTo(0.0036, 4);
  });

  it('goes there and back', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 1, noNaN: true }),
        fc.double({ min: 1, max: 20, noNaN: true }),
        (flightTime, g) => {
          const there = jumpHeight({ flightTime, g });
          const back = jumpHeight({ takeoffVelocity: there.takeoffVelocity, g });
          expectRelative(back.flightTime, flightTime, 1e-12);
          expectRelative(there.height, (g * flightTime ** 2) / 8, 1e-12);
        },
      ),
    );
  });

  it('gives 0 for no flight', () => {
    expect(jumpHeight({ flightTime: 0 })).toMatchObject({ height: 0, takeoffVelocity: 0 });
  });

  it('refuses both, neither, negative and zero where it would divide', () => {
    const both = { flightTime: 0.5, takeoffVelocity: 2 };
    expect(() => jumpHeight(both)).toThrow('exactly one of flightTime and takeoffVelocity');
    expect(() => jumpHeight({} as { flightTime: number })).toThrow(RangeError);
    expect(() => jumpHeight({ flightTime: -0.1 })).toThrow(RangeError);
    expect(() => jumpHeight({ takeoffVelocity: -0.1 })).toThrow(RangeError);
    expect(() => jumpHeight({ flightTime: 0.5, g: 0 })).toThrow(RangeError);
    expect(() => jumpHeight({ flightTime: 0.5, timeToTakeoff: 0 })).toThrow(RangeError);
  });
});
