/**
 * Moves labels that would lie on each other apart, each as little as it needs, keeping their order.
 *
 * @param places wished places along one axis
 * @param gap    least distance between two
 * @param bounds where they must stay, if they fit there at all
 * @returns new places in the order given
 * @example spreadLabels([10, 12], 8, [0, 100]) // → [7, 15]
 */
export function spreadLabels(
  places: readonly number[],
  gap: number,
  [low, high]: readonly [number, number] = [-Infinity, Infinity],
): number[] {
  // Neighbours that touch form a block that sits centred on the mean of what its members wished for.
  const blocks: { members: number[]; centre: number }[] = [];
  for (const index of [...places.keys()].sort((a, b) => places[a]! - places[b]! || a - b)) {
    let block = { members: [index], centre: clamp(places[index]!, 1) };
    for (let above = blocks.at(-1); above && bottom(above) + gap > top(block); above = blocks.at(-1)) {
      blocks.pop();
      const members = [...above.members, ...block.members];
      block = { members, centre: clamp(wished(members), members.length) };
    }
    blocks.push(block);
  }
  const out = [...places];
  for (const block of blocks) block.members.forEach((index, i) => (out[index] = top(block) + i * gap));
  return out;

  function wished(members: readonly number[]): number {
    return members.reduce((sum, index) => sum + places[index]!, 0) / members.length;
  }
  function clamp(centre: number, size: number): number {
    const half = ((size - 1) * gap) / 2;
    return Math.max(low + half, Math.min(high - half, centre));
  }
  function top({ members, centre }: { members: number[]; centre: number }): number {
    return centre - ((members.length - 1) * gap) / 2;
  }
  function bottom({ members, centre }: { members: number[]; centre: number }): number {
    return centre + ((members.length - 1) * gap) / 2;
  }
}
