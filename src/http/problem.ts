import { AppError, type AppErrorCode, type FieldError } from '#src/errors/appError.ts';

export const STATUS: Readonly<Record<AppErrorCode, number>> = {
  unauthenticated: 401,
  forbidden: 403,
  'not-found': 404,
  conflict: 409,
  'too-large': 413,
  invalid: 422,
  'too-many': 429,
  unavailable: 503,
};

const TITLES: Readonly<Record<number, string>> = {
  401: 'Sign in first',
  403: 'Not for this role',
  404: 'Not found',
  405: 'Not this way',
  409: 'Changed in the meantime',
  413: 'Too large',
  415: 'JSON only',
  422: 'Please check the values',
  429: 'Too many tries',
  500: 'Something went wrong on our side',
  503: 'Not available just now',
};

/** An `application/problem+json` answer (RFC 9457). */
export function problem(
  status: number,
  detail?: string,
  more: { errors?: readonly FieldError[]; retryAfterS?: number } = {},
): Response {
  const headers = new Headers({ 'content-type': 'application/problem+json', 'cache-control': 'no-store' });
  if (more.retryAfterS !== undefined) headers.set('retry-after', String(more.retryAfterS));
  const body = { type: 'about:blank', title: TITLES[status] ?? 'Error', status, detail, errors: more.errors };
  return new Response(JSON.stringify(body), { status, headers });
}

/** The status of a thrown thing: what we throw on purpose has its own, a lost database is 503, all else 500. */
export function statusOf(error: unknown): number {
  if (error instanceof AppError) return STATUS[error.code];
  return isUnavailable(error) ? 503 : 500;
}

/** The answer to a thrown thing. An unknown error says nothing of itself. */
export function problemOf(error: unknown): Response {
  const status = statusOf(error);
  if (error instanceof AppError) {
    const { message, fields, retryAfterS } = error;
    return problem(status, message, { errors: fields, ...(retryAfterS === undefined ? {} : { retryAfterS }) });
  }
  return status === 503 ? problem(503, 'Please try again in a moment', { retryAfterS: 3 }) : problem(500);
}

// Connection refused or lost, the server starting or stopping, no free connection in time.
const LOST = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', '57P01', '57P02', '57P03', '53300', '08006', '08001']);

function isUnavailable(error: unknown): boolean {
  if (!(error instanceof Error)) return false;
  const code = (error as { code?: unknown }).code;
  if (typeof code === 'string' && LOST.has(code)) return true;
  return /timeout exceeded when trying to connect|Connection terminated/.test(error.message);
}
