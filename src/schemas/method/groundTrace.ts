import { z } from 'zod';
import { sampleRate } from '#src/schemas/method/curve.ts';
import { numberList } from '#src/schemas/method/lists.ts';
import { aboveZero, fromZero } from '#src/schemas/method/numbers.ts';

const samples = (foot: string) =>
  numberList({ empty: `Give the samples of the ${foot} foot`, least: 2, most: 1_000_000, min: 0, max: 1e9 });
const time = () => fromZero(3600);

/** Force or pressure under each foot through one swing, and when its moments were. */
export const groundTraceRequest = z
  .strictObject({
    sampleRate: sampleRate(),
    lead: samples('lead'),
    trail: samples('trail'),
    mass: aboveZero(1000).optional(),
    events: z.strictObject(
      {
        takeaway: time(),
        lateBackswing: time().optional(),
        top: time(),
        earlyDownswing: time().optional(),
        leadArmParallel: time(),
        midDownswing: time().optional(),
        impact: time(),
        finish: time().optional(),
      },
      { error: (issue) => (issue.code === 'invalid_type' ? 'Give the times of the swing' : undefined) },
    ),
  })
  .refine(({ lead, trail }) => lead.length === trail.length, {
    path: ['trail'],
    message: 'Give as many samples of the trail foot as of the lead foot',
  });
