import fc from 'fast-check';

/** What of a JSON Schema the requests of the Method API use. */
export interface Shape {
  type?: string;
  properties?: Record<string, Shape>;
  required?: string[];
  items?: Shape;
  prefixItems?: Shape[];
  anyOf?: Shape[];
  enum?: unknown[];
  const?: unknown;
  format?: string;
  minimum?: number;
  maximum?: number;
  exclusiveMinimum?: number;
  minItems?: number;
}

/** Values of a shape: whole and broken numbers, the ends of the range and the smallest that a double holds. */
export function arbitraryOf(shape: Shape): fc.Arbitrary<unknown> {
  if (shape.anyOf) return fc.oneof(...shape.anyOf.map(arbitraryOf));
  if (shape.const !== undefined) return fc.constant(shape.const);
  if (shape.enum) return fc.constantFrom(...shape.enum);
  switch (shape.type) {
    case 'object': {
      const entries = Object.entries(shape.properties ?? {});
      const values = Object.fromEntries(entries.map(([key, part]) => [key, arbitraryOf(part)]));
      return fc.record(values, { requiredKeys: shape.required ?? [] });
    }
    case 'array':
      if (shape.prefixItems) return fc.tuple(...shape.prefixItems.map(arbitraryOf));
      return fc.array(arbitraryOf(shape.items!), { minLength: shape.minItems ?? 0, maxLength: 12 });
    case 'integer':
      return fc.integer({ min: Math.max(-40, shape.minimum ?? -40), max: Math.min(40, shape.maximum ?? 40) });
    case 'number':
      return arbitraryNumber(shape.minimum ?? shape.exclusiveMinimum ?? -1e12, shape.maximum ?? 1e12);
    case 'boolean':
      return fc.boolean();
    case 'string':
      return shape.format === 'date'
        ? fc.constantFrom('2024-02-29', '2025-01-01', '2025-06-30', '2026-01-31', '2026-07-01')
        : fc.string();
    default:
      return fc.constant(null);
  }
}

/** The part of [low, high] that lies in the range, or the range itself where there is none. */
function window(min: number, max: number, low: number, high: number): { min: number; max: number } {
  const part = { min: Math.max(min, low), max: Math.min(max, high) };
  return part.min <= part.max ? part : { min, max };
}

function arbitraryNumber(min: number, max: number): fc.Arbitrary<number> {
  const usual = window(min, max, -500, 2000);
  const small = window(min, max, -3, 3);
  return fc.oneof(
    { weight: 4, arbitrary: fc.integer({ min: Math.ceil(usual.min), max: Math.floor(usual.max) }) },
    { weight: 3, arbitrary: fc.double({ min, max, noNaN: true }) },
    { weight: 2, arbitrary: fc.double({ ...small, noNaN: true }) },
    { weight: 1, arbitrary: fc.constantFrom(min, max, Math.max(min, 0), Math.max(min, 5e-324), Math.max(min, 1e-200)) },
  );
}
