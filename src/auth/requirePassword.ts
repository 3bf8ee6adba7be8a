import { passwordProblem } from '#src/domain/account/passwordProblem.ts';
import { invalid } from '#src/errors/appError.ts';

const SENTENCES = {
  short: 'At least 8 characters',
  long: 'At most 256 characters',
  common: 'Too easy to guess',
} as const;

/**
 * Stops a password that is too short or easily guessed here.
 *
 * @param words names of the academy and of the person
 * @throws {AppError} invalid, for `password`
 */
export function requirePassword(password: string, words: readonly string[]): void {
  const problem = passwordProblem(password, words);
  if (problem) invalid('password', SENTENCES[problem]);
}
