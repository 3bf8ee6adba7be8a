import { chromium, type Browser, type BrowserContext, type BrowserContextOptions, type Page } from 'playwright-core';
import { inject } from 'vitest';
import { chromiumPath } from '#tests/config/chromium.mjs';

const args = [
  '--headless',
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** A page and everything that it complained about: console errors and warnings, exceptions, content-policy reports. */
export interface WatchedPage {
  page: Page;
  context: BrowserContext;
  /** Expect it to equal `[]` at the end of a test. */
  problems: string[];
}

/** Starts Debian's Chromium. Whoever starts it closes it. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({ executablePath: chromiumPath, args });
}

/** Opens a page of its own context (cookies, storage) on the running product. */
export async function newPage(browser: Browser, options: BrowserContextOptions = {}): Promise<WatchedPage> {
  const context = await browser.newContext({
    baseURL: inject('product').baseUrl,
    viewport: { width: 1440, height: 900 },
    reducedMotion: 'reduce',
    ...options,
  });
  const problems: string[] = [];
  await context.addInitScript(() => {
    document.addEventListener('securitypolicyviolation', (event) => {
      console.error(`content policy: ${event.effectiveDirective} refused ${event.blockedURI}`);
    });
  });
  const page = await context.newPage();
  page.on('console', (message) => {
    if (message.type() === 'error' || message.type() === 'warning') {
      problems.push(`${new URL(page.url()).pathname} console ${message.type()}: ${message.text()}`);
    }
  });
  page.on('pageerror', (error) => problems.push(`${new URL(page.url()).pathname} exception: ${error.message}`));
  return { page, context, problems };
}
