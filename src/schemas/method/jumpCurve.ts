import { z } from 'zod';
import { forceSamples, sampleRate } from '#src/schemas/method/curve.ts';
import { aboveZero } from '#src/schemas/method/numbers.ts';

/** Vertical force of one plate, quiet standing first. */
export const jumpCurveRequest = z.strictObject({
  sampleRate: sampleRate(),
  force: forceSamples(),
  g: aboveZero(100).optional(),
});
