/** A seeded stream of numbers: the same seed gives the same demo on every machine (mulberry32). */
export interface Random {
  /** Uniform in [0, 1). */
  next(): number;
  /** Normal with this mean and standard deviation (Box–Muller). */
  normal(mean: number, sd: number): number;
  /** True with this probability. */
  chance(probability: number): boolean;
  /** A random version-4 id. */
  uuid(): string;
}

export function makeRandom(seed: number): Random {
  let state = seed >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
  const normal = (mean: number, sd: number) =>
    mean + sd * Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next());
  const uuid = () => {
    const hex = Array.from({ length: 32 }, () => Math.floor(next() * 16).toString(16));
    hex[12] = '4';
    hex[16] = '89ab'[Math.floor(next() * 4)]!;
    return hex.join('').replace(/^(.{8})(.{4})(.{4})(.{4})(.{12})$/, '$1-$2-$3-$4-$5');
  };
  return { next, normal, chance: (probability) => next() < probability, uuid };
}
