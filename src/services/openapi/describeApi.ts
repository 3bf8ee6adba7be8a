import { z } from 'zod';
import { CALCULATOR_NAMES } from '#src/schemas/method/calculatorNames.ts';
import { CALCULATORS, type Calculator } from '#src/services/method/calculators.ts';
import { runCalculator } from '#src/services/method/runCalculator.ts';
import { REQUESTS, type DescribedRequest } from '#src/services/openapi/requests.ts';

/** What the description needs of a route of the registry. */
export interface DescribedRoute {
  pattern: string;
  method: string;
  access: string;
  kind: 'page' | 'api';
}

/** As the sign-in sets it. */
const SESSION_NAME = '__Host-marram.session';
const CALCULATOR_PATTERN = '/api/method/[name]';
const PROBLEM = { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } };

/**
 * The API as OpenAPI 3.1: every route of kind `api`, its request bodies from the very schemas that the routes parse
 * with, and each calculator at its own path with a worked example whose answer is computed now.
 *
 * @param routes the route registry
 * @param server the address that people use
 * @throws {Error} if a route of the API has no description
 */
export async function describeApi(routes: readonly DescribedRoute[], server: string): Promise<object> {
  const paths: Record<string, Record<string, object>> = {};
  for (const route of routes.filter(({ kind }) => kind === 'api')) {
    if (route.pattern === CALCULATOR_PATTERN) continue;
    const described = REQUESTS[`${route.method} ${route.pattern}`];
    if (!described) throw new Error(`${route.method} ${route.pattern} has no description`);
    const path = (paths[pathOf(route.pattern)] ??= {});
    path[route.method.toLowerCase()] = operationOf(route, described);
  }
  for (const name of CALCULATOR_NAMES) {
    paths[`/api/method/${name}`] = { post: await calculatorOperation(name, CALCULATORS[name]) };
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Marram',
      version: '1',
      description:
        'SI units unless a field says otherwise; percentages are 0 to 100. A value that cannot be given is null and the reason stands beside it.',
    },
    servers: [{ url: server }],
    paths,
    components: {
      schemas: { Problem: problemSchema },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: SESSION_NAME } },
    },
  };
}

const pathOf = (pattern: string): string => pattern.replace(/\[(?:\.\.\.)?(\w+)\]/g, '{$1}');

const jsonSchema = (schema: z.ZodType): object => {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { unrepresentable: 'any' });
  return rest;
};

function operationOf({ pattern, access }: DescribedRoute, { summary, body, answer, form }: DescribedRequest): object {
  const parameters = [...pattern.matchAll(/\[(?:\.\.\.)?(\w+)\]/g)].map(([, name]) => ({
    name,
    in: 'path',
    required: true,
    schema: name === 'id' ? { type: 'string', format: 'uuid' } : { type: 'string' },
  }));
  const schema = body && jsonSchema(body);
  return {
    summary,
    ...(access === 'public' ? {} : { security: [{ session: [] }] }),
    ...(parameters.length > 0 ? { parameters } : {}),
    ...(schema
      ? {
          requestBody: {
            required: true,
            content: {
              'application/json': { schema },
              ...(form ? { 'application/x-www-form-urlencoded': { schema } } : {}),
            },
          },
        }
      : {}),
    responses: {
      '200': { description: answer },
      ...(access === 'public'
        ? {}
        : {
            '401': { description: 'No session', content: PROBLEM },
            '403': { description: 'Not for this role', content: PROBLEM },
            '404': { description: 'Unknown, or out of scope', content: PROBLEM },
          }),
      ...(schema ? { '422': { description: 'Please check the values', content: PROBLEM } } : {}),
    },
  };
}

async function calculatorOperation(name: string, { schema, run, page }: Calculator): Promise<object> {
  const { request, says } = page.example;
  const small = JSON.stringify(request).length < 5_000;
  const example = { summary: says, value: request };
  const answer = small ? { example: await runCalculator({ run }, request) } : {};
  return {
    summary: `${page.title}: ${page.sentence}`,
    operationId: name,
    tags: ['Method'],
    requestBody: {
      required: true,
      content: {
        'application/json': { schema: jsonSchema(schema), ...(small ? { examples: { worked: example } } : {}) },
      },
    },
    responses: {
      '200': {
        description: 'Every number finite; null where a value cannot be given, with the reason',
        content: { 'application/json': { schema: answerSchema, ...answer } },
      },
      '413': { description: 'The body is over 2 MB', content: PROBLEM },
      '422': { description: 'Please check the values', content: PROBLEM },
      '429': {
        description: 'Too many requests from this address',
        headers: { 'Retry-After': { description: 'Seconds to wait', schema: { type: 'integer' } } },
        content: PROBLEM,
      },
    },
  };
}

const answerSchema = { type: 'object', properties: { reason: { type: ['string', 'null'] } }, required: ['reason'] };

const problemSchema = {
  type: 'object',
  properties: {
    type: { type: 'string' },
    title: { type: 'string' },
    status: { type: 'integer' },
    detail: { type: 'string' },
    errors: {
      type: 'array',
      items: {
        type: 'object',
        properties: { path: { type: 'string' }, message: { type: 'string' } },
        required: ['path', 'message'],
      },
    },
  },
  required: ['type', 'title', 'status'],
};
