import { AxeBuilder } from '@axe-core/playwright';
import type { Browser, BrowserContextOptions } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { newPage } from '#tests/e2e/browser.ts';
import { launchBrowser, reachablePaths, signIn } from '#tests/e2e/chromium.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

const TABLET: BrowserContextOptions = { viewport: { width: 820, height: 1180 } };

/** Opens every page that this person reaches and collects what axe finds, what runs over the edge, and complaints. */
async function inspect(account: { email: string; password: string } | null, options: BrowserContextOptions) {
  const { page, context, problems } = await newPage(browser, options);
  if (account) await signIn(page, account);
  else await page.goto('/');
  const paths = await reachablePaths(page);
  const findings: string[] = [];
  for (const path of paths) {
    await page.goto(path);
    const { violations } = await new AxeBuilder({ page }).analyze();
    for (const { id, nodes } of violations)
      findings.push(`${path} ${id}: ${nodes.map(({ target }) => target.join(' ')).join(' | ')}`);
    const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
    if (overflow > 0) findings.push(`${path} runs ${overflow} px over the edge`);
  }
  await context.close();
  return { paths, findings, problems };
}

describe('every page, on a tablet', () => {
  const roles = ['stranger', 'director', 'strength coach', 'swing coach', 'parent', 'athlete'];
  it.each(roles)('as %s: axe finds nothing, nothing overflows, nothing complains', async (role) => {
    const account = role === 'stranger' ? null : inject('product').accounts.find((known) => known.role === role)!;
    const { paths, findings, problems } = await inspect(account, TABLET);
    expect(paths.length).toBeGreaterThan(role === 'athlete' ? 3 : 4);
    expect(findings).toEqual([]);
    expect(problems).toEqual([]);
  });
});

describe('every page as the strength coach', () => {
  it.each([
    ['on a phone', { viewport: { width: 360, height: 740 } }],
    ['on a desk', { viewport: { width: 1440, height: 900 } }],
    ['in dark light', { viewport: { width: 820, height: 1180 }, colorScheme: 'dark' }],
  ] as [string, BrowserContextOptions][])('%s', async (_, options) => {
    const account = inject('product').accounts.find(({ role }) => role === 'strength coach')!;
    const { findings, problems } = await inspect(account, options);
    expect(findings).toEqual([]);
    expect(problems).toEqual([]);
  });
});
