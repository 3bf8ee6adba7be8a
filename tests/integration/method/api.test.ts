import type { APIContext, APIRoute } from 'astro';
import { beforeAll, describe, expect, it } from 'vitest';
import { CALCULATOR_NAMES } from '#src/schemas/method/calculatorNames.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';

const LIMIT = 6;
const ORIGIN = 'http://127.0.0.1:4321';

useTestDatabase();
let calculate: APIRoute;
let list: APIRoute;
let describeApi: APIRoute;

beforeAll(async () => {
  // Read when the first call is counted, after the test's environment is set.
  process.env['METHOD_LIMIT_PER_MINUTE'] = String(LIMIT);
  calculate = (await import('#src/pages/api/method/[name].ts')).POST;
  list = (await import('#src/pages/api/method/index.ts')).GET;
  describeApi = (await import('#src/pages/api/openapi.json.ts')).GET;
});

let addresses = 0;
/** A caller whom nobody has counted yet. */
const someone = (): string => `192.0.2.${(addresses += 1)}`;

interface Call {
  name: string;
  body: string;
  type?: string | null;
  from?: string;
}

async function call({ name, body, type = 'application/json', from = someone() }: Call) {
  const headers = new Headers({ 'x-marram-client': from });
  const request = new Request(`${ORIGIN}/api/method/${name}`, { method: 'POST', headers, body });
  if (type === null) request.headers.delete('content-type');
  else request.headers.set('content-type', type);
  const response = await calculate({ request, params: { name }, routePattern: '/api/method/[name]' } as never);
  return { response, json: (await response.json()) as Record<string, unknown> };
}

async function get(route: APIRoute, path: string): Promise<Record<string, unknown>> {
  const url = new URL(path, ORIGIN);
  const context = { request: new Request(url), url, site: undefined, params: {}, routePattern: path };
  const response = await route(context as unknown as APIContext);
  expect(response.status).toBe(200);
  expect(response.headers.get('content-type')).toBe('application/json');
  return (await response.json()) as Record<string, unknown>;
}

const GOOD = { name: 'week-change', body: '{"weeks":[1200,1360]}' };

describe('a calculator', () => {
  it('answers with full double precision', async () => {
    const { response, json } = await call(GOOD);
    expect(response.status).toBe(200);
    expect(response.headers.get('content-type')).toBe('application/json');
    // F6, by hand: 100 · 160/1200
    expect(json).toEqual({ changePct: 40 / 3, reason: null });
  });

  it.each([
    ['wrong fields', '{"weeks":[1,-1],"more":1}', ['weeks.1', 'more']],
    ['a number that no double holds', '{"weeks":[1e999]}', ['weeks.0']],
    ['no JSON', '{"weeks":', ['']],
    ['no body', '', ['']],
  ])('refuses %s with their places', async (_, body, paths) => {
    const { response, json } = await call({ name: 'week-change', body });
    expect(response.status).toBe(422);
    expect(response.headers.get('content-type')).toBe('application/problem+json');
    expect(json).toMatchObject({ type: 'about:blank', status: 422, title: 'Please check the values' });
    const errors = json['errors'] as { path: string; message: string }[];
    expect(errors.map(({ path }) => path)).toEqual(paths);
    for (const error of errors) {
      expect(Object.keys(error).sort()).toEqual(['message', 'path']);
      expect(error.message).not.toBe('');
    }
  });

  it.each(['text/plain', 'application/x-www-form-urlencoded', 'multipart/form-data; boundary=x', null])(
    'refuses a body of the type %s',
    async (type) => {
      const { response, json } = await call({ ...GOOD, type });
      expect(response.status).toBe(422);
      expect(response.headers.get('content-type')).toBe('application/problem+json');
      expect(json['errors']).toEqual([{ path: '', message: 'JSON only' }]);
    },
  );

  it('takes JSON with its charset', async () => {
    expect((await call({ ...GOOD, type: 'application/json; charset=utf-8' })).response.status).toBe(200);
  });

  it.each(['asymmetries', 'constructor', '__proto__', 'Outrun', ''])('is not found as "%s"', async (name) => {
    const { response, json } = await call({ name, body: '{}' });
    expect(response.status).toBe(404);
    expect(response.headers.get('content-type')).toBe('application/problem+json');
    expect(json).toMatchObject({ status: 404 });
  });

  it('is counted by address, and says how long to wait', async () => {
    const from = someone();
    const statuses: number[] = [];
    for (let i = 0; i < LIMIT; i += 1) {
      statuses.push((await call({ ...GOOD, body: i % 2 ? '{}' : GOOD.body, from })).response.status);
    }
    expect(statuses).toEqual([200, 422, 200, 422, 200, 422]);
    const { response, json } = await call({ ...GOOD, from });
    expect(response.status).toBe(429);
    expect(response.headers.get('content-type')).toBe('application/problem+json');
    const waitS = Number(response.headers.get('retry-after'));
    expect(waitS).toBeGreaterThan(0);
    expect(waitS).toBeLessThanOrEqual(60);
    expect(json).toMatchObject({ status: 429, title: 'Too many tries' });
    expect((await call(GOOD)).response.status).toBe(200);
  });
});

it('lists the calculators with where to call and read them', async () => {
  const { calculators } = (await get(list, '/api/method')) as { calculators: Record<string, string>[] };
  expect(calculators.map(({ name }) => name).sort()).toEqual([...CALCULATOR_NAMES].sort());
  for (const { name, title, request, page } of calculators) {
    expect(title).toMatch(/^[A-Z]/);
    expect(request).toBe(`/api/method/${name}`);
    expect(page).toBe(`/method/${name}`);
  }
});

describe('the description of the API', () => {
  type Operation = { parameters?: { name: string; in: string }[]; responses: Record<string, { content?: object }> };

  it('says at which address and in which form, with every path parameter named', async () => {
    const described = await get(describeApi, '/api/openapi.json');
    expect(described).toMatchObject({ openapi: '3.1.0', servers: [{ url: ORIGIN }] });
    for (const [path, methods] of Object.entries(described['paths'] as Record<string, Record<string, Operation>>)) {
      const inPath = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name);
      for (const [method, { parameters = [], responses }] of Object.entries(methods)) {
        expect(['get', 'post', 'put', 'patch', 'delete']).toContain(method);
        expect(parameters.map(({ name }) => name)).toEqual(inPath);
        for (const [status, { content = {} }] of Object.entries(responses)) {
          if (Number(status) >= 400) expect(Object.keys(content)).toEqual(['application/problem+json']);
        }
      }
    }
  });

  it('refers to nothing that it does not hold', async () => {
    const described = await get(describeApi, '/api/openapi.json');
    const refs = [...JSON.stringify(described).matchAll(/"\$ref":"#\/([^"]+)"/g)].map(([, ref]) => ref!);
    expect(refs.length).toBeGreaterThan(0);
    for (const ref of refs) {
      const held = ref.split('/').reduce<unknown>((part, key) => (part as Record<string, unknown>)[key], described);
      expect(held, ref).toBeTypeOf('object');
    }
  });
});
