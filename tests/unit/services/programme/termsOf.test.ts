import { expect, it } from 'vitest';
import { termsOf } from '#src/services/programme/termsOf.ts';

it('begins a term where dates stand more than 45 days apart, and ends it before the next', () => {
  expect(termsOf(['2025-01-22', '2024-09-14', '2024-09-18', '2025-01-18'])).toEqual([
    { name: 'Autumn 2024', startsOn: '2024-09-14', endsOn: '2025-01-17' },
    { name: 'Spring 2025', startsOn: '2025-01-18', endsOn: '2025-04-18' },
  ]);
  expect(termsOf([])).toEqual([]);
  expect(termsOf(['2025-05-01', '2025-07-01']).map(({ name }) => name)).toEqual(['Summer 2025', 'Summer 2025 2']);
});
