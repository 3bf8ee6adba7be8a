/**
 * Exact probability that Kendall's S of n untied, unrelated values is at least s: the share of the n! orders whose
 * count of concordant minus discordant pairs reaches s. Orders are counted by inversions, adding a value at a time.
 *
 * Source: Kendall 1938; Mann 1945.
 *
 * @param n values, a whole number ≥ 1 (exact in doubles up to 18)
 * @param s S, from −n(n − 1)/2 to n(n − 1)/2
 * @throws {RangeError} if n is not a whole number from 1 to 18
 * @example kendallExact(5, 6) // → 14/120
 */
export function kendallExact(n: number, s: number): number {
  if (!Number.isInteger(n) || n < 1 || n > 18)
    throw new RangeError(`kendallExact requires whole n from 1 to 18, got ${n}`);
  let orders = [1];
  for (let size = 2; size <= n; size += 1) {
    const next = new Array<number>(orders.length + size - 1).fill(0);
    orders.forEach((count, inversions) => {
      for (let added = 0; added < size; added += 1) next[inversions + added]! += count;
    });
    orders = next;
  }
  const pairs = (n * (n - 1)) / 2;
  let reached = 0;
  let all = 0;
  orders.forEach((count, inversions) => {
    all += count;
    if (pairs - 2 * inversions >= s) reached += count;
  });
  return reached / all;
}
