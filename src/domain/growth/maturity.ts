import { fransenRatio } from '#src/domain/growth/fransenRatio.ts';
import { maturityCautions } from '#src/domain/growth/maturityCautions.ts';
import { mirwaldOffset } from '#src/domain/growth/mirwaldOffset.ts';
import { mooreOffset } from '#src/domain/growth/mooreOffset.ts';
import { mooreStatureOffset } from '#src/domain/growth/mooreStatureOffset.ts';
import type { Sex } from '#src/domain/growth/sex.ts';
import { requireFiniteNumber } from '#src/domain/statistics/requireFiniteNumber.ts';

/** Age in years, stature and sitting height in cm, mass in kg. */
export interface MaturityInput {
  sex: Sex;
  age: number;
  stature: number;
  sittingHeight?: number;
  mass?: number;
}

/** Years from peak height velocity (negative before it) and the age at it, years. */
export interface MaturityOffset {
  offset: number;
  ageAtPhv: number;
}

/** Before, around (−1 to +1 year, ends included) or after peak height velocity. */
export type MaturityBand = 'pre' | 'circa' | 'post';

/** Each estimate is null where its formula does not apply or an input is missing. */
export interface MaturityResult {
  mirwald: MaturityOffset | null;
  moore: MaturityOffset | null;
  mooreStature: MaturityOffset | null;
  fransen: { ratio: number; ageAtPhv: number } | null;
  band: MaturityBand | null;
  cautions: string[];
  reason: string | null;
}

/**
 * Estimates of time to peak height velocity by the published formulas that the inputs allow, and their band: from
 * Mirwald, else Moore, else Moore from stature.
 *
 * Sources: Mirwald 2002, Moore 2015, Fransen 2018 (boys only): SCIENCE §5.
 *
 * @returns offsets and ages in years, with the cautions as sentences
 * @throws {RangeError} if a number is not positive, or the sitting height is not below the stature
 * @example maturity({ sex: 'male', age: 12, stature: 150, sittingHeight: 78, mass: 40 }).mirwald?.offset // → −1.786643
 */
export function maturity(input: MaturityInput): MaturityResult {
  const { sex, age, stature, sittingHeight, mass } = input;
  requireFiniteNumber('maturity', 'age', age, { above: 0, max: 120 });
  requireFiniteNumber('maturity', 'stature', stature, { above: 0 });
  if (mass !== undefined) requireFiniteNumber('maturity', 'mass', mass, { above: 0 });
  if (sittingHeight !== undefined) {
    requireFiniteNumber('maturity', 'sittingHeight', sittingHeight, { above: 0 });
    if (sittingHeight >= stature) {
      throw new RangeError(`maturity requires a sitting height below the stature ${stature}, got ${sittingHeight}`);
    }
  }
  const withAge = (offset: number): MaturityOffset => ({ offset, ageAtPhv: age - offset });
  const full = sittingHeight !== undefined && mass !== undefined ? { sex, age, stature, sittingHeight, mass } : null;
  const mirwald = full ? withAge(mirwaldOffset(full)) : null;
  const byMoore = mooreOffset({ sex, age, stature, sittingHeight });
  const moore = byMoore === null ? null : withAge(byMoore);
  const mooreStature = sex === 'male' ? withAge(mooreStatureOffset({ age, stature })) : null;
  const ratio = full && sex === 'male' ? fransenRatio(full) : null;
  const fransen = ratio !== null && ratio > 0 ? { ratio, ageAtPhv: age / ratio } : null;
  const chosen = mirwald ?? moore ?? mooreStature;
  return {
    mirwald,
    moore,
    mooreStature,
    fransen,
    band: chosen && bandOf(chosen.offset),
    cautions: chosen ? maturityCautions({ sex, age, offset: chosen.offset, ratioUsed: fransen !== null }) : [],
    reason: reasonFor(input, ratio),
  };
}

function reasonFor({ sittingHeight, mass }: MaturityInput, ratio: number | null): string | null {
  const lacking: string[] = [];
  if (sittingHeight === undefined) lacking.push('the sitting height');
  if (mass === undefined) lacking.push('the mass');
  if (lacking.length > 0) return `without ${lacking.join(' and ')} not every estimate can be given`;
  return ratio !== null && ratio <= 0 ? 'the Fransen ratio has no meaning for these measures' : null;
}

function bandOf(offset: number): MaturityBand {
  if (offset < -1) return 'pre';
  return offset > 1 ? 'post' : 'circa';
}
