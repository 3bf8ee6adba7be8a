import { z } from 'zod';
import { DEFAULT_POLICY, type OutrunPolicy } from '#src/domain/outrun/policy.ts';
import { calendarDate } from '#src/schemas/method/calendarDate.ts';
import { numberList, rowList } from '#src/schemas/method/lists.ts';
import { aboveZero, between, flag, fromZero, signed, whole } from '#src/schemas/method/numbers.ts';

const DAYS = 1_000_000;
const day = () => z.union([calendarDate(), whole(-DAYS, DAYS)], { error: 'Give a date as YYYY-MM-DD or a whole day' });
const percent = () => fromZero(1000);
const force = () => fromZero(1e6);
const speed = () => fromZero(1000);
const shares = () => numberList({ empty: 'Give one number a swing', most: 1000, min: 0, max: 100 });
const summary = () => z.strictObject({ mean: fromZero(1000), cvPct: percent(), n: whole(0, 10_000) });

const legs = z.strictObject({
  lead: fromZero(1e9),
  trail: fromZero(1e9),
  teLeadPct: aboveZero(1000),
  teTrailPct: aboveZero(1000),
});
const pair = z.strictObject({
  day: day(),
  carry: fromZero(1000),
  strength: force(),
  stature: fromZero(300),
  age: fromZero(120),
});
const athlete = z.strictObject({ strength: force(), clubSpeed: speed() });

const thresholds = Object.fromEntries(
  Object.keys(DEFAULT_POLICY).map((key) => [key, signed(1e6).optional()]),
) as Record<keyof OutrunPolicy, z.ZodOptional<z.ZodNumber>>;

/** Summaries of one athlete; each block may be left out, and then its criterion cannot say. */
export const outrunRequest = z.strictObject({
  asOf: day().optional(),
  leadDeficit: z
    .strictObject({ values: rowList(legs, { empty: 'Give one line a test and session', most: 1000 }) })
    .optional(),
  divergence: z
    .strictObject({
      pairs: rowList(pair, { empty: 'Give one line a session', most: 200 }),
      othersRaw: numberList({
        empty: 'Give one number an athlete',
        least: 0,
        most: 1000,
        min: -1e6,
        max: 1e6,
      }).optional(),
      asOf: day().optional(),
    })
    .optional(),
  demand: z
    .strictObject({ peakLead: summary(), capacity: summary(), programmeMedian: fromZero(1000).nullable().optional() })
    .optional(),
  lateReturn: z
    .strictObject({
      earlyDownswing: shares(),
      impact: shares(),
      typicalErrorPct: fromZero(100).nullable().optional(),
    })
    .refine(({ earlyDownswing, impact }) => earlyDownswing.length === impact.length, {
      path: ['impact'],
      message: 'Give as many shares at impact as at early downswing',
    })
    .optional(),
  aheadOfStrength: z
    .strictObject({ others: rowList(athlete, { empty: 'Give one line an athlete', least: 0, most: 1000 }), athlete })
    .optional(),
  latePeak: z
    .strictObject({
      afterLeadArmParallelMs: numberList({ empty: 'Give one number a swing', most: 1000, min: -10_000, max: 10_000 }),
    })
    .optional(),
  delivery: z
    .strictObject({
      carryChange: signed(1000),
      carryMdc: fromZero(1000),
      clubSpeedChange: signed(1000),
      clubSpeedMdc: fromZero(1000),
      attackChangeDeg: signed(180).nullable().optional(),
      loftChangeDeg: signed(180).nullable().optional(),
      strengthRisen: flag(),
    })
    .optional(),
  context: z
    .strictObject({
      hipRotation: rowList(z.strictObject({ lead: fromZero(180), trail: fromZero(180) }), {
        empty: 'Give one line a measurement',
        least: 0,
        most: 100,
      }).optional(),
      pain: between(0, 10).nullable().optional(),
      velocityInSpurtBand: flag().nullable().optional(),
      driverBallsChangePct: signed(1e6).nullable().optional(),
    })
    .optional(),
  policy: z.strictObject(thresholds).optional(),
});
