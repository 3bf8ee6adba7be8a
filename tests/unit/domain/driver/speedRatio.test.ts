import { describe, expect, it } from 'vitest';
import { speedRatio } from '#src/domain/driver/speedRatio.ts';

describe('speedRatio', () => {
  // G4: speeds of the overall distance standard (read), ratios recomputed
  it.each([
    [176, 120, 1.466667],
    [183, 125, 1.464],
  ])('G4: %i over %i', (ballSpeed, clubSpeed, expected) => {
    const result = speedRatio({ ballSpeed, clubSpeed });
    expect(result.ratio).toBeCloseTo(expected, 6);
    expect(result).toMatchObject({ plausible: true, reason: null });
  });

  // the range 1.1 to 1.52 is our own; both ends are in it
  it.each([
    [1.1, 1, true],
    [1.52, 1, true],
    [33, 30, true],
    [53.2, 35, true],
    [1.0999, 1, false],
    [1.5201, 1, false],
    [0, 40, false],
  ])('%f over %f plausible: %s', (ballSpeed, clubSpeed, plausible) => {
    const result = speedRatio({ ballSpeed, clubSpeed });
    expect(result.plausible).toBe(plausible);
    expect(result.reason === null).toBe(plausible);
  });

  it('has no ratio for a club that does not move', () => {
    expect(speedRatio({ ballSpeed: 50, clubSpeed: 0 })).toEqual({
      ratio: null,
      plausible: null,
      reason: 'club speed is 0: no ratio',
    });
  });

  it('refuses negative and infinite speeds', () => {
    expect(() => speedRatio({ ballSpeed: -1, clubSpeed: 40 })).toThrow(RangeError);
    expect(() => speedRatio({ ballSpeed: 60, clubSpeed: NaN })).toThrow(RangeError);
  });
});
