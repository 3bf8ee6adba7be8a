import { defineMiddleware } from 'astro:middleware';
import { may } from '#src/access/permissions.ts';
import { viewerOf } from '#src/auth/viewerOf.ts';
import { pageHeaders } from '#src/http/pageHeaders.ts';
import { problem, problemOf, statusOf } from '#src/http/problem.ts';
import { reportError } from '#src/errors/reportError.ts';
import { findRoute, hasPattern } from '#src/http/routes.ts';

// Of the sign-in library's own endpoints only these two are ours; the rest does not exist.
const SIGN_IN_POSTS = new Set(['/api/auth/callback/password', '/api/auth/signout']);

/** The session becomes the viewer; the registry says who may come here; what is not registered does not exist. */
export const onRequest = defineMiddleware(async (context, next) => {
  const { request, routePattern, url } = context;
  const isApi = url.pathname.startsWith('/api/');
  context.locals.viewer = null;
  try {
    const route = findRoute(routePattern, request.method);
    if (!route || (routePattern === '/api/auth/[...auth]' && !SIGN_IN_POSTS.has(url.pathname))) {
      if (!isApi) return new Response(null, { status: 404 });
      return hasPattern(routePattern) && !routePattern.startsWith('/api/auth') ? problem(405) : problem(404);
    }
    const response = await (async () => {
      if (route.access === 'public' && route.kind === 'api') return next();
      context.locals.viewer = await viewerOf(request);
      if (route.access === 'public') return next();
      if (!context.locals.viewer) {
        if (isApi) return problem(401);
        return context.redirect(`/sign-in?to=${encodeURIComponent(url.pathname + url.search)}`, 303);
      }
      if (may(context.locals.viewer, route.access)) return next();
      return isApi ? problem(403, 'Your role does not do this') : next('/forbidden');
    })();
    return pageHeaders(response, { personal: route.access !== 'public' || context.locals.viewer !== null });
  } catch (error) {
    reportError(error, routePattern);
    if (isApi) return problemOf(error);
    const status = statusOf(error);
    if (status === 403) return next('/forbidden');
    return status === 503 ? next('/unavailable') : new Response(null, { status });
  }
});
