import { describe, expect, it } from 'vitest';
import { ROUTES } from '#src/http/routes.ts';
import { CALCULATOR_NAMES } from '#src/schemas/method/calculatorNames.ts';
import { describeApi } from '#src/services/openapi/describeApi.ts';

interface Described {
  openapi: string;
  paths: Record<string, Record<string, { requestBody?: { content: Record<string, { schema: object }> } }>>;
}
const described = (await describeApi(ROUTES, 'http://127.0.0.1:4321')) as Described;

/** The paths that stand for a pattern of the registry. */
const pathsOf = (pattern: string): string[] =>
  pattern === '/api/method/[name]'
    ? CALCULATOR_NAMES.map((name) => `/api/method/${name}`)
    : [pattern.replace(/\[(?:\.\.\.)?(\w+)\]/g, '{$1}')];

describe('the description of the API', () => {
  it('holds every route of the API, and nothing else', () => {
    const api = ROUTES.filter(({ kind }) => kind === 'api');
    const expected = api.flatMap(({ method, pattern }) =>
      pathsOf(pattern).map((path) => `${method.toLowerCase()} ${path}`),
    );
    const found = Object.entries(described.paths).flatMap(([path, methods]) =>
      Object.keys(methods).map((method) => `${method} ${path}`),
    );
    expect(found.sort()).toEqual(expected.sort());
  });

  it.each(CALCULATOR_NAMES)('gives the request of %s field by field', (name) => {
    const { schema } = described.paths[`/api/method/${name}`]!['post']!.requestBody!.content['application/json']!;
    expect(schema).toMatchObject({ type: 'object', additionalProperties: false });
    // A part without a type would say nothing of what may be sent.
    const empty = JSON.stringify(schema).match(/"\w+":\{\}/g);
    expect(empty).toBeNull();
  });

  it('fails on a route that nobody described', async () => {
    const route = { pattern: '/api/new', method: 'POST', access: 'public', kind: 'api' } as const;
    await expect(describeApi([route], 'http://127.0.0.1')).rejects.toThrow('POST /api/new has no description');
  });
});
