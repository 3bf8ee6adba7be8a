import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Published regressions of peak power on jump height and body mass. */
export type PeakPowerEquation =
  'sayers-squat-jump' | 'sayers-countermovement' | 'harman' | 'johnson-bahamonde' | 'canavan-vescovi-women';

/** Height of a jump with both legs (cm), body mass (kg), and stature (cm) for Johnson–Bahamonde. */
export interface PeakPowerInput {
  equation: PeakPowerEquation;
  heightCm: number;
  massKg: number;
  statureCm?: number;
}

/** Peak power in W, null with a reason where the equation does not reach. */
export interface PeakPower {
  peakPowerW: number | null;
  reason: string | null;
}

const COEFFICIENTS: Record<
  PeakPowerEquation,
  { perCm: number; perKg: number; perStatureCm: number; constant: number }
> = {
  'sayers-squat-jump': { perCm: 60.7, perKg: 45.3, perStatureCm: 0, constant: -2055 },
  'sayers-countermovement': { perCm: 51.9, perKg: 48.9, perStatureCm: 0, constant: -2007 },
  // minus 1822: the plus sign is widely copied and gives more than twice the published mean
  harman: { perCm: 61.9, perKg: 36, perStatureCm: 0, constant: -1822 },
  'johnson-bahamonde': { perCm: 78.6, perKg: 60.3, perStatureCm: -15.3, constant: -1308 },
  'canavan-vescovi-women': { perCm: 65.1, perKg: 25.8, perStatureCm: 0, constant: -1413.1 },
};

/**
 * Peak power of a two-legged vertical jump by a published regression. All were made on adults: never for one leg,
 * never as a norm for children. Height and power correlate by construction (Linthorne 2021).
 *
 * Source: Sayers et al. 1999 (squat jump read, countermovement from memory); Harman et al. 1991; Johnson &
 * Bahamonde 1996 (from memory); Canavan & Vescovi 2004 (read).
 *
 * @param input height ≥ 0, mass above 0; stature above 0 where the equation asks for it
 * @returns null with a reason where stature is missing or the equation falls to 0 or below
 * @throws {RangeError} if a number is out of range
 * @example peakPower({ equation: 'harman', heightCm: 30, massKg: 50 }).peakPowerW // → 1835
 */
export function peakPower({ equation, heightCm, massKg, statureCm }: PeakPowerInput): PeakPower {
  requireFiniteNumber('peakPower', 'heightCm', heightCm, { min: 0 });
  requireFiniteNumber('peakPower', 'massKg', massKg, { above: 0 });
  if (statureCm !== undefined) requireFiniteNumber('peakPower', 'statureCm', statureCm, { above: 0 });
  const { perCm, perKg, perStatureCm, constant } = COEFFICIENTS[equation];
  if (perStatureCm !== 0 && statureCm === undefined)
    return { peakPowerW: null, reason: 'this equation needs the stature' };
  const peakPowerW = perCm * heightCm + perKg * massKg + perStatureCm * (statureCm ?? 0) + constant;
  if (peakPowerW <= 0)
    return { peakPowerW: null, reason: 'too low and too light for this equation: it gives no power' };
  return { peakPowerW, reason: null };
}
