/** One line of Care: a Stop and refer, a restriction that staff set, or a caution (growth, soreness). */
export interface CareItem {
  kind: 'stop-and-refer' | 'restriction' | 'caution';
  /** A word or two: `Stop and refer`, `Restriction`, `Care`, `Growing fast`. */
  title: string;
  text: string;
}

const ORDER = ['stop-and-refer', 'restriction', 'caution'] as const;

/** Care in its order of weight; within a kind the order given stays. */
export const inCareOrder = (items: readonly CareItem[]): CareItem[] =>
  items.toSorted((a, b) => ORDER.indexOf(a.kind) - ORDER.indexOf(b.kind));
