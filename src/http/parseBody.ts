import type { z } from 'zod';
import { AppError } from '#src/errors/appError.ts';

/**
 * The body of a request as JSON, in the shape of `schema` and nothing beside it.
 *
 * @throws {AppError} invalid, with a path for each field that is wrong; too-large from the body cap
 */
export async function parseBody<S extends z.ZodType>(request: Request, schema: S): Promise<z.infer<S>> {
  if (!/^application\/json\b/i.test(request.headers.get('content-type') ?? '')) {
    throw new AppError('invalid', 'The body must be application/json', [{ path: '', message: 'JSON only' }]);
  }
  let body: unknown;
  try {
    body = await request.json();
  } catch (error) {
    if (error instanceof SyntaxError) {
      throw new AppError('invalid', 'The body is not JSON', [{ path: '', message: 'Not JSON' }]);
    }
    throw error;
  }
  return parse(body, schema);
}

/**
 * `value` in the shape of `schema`.
 *
 * @throws {AppError} invalid, with a path for each field that is wrong
 */
export function parse<S extends z.ZodType>(value: unknown, schema: S): z.infer<S> {
  const result = schema.safeParse(value);
  if (result.success) return result.data;
  const fields = result.error.issues.map(({ path, message }) => ({ path: path.join('.'), message }));
  throw new AppError('invalid', 'Please check the values', fields);
}
