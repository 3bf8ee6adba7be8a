import { createHash } from 'node:crypto';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { AppError } from '#src/errors/appError.ts';
import { authPool } from '#src/db/client.ts';

/**
 * Limits on attempts, counted in PostgreSQL so that every process counts together. A limit passes with time: nobody is
 * locked out for good, and another way in stays open.
 */
function makeLimiter(keyPrefix: string, points: number, duration: number): RateLimiterPostgres {
  return new RateLimiterPostgres({
    storeClient: authPool(),
    storeType: 'pool',
    tableName: 'attempt_limit',
    tableCreated: true,
    keyPrefix,
    points,
    duration,
  });
}

const QUARTER_HOUR_S = 15 * 60;
const ACCOUNT_TRIES = 8;
const ADDRESS_TRIES = 60;
const RESETS_ASKED = 5;
const METHOD_A_MINUTE = 120;

const limiters = new Map<string, RateLimiterPostgres>();

function limiter(name: string, points: number, durationS: number): RateLimiterPostgres {
  const known = limiters.get(name) ?? makeLimiter(name, points, durationS);
  limiters.set(name, known);
  return known;
}

// A name that someone tries may be an address: the table keeps only its hash.
const keyOf = (text: string): string => createHash('sha256').update(text).digest('base64url');

const account = () => limiter('sign-in-name', ACCOUNT_TRIES, QUARTER_HOUR_S);
const address = () => limiter('sign-in-address', ADDRESS_TRIES, QUARTER_HOUR_S);
const reset = () => limiter('reset', RESETS_ASKED, QUARTER_HOUR_S);
const link = () => limiter('link', ADDRESS_TRIES, QUARTER_HOUR_S);
const present = () => limiter('present', ACCOUNT_TRIES, QUARTER_HOUR_S);
const method = () => limiter('method', Number(process.env['METHOD_LIMIT_PER_MINUTE'] ?? METHOD_A_MINUTE), 60);

async function consume(limit: RateLimiterPostgres, key: string): Promise<void> {
  try {
    await limit.consume(keyOf(key), 1);
  } catch (error) {
    if (!(error instanceof RateLimiterRes)) throw error;
    const seconds = Math.ceil(error.msBeforeNext / 1000);
    throw new AppError('too-many', `Too many tries. Try again in ${Math.ceil(seconds / 60)} min.`, [], seconds);
  }
}

/**
 * Counts one try to sign in.
 *
 * @throws {AppError} too-many, for the name or for the address
 */
export async function consumeSignIn(name: string, clientAddress: string): Promise<void> {
  await consume(address(), clientAddress);
  await consume(account(), name);
}

/**
 * Counts one asking for a new password, whether the address is anyone's or not.
 *
 * @throws {AppError} too-many, for the e-mail or for the address it is asked from
 */
export async function consumeReset(email: string, fromAddress: string): Promise<void> {
  await consume(link(), fromAddress);
  await consume(reset(), email);
}

/**
 * Counts one use of a link with a token.
 *
 * @throws {AppError} too-many
 */
export const consumeLink = (fromAddress: string): Promise<void> => consume(link(), fromAddress);

/**
 * Counts one asking of a signed-in person's present password.
 *
 * @throws {AppError} too-many
 */
export const consumePresent = (personId: string): Promise<void> => consume(present(), personId);

/** A right password forgets the tries on that name. */
export const forgiveSignIn = (name: string) => account().delete(keyOf(name));

/**
 * Counts one call of a calculator.
 *
 * @throws {AppError} too-many
 */
export const consumeMethod = (clientAddress: string): Promise<void> => consume(method(), clientAddress);

/** The address that our own HTTP server saw at the socket; it overwrites what a stranger may have sent. */
export const clientAddress = (request: Request): string => request.headers.get('x-marram-client') ?? 'unknown';
