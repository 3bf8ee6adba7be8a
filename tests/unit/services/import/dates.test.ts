import { describe, expect, it } from 'vitest';
import { dateInName } from '#src/services/import/fileDates.ts';
import { orderByVote, readDate, settleDateOrders } from '#src/services/import/settleDates.ts';
import { tableFrom } from '#tests/unit/services/import/tableFrom.ts';

describe('dateInName', () => {
  it.each([
    ['battery_2024-09-14.csv', '2024-09-14'],
    ['2024_09_14 battery.csv', '2024-09-14'],
    ['driver 14.09.2024.csv', '2024-09-14'],
    ['trackside-20240914-1.csv', '2024-09-14'],
    ['14 Sept 2024/swing1.csv', '2024-09-14'],
    ['14Sep2024.csv', '2024-09-14'],
    ['2024-01-01/battery_2024-09-14.csv', '2024-09-14'],
    ['battery_3.csv', null],
    ['battery_2024-02-30.csv', null],
  ])('%s', (path, date) => expect(dateInName(path, 'dmy')).toBe(date));

  it('does not choose between two readings', () => {
    expect(dateInName('battery_05-04-2026.csv', null)).toBeNull();
  });
});

describe('the order of day and month', () => {
  it('is what the whole column allows', () => {
    expect(orderByVote(['08/07/2012', '16/12/2011'])).toBe('dmy');
    expect(orderByVote(['08/07/2012', '12/16/2011'])).toBe('mdy');
    expect(orderByVote(['08/07/2012', '05/06/2012'])).toBeNull();
    expect(orderByVote(['2012-07-08'])).toBe('ymd');
  });

  it('is not upset by a date that there is not', () => {
    expect(orderByVote(['16/12/2011', '31/02/2026', '17/11/2011'])).toBe('dmy');
  });

  it('is found elsewhere where a column does not tell: same kind first, then the folder, then nowhere', () => {
    const one = tableFrom('Name,Date,Height (cm),Mass (kg)\nA,05/04/2026,150,40\n', 'one.csv');
    const other = tableFrom('Name,Date,Height (cm),Mass (kg)\nA,25/04/2026,150,40\n', 'other.csv');
    const american = tableFrom('Name,Born,Sex\nA B,12/25/2012,F\n', 'list.csv');
    expect(settleDateOrders([one, other, american], []).orderOf(one)).toBe('dmy');
    expect(settleDateOrders([one, american], []).orderOf(one)).toBe('mdy');
    expect(settleDateOrders([one], ['battery_25-04-2026.csv']).orderOf(one)).toBe('dmy');
    expect(settleDateOrders([one], []).orderOf(one)).toBeNull();
  });

  it('is what the heading says', () => {
    const table = tableFrom('Name,Date (mm/dd/yyyy),Height (cm),Mass (kg)\nA,05/04/2026,150,40\n');
    expect(settleDateOrders([table], []).orderOf(table)).toBe('mdy');
  });
});

describe('readDate', () => {
  it('reads the day number of a spreadsheet', () => {
    // Common practice: day 45913 of the 1900 system is 13 September 2025.
    expect(readDate('45913', 'dmy')).toBe('2025-09-13');
    expect(readDate('31/02/2026', 'dmy')).toBeNull();
  });
});
