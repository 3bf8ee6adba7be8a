import { z } from 'zod';
import { aboveZero, fromZero, oneOf, signed } from '#src/schemas/method/numbers.ts';

const given = {
  measure: oneOf(['stature', 'weight', 'bmi']).optional(),
  sex: oneOf(['male', 'female']).optional(),
  ageMonths: fromZero(1500).optional(),
};
const NEEDED = { measure: 'Choose what was measured', sex: 'Choose a sex', ageMonths: 'Give the age in months' };

/** A measure at an age, or a measure with a reference of one's own (L, M, S). */
export const growthCentileRequest = z
  .strictObject({
    ...given,
    lms: z.strictObject({ l: signed(1000), m: aboveZero(), s: aboveZero(1000) }).optional(),
    value: aboveZero(),
  })
  .superRefine((input, context) => {
    for (const name of Object.keys(NEEDED) as (keyof typeof NEEDED)[]) {
      if ((input[name] === undefined) === (input.lms !== undefined)) continue;
      const message = input.lms === undefined ? NEEDED[name] : 'Leave this out where L, M and S are given';
      context.addIssue({ code: 'custom', path: [name], message });
    }
  });
