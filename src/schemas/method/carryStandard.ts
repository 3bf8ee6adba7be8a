import { z } from 'zod';
import { air, launch, onePressure, wind } from '#src/schemas/method/air.ts';
import { rowList } from '#src/schemas/method/lists.ts';
import { between } from '#src/schemas/method/numbers.ts';

/** Two flights are worked out a shot, so a request holds one session's shots and no more. */
export const MOST_SHOTS = 1000;

const shot = z.strictObject({
  ballSpeed: launch.ballSpeed,
  launchDeg: launch.launchDeg.nullable().optional(),
  spinRpm: launch.spinRpm.nullable().optional(),
  carry: between(0, 1000),
});

/** Shots of one session (m/s, degrees, rpm, m) and its air. */
export const carryStandardRequest = z.strictObject({
  shots: rowList(shot, { empty: 'Give one line a shot', most: MOST_SHOTS }),
  conditions: z
    .strictObject({ ...air, wind: wind() }, { error: 'Give the conditions' })
    .refine(onePressure[0], { ...onePressure[1], path: ['altitudeM'] }),
});
