import { intervalWords, plainNumber, signedNumber } from '#src/ui/words/numberWords.ts';

export interface Measured {
  value: number;
  interval: readonly [number, number] | null;
  threshold: number;
  /** The side of the threshold on which the criterion is met. */
  metWhen: 'above' | 'below';
  unit: string;
  digits: number;
  /** A change carries its sign, a ratio does not. */
  signed?: boolean;
}

/**
 * A criterion's value against its threshold, in words.
 *
 * @example
 * thresholdSentence({ value: 1.11, interval: [1.02, 1.2], threshold: 0.85, metWhen: 'above', unit: '', digits: 2 })
 * // → '1.11, 90 % interval 1.02 to 1.20; met above 0.85'
 */
export function thresholdSentence({ value, interval, threshold, metWhen, unit, digits, signed }: Measured): string {
  const after = unit === '' ? '' : unit === '°' ? '°' : ` ${unit}`;
  const number = signed ? signedNumber(value, digits) : plainNumber(value, digits);
  const between = interval ? `, 90 % interval ${intervalWords(interval, digits)}${after}` : ', no interval';
  return `${number}${after}${between}; met ${metWhen} ${plainNumber(threshold, digits)}${after}`;
}
