import type { APIContext } from 'astro';
import fc from 'fast-check';
import { describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { POST } from '#src/pages/api/method/[name].ts';
import { CALCULATOR_NAMES } from '#src/schemas/method/calculatorNames.ts';
import { CALCULATORS } from '#src/services/method/calculators.ts';
import { arbitraryOf, type Shape } from '#tests/unit/services/method/arbitraryRequest.ts';

vi.mock('#src/auth/limits.ts', () => ({ clientAddress: () => 'test', consumeMethod: async () => undefined }));

async function answerTo(name: string, body: string): Promise<{ status: number; body: Record<string, unknown> }> {
  const request = new Request(`http://127.0.0.1/api/method/${name}`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body,
  });
  const context = { request, params: { name }, routePattern: '/api/method/[name]' } as unknown as APIContext;
  const response = await POST(context);
  return { status: response.status, body: (await response.json()) as Record<string, unknown> };
}

/** 200 with a reason field, or 422 with places; nothing else, whatever comes. */
function expectContract({ status, body }: Awaited<ReturnType<typeof answerTo>>) {
  expect([200, 422]).toContain(status);
  if (status === 200) {
    const { reason } = body;
    expect(reason === null || typeof reason === 'string').toBe(true);
    return;
  }
  expect(body['title']).toBe('Please check the values');
  expect((body['errors'] as unknown[]).length).toBeGreaterThan(0);
}

/** Replaces one part of a value, wherever it is. */
function withPart(value: unknown, choice: number, part: unknown): unknown {
  if (typeof value !== 'object' || value === null || choice % 4 === 0) return part;
  const keys = Object.keys(value);
  const key = keys[choice % Math.max(1, keys.length)];
  if (key === undefined) return part;
  const copy = (Array.isArray(value) ? [...value] : { ...value }) as Record<string, unknown>;
  copy[key] = withPart(copy[key], Math.floor(choice / 4), part);
  return copy;
}

describe.each(CALCULATOR_NAMES)('%s', (name) => {
  const { schema } = CALCULATORS[name];
  const shaped = arbitraryOf(z.toJSONSchema(schema, { unrepresentable: 'any' }) as Shape);

  it('answers any body of the right shape with 200 or 422, every number finite', async () => {
    let accepted = 0;
    await fc.assert(
      fc.asyncProperty(shaped, async (body) => {
        const answer = await answerTo(name, JSON.stringify(body));
        expectContract(answer);
        if (answer.status === 200) accepted += 1;
      }),
      { numRuns: 250 },
    );
    expect(accepted).toBeGreaterThan(0);
  });

  it('answers a body with one part replaced by anything with 200 or 422', async () => {
    await fc.assert(
      fc.asyncProperty(shaped, fc.nat(), fc.jsonValue(), async (body, choice, part) => {
        expectContract(await answerTo(name, JSON.stringify(withPart(body, choice, part))));
      }),
      { numRuns: 200 },
    );
  });

  it('answers any text with 200 or 422', async () => {
    await fc.assert(
      fc.asyncProperty(fc.oneof(fc.json(), fc.string()), async (text) => {
        expectContract(await answerTo(name, text));
      }),
      { numRuns: 50 },
    );
  });
});
