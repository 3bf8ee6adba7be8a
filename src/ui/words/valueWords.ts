import { plainNumber } from '#src/ui/words/numberWords.ts';

/** How a unit shows a stored value (SI, angles in degrees): what to multiply by, and how many decimals are honest. */
const UNITS: Readonly<Record<string, { perSi: number; digits: number }>> = {
  N: { perSi: 1, digits: 0 },
  'N/kg': { perSi: 1, digits: 1 },
  'N·m': { perSi: 1, digits: 0 },
  m: { perSi: 1, digits: 2 },
  cm: { perSi: 100, digits: 1 },
  kg: { perSi: 1, digits: 1 },
  s: { perSi: 1, digits: 1 },
  ms: { perSi: 1000, digits: 0 },
  '°': { perSi: 1, digits: 0 },
  'm/s': { perSi: 1, digits: 1 },
  rpm: { perSi: 1, digits: 0 },
};

/** An SI value in a unit, without it: the unit stands in the header. */
export function inUnit(valueSi: number, unit: string): string {
  const { perSi, digits } = UNITS[unit] ?? { perSi: 1, digits: 0 };
  return plainNumber(valueSi * perSi, digits);
}

/** An SI value with its unit. */
export const withUnit = (valueSi: number, unit: string): string => `${inUnit(valueSi, unit)} ${unit}`;

/** What an SI value is multiplied by to stand in a unit. */
export const perSi = (unit: string): number => UNITS[unit]?.perSi ?? 1;

/** Decimals that a unit is shown with. */
export const digitsOf = (unit: string): number => UNITS[unit]?.digits ?? 0;
