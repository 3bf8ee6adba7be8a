import { z } from 'zod';
import { launch, wind } from '#src/schemas/method/air.ts';
import { between, oneOf } from '#src/schemas/method/numbers.ts';

/** A launch, the air, and which drag and lift to use. */
export const flightRequest = z
  .strictObject({
    ...launch,
    density: between(0, 10).optional(),
    wind: wind(),
    model: oneOf(['smits-smith', 'constant']).optional(),
    cd: between(0, 10).optional(),
    cl: between(-10, 10).optional(),
  })
  .superRefine((input, context) => {
    if (input.model !== 'constant') return;
    for (const name of ['cd', 'cl'] as const) {
      if (input[name] === undefined) {
        context.addIssue({ code: 'custom', path: [name], message: 'The constant model needs this' });
      }
    }
  });
