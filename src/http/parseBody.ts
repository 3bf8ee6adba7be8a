import type { z } from 'zod';
import { AppError, type FieldError } from '#src/errors/appError.ts';

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
  throw new AppError('invalid', 'Please check the values', fieldErrors(result.error));
}

/** Of a body that is wrong all over, the first hundred places say enough. */
const MOST_ERRORS = 100;

function fieldErrors({ issues }: z.ZodError): FieldError[] {
  const errors = issues.slice(0, MOST_ERRORS).flatMap((issue) => {
    const path = issue.path.map(String);
    if (issue.code !== 'unrecognized_keys') return [{ path: path.join('.'), message: issue.message }];
    return issue.keys.map((key) => ({ path: [...path, key].join('.'), message: 'There is no such field' }));
  });
  return errors.slice(0, MOST_ERRORS);
}
