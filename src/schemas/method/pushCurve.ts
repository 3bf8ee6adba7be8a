import { z } from 'zod';
import { forceSamples, sampleRate } from '#src/schemas/method/curve.ts';
import { aboveZero } from '#src/schemas/method/numbers.ts';

/** Force of an isometric push, quiet preload first. */
export const pushCurveRequest = z.strictObject({
  sampleRate: sampleRate(),
  force: forceSamples(),
  bodyWeight: aboveZero(1e6).optional(),
  g: aboveZero(100).optional(),
});
