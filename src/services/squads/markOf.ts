/** The difference mark of one test as a judgement keeps it. */
export interface StoredMark {
  test: string;
  mark: 'inside noise' | 'beyond noise' | 'same side twice';
}

const WEIGHT = ['inside noise', 'beyond noise', 'same side twice'] as const;

/** The heaviest difference mark of a judgement; null where the lead is nowhere weaker or nothing was judged. */
export function markOf(marks: unknown): StoredMark | null {
  if (!Array.isArray(marks)) return null;
  const known = (marks as StoredMark[]).filter(({ mark }) => WEIGHT.includes(mark));
  return known.toSorted((a, b) => WEIGHT.indexOf(b.mark) - WEIGHT.indexOf(a.mark))[0] ?? null;
}
