import { intervalWords, plainNumber } from '#src/ui/words/numberWords.ts';

export interface Difference {
  /** 100·(lead − trail)/larger, %: negative where the lead is weaker. */
  estimate: number;
  /** 90 % interval of the same, %. */
  interval: readonly [number, number] | null;
  /** Half-width of the noise around 0, %. */
  noise: number | null;
}

/** Whether a difference stands clear of its noise: its interval leaves 0 out. Null where there is no interval. */
export const isBeyondNoise = ({ interval }: Pick<Difference, 'interval'>): boolean | null =>
  interval && (interval[1] < 0 || interval[0] > 0);

/**
 * A forest row in words, with the numbers that are drawn.
 *
 * @example
 * forestSentence({ estimate: -11.1, interval: [-15.2, -7], noise: 4.1 })
 * // → 'Lead 11.1 % below trail, 90 % interval −15.2 to −7.0 %, beyond the noise of ±4.1 %'
 */
export function forestSentence(difference: Difference): string {
  const { estimate, interval, noise } = difference;
  const beyond = isBeyondNoise(difference);
  const size = plainNumber(Math.abs(estimate), 1);
  const where =
    Number(size) === 0 ? 'Lead level with trail' : `Lead ${size} % ${estimate < 0 ? 'below' : 'above'} trail`;
  if (!interval) return `${where}, no interval: too few trials`;
  const against = noise === null ? 'noise' : `the noise of ±${plainNumber(noise, 1)} %`;
  return `${where}, 90 % interval ${intervalWords(interval, 1)} %, ${beyond ? 'beyond' : 'inside'} ${against}`;
}
