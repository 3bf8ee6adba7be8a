import { handlePublic } from '#src/http/handle.ts';
import { ROUTES } from '#src/http/routes.ts';
import { describeApi } from '#src/services/openapi/describeApi.ts';

const described = new Map<string, Promise<object>>();

/** Made at the first request for an address, and then kept: the routes do not change while the process runs. */
export const GET = handlePublic(async ({ site, url }) => {
  const { origin } = site ?? url;
  const known = described.get(origin) ?? describeApi(ROUTES, origin);
  described.set(origin, known);
  return known;
});
