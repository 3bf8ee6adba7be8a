import type { APIContext } from 'astro';
import type { z } from 'zod';
import { safePath } from '#src/http/safePath.ts';
import { parse, parseBody } from '#src/http/parseBody.ts';

interface Input<T> {
  input: T;
  /** The answer: JSON for a script; for a form the way back to the page it came from. */
  done: (result: unknown, page: string) => Response;
}

/**
 * What a person or a script sent, in the shape of `schema`: JSON, or a plain form (every form works without scripts).
 * A form may carry `to`, the page of ours to go on to; empty fields count as not given. A field whose name ends in `[]`
 * is a list, of whatever length.
 *
 * @throws {AppError} invalid
 */
export async function readInput<S extends z.ZodType>(
  context: Pick<APIContext, 'request' | 'redirect'>,
  schema: S,
): Promise<Input<z.infer<S>>> {
  const { request } = context;
  if (!isForm(request)) {
    return { input: await parseBody(request, schema), done: (result) => Response.json(result) };
  }
  const params = new URLSearchParams(await request.text());
  const { to, ...fields } = Object.fromEntries([...params].filter(([name]) => !name.endsWith('[]')));
  const given: Record<string, string | string[]> = Object.fromEntries(
    Object.entries(fields).filter(([, value]) => value !== ''),
  );
  for (const name of params.keys()) if (name.endsWith('[]')) given[name.slice(0, -2)] = params.getAll(name);
  return { input: parse(given, schema), done: (_, page) => context.redirect(safePath(to, page), 303) };
}

/** Whether a request is a plain form's, sent by a browser without a script. */
export const isForm = (request: Request): boolean =>
  /^application\/x-www-form-urlencoded\b/i.test(request.headers.get('content-type') ?? '');
