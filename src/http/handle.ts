import type { APIContext, APIRoute } from 'astro';
import type { Viewer } from '#src/access/viewer.ts';
import { AppError } from '#src/errors/appError.ts';
import { problemOf } from '#src/http/problem.ts';
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
      return problemOf(error);
    }
  };
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
