import type { TestProject } from 'vitest/node';
import { startProduct, type RunningProduct } from '#tests/config/product.ts';

declare module 'vitest' {
  interface ProvidedContext {
    product: RunningProduct;
  }
}

/** One running product for all end-to-end tests. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const { product, stop } = await startProduct('e2e');
  project.provide('product', product);
  return stop;
}
