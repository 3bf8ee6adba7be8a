import { describe, expect, it } from 'vitest';
import type { Season, SeasonPoint } from '#src/ui/chart/season/season.ts';
import { seasonLayout, withError } from '#src/ui/chart/season/seasonLayout.ts';
import { seasonSentence, seasonTable } from '#src/ui/chart/season/seasonWords.ts';
import { SEASON_SIZES } from '#src/ui/chart/season/sizes.ts';
import { shortTermName, termBands } from '#src/ui/chart/season/termBands.ts';

const point = (on: string, value: number, half: number): SeasonPoint => ({
  on,
  value,
  interval: [value - half, value + half],
});

const season: Season = {
  terms: [
    { name: 'Autumn 2025', startsOn: '2025-09-01', endsOn: '2025-12-17' },
    { name: 'Spring 2026', startsOn: '2026-01-05', endsOn: '2026-04-02' },
    { name: 'Summer 2026', startsOn: '2026-04-20', endsOn: '2026-07-17' },
  ],
  carry: [point('2025-10-04', 178, 3), point('2026-05-30', 185, 3)],
  strength: {
    name: 'Push',
    unit: 'N per kg',
    digits: 1,
    lead: [point('2025-10-04', 16.8, 0.5), point('2026-02-07', 16.7, 0.5)],
    trail: [point('2025-10-04', 18, 0.5), point('2026-02-07', 18.3, 0.5)],
  },
  growth: [point('2026-02-07', 7.4, 1.2)],
  outruns: [
    {
      steps: [
        { on: '2026-02-10', level: 'look' },
        { on: '2026-05-30', level: 'act' },
      ],
    },
  ],
};

describe('Season line', () => {
  it('keeps every place inside the drawing, in every size, and lanes off each other', () => {
    for (const size of SEASON_SIZES) {
      const { lanes, plot, height } = seasonLayout(season, size);
      lanes.slice(1).forEach((lane, i) => expect(lane.top).toBeGreaterThan(lanes[i]!.top + lanes[i]!.height));
      expect(height).toBeGreaterThan(plot.bottom);
      for (const { top, height: tall, series } of lanes) {
        for (const place of series.flatMap(({ drawn }) => drawn.points)) {
          expect(place.x).toBeGreaterThanOrEqual(plot.x1);
          expect(place.x).toBeLessThanOrEqual(plot.x2);
          expect(place.y).toBeGreaterThanOrEqual(top);
          expect(place.y).toBeLessThanOrEqual(top + tall);
        }
      }
    }
  });

  it('breaks carry, which missed the spring, and joins strength, which did not', () => {
    const [carry, strength] = seasonLayout(season, SEASON_SIZES[2]!).lanes;
    expect(carry!.series[0]!.drawn.line).toBe('');
    expect(carry!.series[0]!.drawn.points.map(({ alone }) => alone)).toEqual([true, true]);
    expect(strength!.series.map(({ drawn }) => drawn.line.startsWith('M'))).toEqual([true, true]);
  });

  it('puts a higher value higher, and labels the last value with its error', () => {
    const [carry, strength] = seasonLayout(season, SEASON_SIZES[2]!).lanes;
    expect(carry!.series[0]!.drawn.points[1]!.y).toBeLessThan(carry!.series[0]!.drawn.points[0]!.y);
    expect(carry!.ends.map(({ text }) => text)).toEqual(['185 ± 3 m']);
    expect(strength!.ends.map(({ text }) => text)).toEqual(['trail 18.3', 'lead 16.7']);
  });

  it('has no lane, column or word of an outrun where none is handed over', () => {
    const { outruns, ...family } = season;
    expect(outruns).toHaveLength(1);
    expect(seasonLayout(family, SEASON_SIZES[0]!).outruns).toBeNull();
    expect(JSON.stringify([seasonSentence(family), seasonTable(family)])).not.toMatch(/outrun|look|act/i);
  });

  it('says in a lane why it is empty', () => {
    const bare: Season = { terms: [], carry: [], strength: null, growth: [] };
    for (const size of SEASON_SIZES) {
      expect(seasonLayout(bare, size).lanes.map(({ axis, without }) => [axis, without])).toEqual([
        [null, 'no drives yet'],
        [null, 'not tested yet'],
        [null, 'needs two heights, months apart'],
      ]);
    }
  });

  it('says the same numbers in words and in its table (by hand)', () => {
    expect(seasonSentence(season)).toBe(
      'Season line, Autumn 2025 to Summer 2026. Carry 178 to 185 m, 4 October 2025 to 30 May 2026. ' +
        'Push, lead 16.8 to 16.7 N per kg, 4 October 2025 to 7 February 2026. ' +
        'Push, trail 18.0 to 18.3 N per kg, 4 October 2025 to 7 February 2026. ' +
        'Growth 7.4 cm a year on 7 February 2026. Outrun: Look 10 February 2026, Act 30 May 2026.',
    );
    expect(seasonTable(season).rows).toEqual([
      ['4 October 2025', '178 (175 to 181)', '16.8 (16.3 to 17.3)', '18.0 (17.5 to 18.5)', null, null],
      ['7 February 2026', null, '16.7 (16.2 to 17.2)', '18.3 (17.8 to 18.8)', '7.4 (6.2 to 8.6)', null],
      ['10 February 2026', null, null, null, null, 'Look'],
      ['30 May 2026', '185 (182 to 188)', null, null, null, 'Act'],
    ]);
  });

  it('says an uneven interval in full, an even one as ±', () => {
    expect(withError(point('2026-02-07', 7.4, 1.2), 1)).toBe('7.4 ± 1.2');
    expect(withError({ on: '2026-02-07', value: 10, interval: [7, 11] }, 0)).toBe('10, 7 to 11');
    expect(withError({ on: '2026-02-07', value: 10, interval: null }, 0)).toBe('10');
  });
});

describe('terms', () => {
  it.each([
    ['Autumn 2024', 'Aut 24'],
    ['Spring 25', 'Spr 25'],
    ['Michaelmas', 'Mic'],
    ['2025 spring', '2025'],
  ])('%s → %s', (name, short) => {
    expect(shortTermName(name)).toBe(short);
  });

  it('labels fewer terms where there is less room', () => {
    const terms = Array.from({ length: 7 }, (_, i) => ({
      name: `Autumn ${2020 + i}`,
      startsOn: `${2020 + i}-09-01`,
      endsOn: '',
    }));
    const labels = (width: number) =>
      termBands(terms, (date) => ((Number(date.slice(0, 4)) - 2020) / 7) * width, width, 13).map(({ label }) => label);
    expect(labels(840)).toEqual(terms.map(({ name }) => name));
    expect(labels(490)).toEqual(terms.map(({ name }) => shortTermName(name)));
    expect(labels(250).filter(Boolean)).toEqual(['Aut 20', 'Aut 22', 'Aut 24', 'Aut 26']);
  });
});
