import { z } from 'zod';
import { aboveZero, oneOf } from '#src/schemas/method/numbers.ts';

/** Sex, age in years, lengths in cm, mass in kg. */
export const maturityRequest = z
  .strictObject({
    sex: oneOf(['male', 'female']),
    age: aboveZero(120),
    stature: aboveZero(300),
    sittingHeight: aboveZero(300).optional(),
    mass: aboveZero(1000).optional(),
  })
  .refine(({ stature, sittingHeight }) => sittingHeight === undefined || sittingHeight < stature, {
    path: ['sittingHeight'],
    message: 'Give a sitting height below the stature',
  });
