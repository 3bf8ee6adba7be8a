import { changedInput, LARGEST_CHANGE, LEVERS, type Change, type Lever } from '#src/domain/outrun/changedInput.ts';
import { judgeCriteria } from '#src/domain/outrun/judgeCriteria.ts';
import { isClear } from '#src/domain/outrun/level.ts';
import type { OutrunInput } from '#src/domain/outrun/outrunInput.ts';

const MOST_CHANGES = 4;
/** A longer list of changes is worth saying only if it asks this share, or less, of the lead leg's rise alone. */
const WORTH_SAYING = 0.75;

/**
 * The smallest changes after which there is no level and at most one point, found by judging the changed input again.
 * Each is a set of levers of which none can be left out, or one that spares the lead leg a quarter of its rise or
 * more; within a set the lead leg's rise is made smallest first, then the next. Steps are tenths of a per cent.
 *
 * @returns at most four changes, those with fewest levers first; none if no change within reach is enough
 */
export function smallestChanges(input: OutrunInput): Change[] {
  const { criteria } = judgeCriteria(input);
  const counts = (name: string) => criteria.some((criterion) => criterion.name === name && criterion.points > 0);
  const useful: Record<Lever, boolean> = {
    lead: true,
    carry: counts('divergence'),
    swing: counts('demand'),
    return: counts('late-return'),
  };
  const levers = LEVERS.filter((lever) => useful[lever]);
  const enough = (change: Change) => isClear(judgeCriteria(changedInput(input, change)));

  const changes: Change[] = [];
  for (const set of subsetsBySize(levers)) {
    const change = smallestWithin(set, enough);
    if (!change || set.some((lever) => change[lever] === 0)) continue;
    const subsets = changes.filter((smaller) => Object.keys(smaller).every((lever) => lever in change));
    const spares = subsets.every(({ lead }) => lead !== undefined && (change.lead ?? 0) <= WORTH_SAYING * lead);
    if (spares) changes.push(change);
  }
  return changes.slice(0, MOST_CHANGES);
}

/** All non-empty subsets, the small ones first, each in the order of the list. */
function subsetsBySize(levers: readonly Lever[]): Lever[][] {
  const masks = Array.from({ length: 2 ** levers.length - 1 }, (_, i) => i + 1);
  return masks.map((mask) => levers.filter((_, i) => mask & (1 << i))).sort((a, b) => a.length - b.length);
}

/** The smallest change within a set: each lever in turn, with those after it as large as they go. */
function smallestWithin(set: readonly Lever[], enough: (change: Change) => boolean): Change | null {
  const change: Partial<Record<Lever, number>> = {};
  for (const lever of set) change[lever] = LARGEST_CHANGE[lever];
  if (!enough(change)) return null;
  for (const lever of set) {
    // every criterion falls as a lever rises, so the steps that are enough lie above those that are not
    let low = -1;
    let high = LARGEST_CHANGE[lever];
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (enough({ ...change, [lever]: middle })) high = middle;
      else low = middle;
    }
    change[lever] = high;
  }
  return change;
}
