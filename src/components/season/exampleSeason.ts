import type { Season, SeasonPoint } from '#src/ui/chart/season/season.ts';

const DAYS = ['2024-10-05', '2025-02-01', '2025-05-31', '2025-10-04', '2026-02-07', '2026-05-30'];

const points = (values: readonly number[], halfWidth: number): SeasonPoint[] =>
  values.map((value, i) => ({ on: DAYS[i]!, value, interval: [value - halfWidth, value + halfWidth] }));

/** Invented figures for the first page: they belong to nobody. */
export const EXAMPLE_SEASON: Season = {
  terms: [
    { name: 'Autumn 24', startsOn: '2024-09-02', endsOn: '2024-12-18' },
    { name: 'Spring 25', startsOn: '2025-01-06', endsOn: '2025-04-04' },
    { name: 'Summer 25', startsOn: '2025-04-22', endsOn: '2025-07-18' },
    { name: 'Autumn 25', startsOn: '2025-09-01', endsOn: '2025-12-17' },
    { name: 'Spring 26', startsOn: '2026-01-05', endsOn: '2026-04-02' },
    { name: 'Summer 26', startsOn: '2026-04-20', endsOn: '2026-07-17' },
  ],
  carry: points([158, 161, 166, 171, 178, 183], 3),
  strength: {
    name: 'Push, one leg',
    unit: 'N per kg',
    digits: 1,
    lead: points([16.9, 17.0, 17.2, 17.1, 17.2, 17.0], 0.5),
    trail: points([17.1, 17.4, 17.8, 18.2, 18.5, 18.8], 0.5),
  },
  growth: points([4.9, 5.3, 5.8, 6.4, 7.0, 7.3], 1.2).slice(1),
};
