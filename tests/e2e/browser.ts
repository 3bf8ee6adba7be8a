import type { Browser, BrowserContextOptions } from 'playwright-core';
import { inject } from 'vitest';
import type { DemoAccount } from '#tests/config/product.ts';
import { signIn, watchedPage, type WatchedPage } from '#tests/e2e/chromium.ts';

/** Opens a page on the running product. */
export const newPage = (browser: Browser, options: BrowserContextOptions = {}): Promise<WatchedPage> =>
  watchedPage(browser, { baseURL: inject('product').baseUrl, ...options });

/** The first demo account of a role, or the one whose address starts as given. */
export function accountOf(role: string, start = ''): DemoAccount {
  const found = inject('product').accounts.find((account) => account.role === role && account.email.startsWith(start));
  if (!found) throw new Error(`no demo account for ${role} ${start}`);
  return found;
}

/** Opens a page signed in as a demo account. */
export async function pageAs(browser: Browser, account: DemoAccount, options: BrowserContextOptions = {}) {
  const watched = await newPage(browser, options);
  await signIn(watched.page, account);
  return watched;
}
