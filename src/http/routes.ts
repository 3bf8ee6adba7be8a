import type { Permission } from '#src/access/permissions.ts';

/** What a route asks for: a permission, nobody in particular, or the sign-in library's own check. */
export type Access = Permission | 'public';
export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

interface Route {
  pattern: string;
  method: Method;
  access: Access;
  /** `page` sends a stranger to the sign-in page, `api` answers with a status. */
  kind: 'page' | 'api';
}

const page = (pattern: string, access: Access): Route => ({ pattern, method: 'GET', access, kind: 'page' });
const api = (method: Method, pattern: string, access: Access): Route => ({ pattern, method, access, kind: 'api' });

/**
 * Every route and method with what it asks for. What is not listed here does not exist: the middleware answers 404,
 * and a test fails when a file under `src/pages` is missing from the list or the other way round.
 */
export const ROUTES: readonly Route[] = [
  page('/', 'public'),
  page('/404', 'public'),
  page('/500', 'public'),
  page('/forbidden', 'public'),
  page('/unavailable', 'public'),
  page('/sign-in', 'public'),
  page('/privacy', 'public'),
  page('/method', 'public'),
  page('/method/[name]', 'public'),
  page('/account', 'session:own'),
  page('/today', 'today:see'),
  page('/squads', 'squad:see'),
  page('/squads/[id]', 'squad:see'),
  page('/asked', 'trial:settle'),
  page('/athletes/[id]', 'record:see'),
  page('/athletes/[id]/strength', 'record:see'),
  page('/athletes/[id]/driver', 'record:see'),
  page('/athletes/[id]/ground', 'record:see'),
  page('/athletes/[id]/growth', 'record:see'),
  page('/outruns', 'outrun:see'),
  page('/outruns/[id]', 'outrun:see'),
  page('/family', 'family:see'),
  page('/family/[athleteId]', 'family:see'),
  page('/my/progress', 'own:see'),
  page('/dev/mail', 'public'),
  page('/invite/[token]', 'public'),
  page('/reset', 'public'),
  page('/reset/[token]', 'public'),
  page('/programme/people', 'people:manage'),
  page('/programme/squads', 'programme:manage'),
  page('/programme/terms', 'programme:manage'),

  api('GET', '/api/auth/[...auth]', 'public'),
  api('POST', '/api/auth/[...auth]', 'public'),
  api('POST', '/api/session/acting-as', 'session:own'),
  api('POST', '/api/trials/[id]/settle', 'trial:settle'),
  api('POST', '/api/growth-measures/[id]/settle', 'trial:settle'),
  api('POST', '/api/athletes/[id]/handedness', 'handedness:correct'),
  api('POST', '/api/athletes/[id]/restrictions', 'restriction:set'),
  api('POST', '/api/restrictions/[id]/clear', 'restriction:clear'),
  api('POST', '/api/invitations', 'people:manage'),
  api('POST', '/api/invitations/[id]/revoke', 'people:manage'),
  api('POST', '/api/invite/accept', 'public'),
  api('POST', '/api/reset/ask', 'public'),
  api('POST', '/api/reset/set', 'public'),
  api('POST', '/api/account/password', 'session:own'),
  api('POST', '/api/family/[athleteId]/sign-in', 'child-sign-in:make'),
  api('POST', '/api/family/[athleteId]/password', 'child-sign-in:make'),
  api('POST', '/api/squads', 'programme:manage'),
  api('POST', '/api/squads/[id]/name', 'programme:manage'),
  api('POST', '/api/squads/[id]/coaches', 'programme:manage'),
  api('POST', '/api/athletes', 'programme:manage'),
  api('POST', '/api/athletes/[id]/squad', 'programme:manage'),
  api('POST', '/api/terms', 'programme:manage'),
  api('POST', '/api/terms/[id]', 'programme:manage'),
  api('GET', '/api/method', 'public'),
  api('POST', '/api/method/[name]', 'public'),
  api('GET', '/api/openapi.json', 'public'),
];

// The framework spells its patterns in small letters.
const BY_KEY = new Map(ROUTES.map((route) => [`${route.method} ${route.pattern.toLowerCase()}`, route]));

/** The registered route for a pattern and method; HEAD reads as GET. */
export function findRoute(pattern: string, method: string): Route | undefined {
  return BY_KEY.get(`${method === 'HEAD' ? 'GET' : method} ${pattern.toLowerCase()}`);
}

/** Whether the pattern is registered for another method. */
export const hasPattern = (pattern: string): boolean =>
  ROUTES.some((route) => route.pattern.toLowerCase() === pattern.toLowerCase());
