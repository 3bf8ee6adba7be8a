import type { APIContext, APIRoute } from 'astro';
import type { Viewer } from '#src/access/viewer.ts';
import { AppError } from '#src/errors/appError.ts';
import { problemOf, statusOf } from '#src/http/problem.ts';
import { isForm } from '#src/http/readInput.ts';
import { safePath } from '#src/http/safePath.ts';
import { reportError } from '#src/errors/reportError.ts';

/**
 * A route for a signed-in person. Whether the role may come here has been asked already, from the route registry;
 * the service asks again. A plain object becomes JSON; nothing becomes 204; a Response is passed on.
 */
export function handle(work: (viewer: Viewer, context: APIContext) => Promise<unknown>): APIRoute {
  return answer((context) => {
    const { viewer } = context.locals;
    if (!viewer) throw new AppError('unauthenticated', 'Sign in first');
    return work(viewer, context);
  });
}

/** A route that needs no sign-in. */
export function handlePublic(work: (context: APIContext) => Promise<unknown>): APIRoute {
  return answer(work);
}

function answer(work: (context: APIContext) => Promise<unknown>): APIRoute {
  return async (context) => {
    try {
      const result = await work(context);
      if (result instanceof Response) return result;
      return result === undefined ? new Response(null, { status: 204 }) : Response.json(result);
    } catch (error) {
      reportError(error, context.routePattern);
      return isForm(context.request) ? backToForm(context, error) : problemOf(error);
    }
  };
}

/** A form that could not be done leads back to its page, which says why. */
function backToForm({ request, redirect }: APIContext, error: unknown): Response {
  const referer = request.headers.get('referer');
  const page = referer && URL.canParse(referer) ? safePath(new URL(referer).pathname) : '/today';
  return redirect(`${page}?${problemQuery(error)}`, 303);
}

/** What a page is told of an error in its address: a code, and the field that it is about. Never words. */
export function problemQuery(error: unknown): string {
  const code = error instanceof AppError ? error.code : statusOf(error) === 503 ? 'unavailable' : 'failed';
  const field = error instanceof AppError ? error.fields[0]?.path : undefined;
  return new URLSearchParams({ problem: code, ...(field ? { field } : {}) }).toString();
}

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

/**
 * A path parameter that must be an id. What is not one cannot exist.
 *
 * @throws {AppError} not-found
 */
export function uuidParam({ params }: Pick<APIContext, 'params'>, name: string): string {
  const value = params[name];
  if (!value || !UUID.test(value)) throw new AppError('not-found', 'Not found');
  return value.toLowerCase();
}
