/** What can go wrong on purpose, each with one HTTP status (see `src/http/problem.ts`). */
export type AppErrorCode =
  'unauthenticated' | 'forbidden' | 'not-found' | 'conflict' | 'invalid' | 'too-large' | 'too-many' | 'unavailable';

export interface FieldError {
  path: string;
  message: string;
}

/** The only error that services throw on purpose. `message` may be shown to the person. */
export class AppError extends Error {
  constructor(
    readonly code: AppErrorCode,
    message: string,
    readonly fields: readonly FieldError[] = [],
    /** Seconds after which it may work, where that is known. */
    readonly retryAfterS?: number,
  ) {
    super(message);
    this.name = 'AppError';
  }
}

/** Throws the error that both an unknown id and an id out of scope give. */
export function notFound(what: string): never {
  throw new AppError('not-found', `No such ${what}`);
}

/** Throws a field error. */
export function invalid(path: string, message: string): never {
  throw new AppError('invalid', message, [{ path, message }]);
}
