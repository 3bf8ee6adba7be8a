import { describe, expect, it } from 'vitest';
import { inCareOrder } from '#src/components/marks/careItem.ts';
import { statePath } from '#src/components/marks/statePath.ts';

describe('marks', () => {
  it('puts Stop and refer above a restriction above a caution, else in the order given', () => {
    const item = (kind: 'caution' | 'restriction' | 'stop-and-refer', title: string) => ({ kind, title, text: '' });
    const items = [item('caution', 'a'), item('restriction', 'b'), item('caution', 'c'), item('stop-and-refer', 'd')];
    expect(inCareOrder(items).map(({ title }) => title)).toEqual(['d', 'b', 'a', 'c']);
  });

  it.each([
    ['raised', [true, false, false, false], 'Cleared'],
    ['in hand', [true, true, true, false], 'Cleared'],
    ['cleared', [true, true, true, true], 'Cleared'],
    ['set aside', [true, true, true, true], 'Set aside'],
  ] as const)('an outrun that is %s has come so far', (state, reached, last) => {
    const path = statePath(state);
    expect(path.map((step) => step.reached)).toEqual(reached);
    expect(path.at(-1)!.word).toBe(last);
    expect(path.filter(({ now }) => now).map(({ step }) => step)).toEqual([state]);
  });
});
