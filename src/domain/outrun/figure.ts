/**
 * A number as coaches read it: fixed decimals, a real minus sign, never "−0".
 *
 * @param value    any finite number
 * @param decimals digits after the point, default 1
 * @example figure(-8.02) // → '−8.0'
 */
export function figure(value: number, decimals = 1): string {
  const text = Math.abs(value).toFixed(decimals);
  return value < 0 && Number(text) !== 0 ? `−${text}` : text;
}

/**
 * The 90 % interval in words, to stand in brackets behind an estimate.
 *
 * @param interval low and high end
 * @param unit     as it is written after a number, with its space, for example ' %'
 * @example intervalText([-11.44, -4.61], ' %') // → '90 % interval −11.4 to −4.6 %'
 */
export function intervalText([low, high]: readonly [number, number], unit: string, decimals = 1): string {
  return `90 % interval ${figure(low, decimals)} to ${figure(high, decimals)}${unit}`;
}
