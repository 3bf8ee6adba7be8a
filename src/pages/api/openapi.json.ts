import { handlePublic } from '#src/http/handle.ts';
import { ROUTES } from '#src/http/routes.ts';
import { describeApi } from '#src/services/openapi/describeApi.ts';

export const GET = handlePublic(async ({ site, url }) => describeApi(ROUTES, (site ?? url).origin));
