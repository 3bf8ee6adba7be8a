import { describe, expect, it } from 'vitest';
import { plainWords } from '#src/components/record/plainWords.ts';
import { seasonOf } from '#src/components/record/seasonOf.ts';

const record: Parameters<typeof plainWords>[0] = {
  header: { givenName: 'Linnea', leadSide: 'left', velocity: { perYear: 7.44, standardError: 0.7 } },
  carry: [
    { heldOn: '2025-09-17', carryM: 150, interval: [147, 153] },
    { heldOn: '2026-09-14', carryM: 171, interval: [167, 175] },
  ],
  newest: [{ testName: 'Single-leg push', unit: 'N', heldOn: '2026-09-12', leadMean: 500, trailMean: 560 }],
};

describe('plainWords', () => {
  it('says what was measured with its noise, and which leg is nearer the target', () => {
    expect(plainWords(record, 'child')).toEqual([
      'On 14 September 2026 Linnea carried the driver about 171 m through the air on a still, mild day, 21 m further than on 17 September 2025, give or take 5 m.',
      'At the test of 12 September 2026 (single-leg push) Linnea reached 500 N with the left leg and 560 N with the right.',
      'The left leg is the one nearer the target.',
      'Linnea is growing 7.4 cm a year, give or take 1.2 cm.',
    ]);
  });

  it('has no word of an outrun, a deficit or a verdict', () => {
    const words = [...plainWords(record, 'child'), ...plainWords(record, 'self')].join(' ');
    expect(words).not.toMatch(/outrun|deficit|weaker|look|act\b|flag|judg|noise|criteri/i);
  });

  it('calls a change inside its noise much the same', () => {
    const near = [record.carry[0]!, { ...record.carry[1]!, carryM: 153 }];
    expect(plainWords({ ...record, carry: near }, 'child')[0]).toContain('much the same as on 17 September 2025');
  });
});

describe('seasonOf', () => {
  const figures = { terms: [], carry: [], strength: [], velocity: [] };

  it('has no outrun lane unless it is given events', () => {
    expect('outruns' in seasonOf(figures)).toBe(false);
    expect(seasonOf(figures, [])).toMatchObject({ outruns: [] });
  });

  it('draws the levels held and the end', () => {
    const event = (kind: string, on: string, level: string | null) => ({ outrunId: 'o', kind, on, level });
    const events = [
      event('raised', '2026-05-12', 'look'),
      event('discussed', '2026-05-14', null),
      event('level up', '2026-09-14', 'act'),
      event('cleared', '2026-12-01', null),
    ];
    expect(seasonOf(figures, events).outruns).toEqual([
      {
        steps: [
          { on: '2026-05-12', level: 'look' },
          { on: '2026-09-14', level: 'act' },
          { on: '2026-12-01', level: null, word: 'Cleared' },
        ],
      },
    ]);
  });
});
