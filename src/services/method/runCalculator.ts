import { AppError, invalid } from '#src/errors/appError.ts';
import type { Calculator } from '#src/services/method/calculators.ts';

/**
 * Runs a calculator on a request that its schema has passed.
 *
 * @returns the response of the contract, every number of it finite
 * @throws {AppError} invalid, where the domain refuses the figures or they are beyond the reach of its numbers
 */
export async function runCalculator({ run }: Pick<Calculator, 'run'>, input: object): Promise<object> {
  const answer = await refused(input, async () => run(input));
  const path = notFinite(answer);
  if (path !== null) {
    throw new AppError('invalid', 'The figures are too large or too small to be worked with', [
      { path: '', message: `The figures are too large or too small: ${path} cannot be given` },
    ]);
  }
  return answer;
}

async function refused(input: object, work: () => Promise<object>): Promise<object> {
  try {
    return await work();
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    // The domain says `name requires X, got Y`; the field it means is named in it, if any is.
    const message = error.message.replace(/^\w+ requires/, 'This requires');
    const words = new Set(message.match(/\w+/g));
    return invalid(Object.keys(input).find((name) => words.has(name)) ?? '', message);
  }
}

/** Path of the first number that is not finite, or null. */
function notFinite(value: unknown, path = ''): string | null {
  if (typeof value === 'number') return Number.isFinite(value) ? null : path;
  if (typeof value !== 'object' || value === null) return null;
  for (const [key, part] of Object.entries(value)) {
    const found = notFinite(part, path === '' ? key : `${path}.${key}`);
    if (found !== null) return found;
  }
  return null;
}
