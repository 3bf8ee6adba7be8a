import { describe, expect, it } from 'vitest';
import { care, type CareInput, type PainReport } from '#src/domain/care/care.ts';
import { CARE_FOOTER } from '#src/domain/care/careFooter.ts';

/** The lines for juniors are our own proposal (SCIENCE §8); adult ones after Thomeé 1997, from memory. */

const report = (changes: Partial<PainReport> = {}): PainReport => ({
  on: '2026-05-08',
  site: 'joint',
  pain: 1,
  nextMorning: 0,
  ...changes,
});
const levelOf = (reports: PainReport[], under18 = true) => care({ under18, reports }).level;

describe('checks of SCIENCE §8', () => {
  it('H1: pain 3, next morning 1, last week 3 → reduce', () => {
    const reports = [report({ on: '2026-05-02', pain: 3, nextMorning: 1 }), report({ pain: 3, nextMorning: 1 })];
    expect(levelOf(reports)).toBe('reduce');
  });
  it('H2: pain 5 → stop', () => expect(levelOf([report({ pain: 5 })])).toBe('stop-and-refer'));
  it('H3: back pain 2 twice → stop', () => {
    const reports = [report({ on: '2026-05-04', site: 'back', pain: 2 }), report({ site: 'back', pain: 2 })];
    expect(levelOf(reports)).toBe('stop-and-refer');
  });
  it('H4: a missing morning is never null', () => {
    expect(levelOf([report({ pain: 0, nextMorning: null })])).toBe('reduce');
    expect(levelOf([report({ pain: 0, nextMorning: undefined })])).toBe('reduce');
  });
});

describe('under 18', () => {
  it.each([
    { pain: 0, level: null },
    { pain: 1, level: null },
    { pain: 2, level: 'reduce' },
    { pain: 3, level: 'reduce' },
    { pain: 3.5, level: 'reduce' },
    { pain: 4, level: 'stop-and-refer' },
    { pain: 10, level: 'stop-and-refer' },
  ])('pain $pain: $level', ({ pain, level }) => expect(levelOf([report({ pain })])).toBe(level));

  it('a morning of 1 has settled, above 1 has not', () => {
    expect(levelOf([report({ nextMorning: 1 })])).toBeNull();
    expect(levelOf([report({ nextMorning: 1.5 })])).toBe('reduce');
  });

  it.each([{ nightPain: true }, { numbness: true }, { changesSwing: true }])('%o stops', (sign) => {
    expect(levelOf([report({ pain: 0, ...sign })])).toBe('stop-and-refer');
    expect(levelOf([report({ pain: 0, ...sign })], false)).toBe('stop-and-refer');
  });

  describe('back or bone pain of 2 or more on two days within 7', () => {
    const twice = (on: string, changes: Partial<PainReport> = {}) =>
      levelOf([report({ on, site: 'back', pain: 2, ...changes }), report({ site: 'bone', pain: 2 })]);
    it('7 days apart stops, 8 does not; one day is one', () => {
      expect(twice('2026-05-01')).toBe('stop-and-refer');
      expect(twice('2026-04-30')).toBe('reduce');
      expect(twice('2026-05-08')).toBe('reduce');
    });
    it('needs 2, and back or bone', () => {
      expect(twice('2026-05-05', { pain: 1.9 })).toBe('reduce');
      expect(twice('2026-05-05', { site: 'muscle' })).toBe('reduce');
    });
  });

  it('a rise over the week before reduces, however small; an older one does not count', () => {
    expect(levelOf([report({ on: '2026-05-05', pain: 0 }), report({ pain: 1 })])).toBe('reduce');
    expect(levelOf([report({ on: '2026-05-01', pain: 0 }), report({ pain: 1 })])).toBe('reduce');
    expect(levelOf([report({ on: '2026-04-30', pain: 0 }), report({ pain: 1 })])).toBeNull();
    expect(levelOf([report({ on: '2026-05-05', pain: 1 }), report({ pain: 1 })])).toBeNull();
  });

  it('a rise of one site counts beside a worse one that is older', () => {
    const reports = [
      report({ on: '2026-05-05', site: 'muscle', pain: 3 }),
      report({ on: '2026-05-05', site: 'back', pain: 0 }),
      report({ site: 'back', pain: 1 }),
    ];
    expect(levelOf(reports)).toBe('reduce');
  });
});

describe('at 18 and over', () => {
  it.each([
    { pain: 2, level: null },
    { pain: 3, level: 'reduce' },
    { pain: 5, level: 'reduce' },
    { pain: 5.1, level: 'stop-and-refer' },
  ])('pain $pain: $level', ({ pain, level }) => expect(levelOf([report({ pain })], false)).toBe(level));
});

describe('the answer', () => {
  it('says what is allowed, why, and the fixed footer', () => {
    expect(care({ under18: true, reports: [report()] })).toEqual({
      level: null,
      reasons: [],
      allowed: { impact: true, driver: true },
      footer: CARE_FOOTER,
    });
    const stopped = care({ under18: true, reports: [report({ pain: 6, nightPain: true })] });
    expect(stopped.allowed).toEqual({ impact: false, driver: false });
    expect(stopped.reasons).toHaveLength(2);
    expect(CARE_FOOTER).toContain('not a medical assessment');
  });

  it('is judged at the newest date, whatever the order, with all reports of that date', () => {
    const reports = [report({ pain: 0 }), report({ on: '2026-05-07', pain: 9, site: 'joint' })];
    expect(levelOf(reports)).toBeNull();
    expect(levelOf(reports.toReversed())).toBeNull();
    expect(levelOf([report({ pain: 0 }), report({ pain: 4, site: 'muscle' })])).toBe('stop-and-refer');
  });

  it('refuses no report, a pain outside 0 to 10, an unknown site and a broken date', () => {
    expect(() => care({ under18: true, reports: [] })).toThrow(RangeError);
    expect(() => levelOf([report({ pain: 11 })])).toThrow(RangeError);
    expect(() => levelOf([report({ nextMorning: -1 })])).toThrow(RangeError);
    expect(() => levelOf([report({ on: '2026-13-01' })])).toThrow(RangeError);
    expect(() => care({ under18: true, reports: [report({ site: 'knee' as never })] } satisfies CareInput)).toThrow(
      RangeError,
    );
  });
});
