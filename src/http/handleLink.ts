import type { APIContext, APIRoute } from 'astro';
import type { z } from 'zod';
import { handlePublic, problemQuery } from '#src/http/handle.ts';
import { isForm, readInput } from '#src/http/readInput.ts';
import { reportError } from '#src/errors/reportError.ts';

/**
 * The act of a page whose address holds a token. Such a page sends no Referer, so the way back to it when something is
 * wrong is made from the token that the form carried, if it has the form of one.
 *
 * @param page below which the token stands: `/invite`
 * @param work gives the page to go on to
 */
export function handleLink<S extends z.ZodType<{ token: string }>>(
  page: string,
  schema: S,
  work: (input: z.infer<S>, context: APIContext) => Promise<string>,
): APIRoute {
  return handlePublic(async (context) => {
    const { request, redirect } = context;
    const token = isForm(request) ? new URLSearchParams(await request.clone().text()).get('token') : null;
    try {
      const { input } = await readInput(context, schema);
      const next = await work(input, context);
      return token === null ? Response.json({ next }) : redirect(next, 303);
    } catch (error) {
      if (token === null || !/^[A-Za-z0-9_-]{43}$/.test(token)) throw error;
      reportError(error, page);
      return redirect(`${page}/${token}?${problemQuery(error)}`, 303);
    }
  });
}
