import { expect, it } from 'vitest';
import { mayBeCleared, type JudgementInBrief } from '#src/domain/outrun/mayBeCleared.ts';

const clear = (testingDayId: string | null, points = 1): JudgementInBrief => ({ level: null, points, testingDayId });
const look = (testingDayId: string | null): JudgementInBrief => ({ level: 'look', points: 3, testingDayId });

it.each([
  { why: 'nothing yet', judgements: [], may: false },
  { why: 'one clear day', judgements: [look('a'), clear('b')], may: false },
  { why: 'two clear days running', judgements: [look('a'), clear('b'), clear('c')], may: true },
  { why: 'the same day judged twice does not count', judgements: [look('a'), clear('b'), clear('b')], may: false },
  { why: 'a flag between them', judgements: [clear('a'), look('b'), clear('c')], may: false },
  { why: 'two points are too many', judgements: [clear('a'), clear('b', 2)], may: false },
  { why: 'the latest judgement of a day stands', judgements: [look('b'), clear('b'), clear('c')], may: true },
  {
    why: 'the latest judgement of a day stands, for worse',
    judgements: [clear('b'), look('b'), clear('c')],
    may: false,
  },
  { why: 'a driver session alone is no testing day', judgements: [clear('a'), clear(null)], may: false },
  { why: 'a clear driver session between does no harm', judgements: [clear('a'), clear(null), clear('b')], may: true },
  { why: 'a flag by a driver session breaks the run', judgements: [clear('a'), clear('b'), look(null)], may: false },
])('$why (our own rule, SCIENCE §9): $may', ({ judgements, may }) => expect(mayBeCleared(judgements)).toBe(may));
