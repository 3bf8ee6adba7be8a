import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { accountOf, pageAs } from '#tests/e2e/browser.ts';
import { launchBrowser, reachablePaths } from '#tests/e2e/chromium.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

describe('what a page costs', () => {
  it.each(['strength coach', 'parent'])(
    'ships no script to read as %s, from nobody else’s host, within a budget',
    async (role) => {
      const { page, context } = await pageAs(browser, accountOf(role));
      const paths = await reachablePaths(page);
      const hosts = new Set<string>();
      const scripts = new Map<string, number>();
      page.on('request', (request) => hosts.add(new URL(request.url()).host));
      page.on('response', (response) => {
        if (!/javascript/.test(response.headers()['content-type'] ?? '')) return;
        const { pathname } = new URL(page.url());
        scripts.set(pathname, (scripts.get(pathname) ?? 0) + 1);
      });
      for (const path of paths) {
        const response = await page.goto(path);
        const html = (await response!.body()).length;
        expect(html, path).toBeLessThan(300_000);
        const inline = await page.locator('script').count();
        if (!path.startsWith('/method/')) expect(inline, `${path} has scripts`).toBe(0);
      }
      expect([...scripts.keys()].filter((path) => !path.startsWith('/method/'))).toEqual([]);
      expect([...hosts]).toEqual([new URL(page.url()).host]);
      await context.close();
    },
  );
});
