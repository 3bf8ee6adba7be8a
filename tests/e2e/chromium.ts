import { chromium, type Browser, type BrowserContext, type BrowserContextOptions, type Page } from 'playwright-core';
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

/** Opens a page of its own context (cookies, storage). */
export async function watchedPage(browser: Browser, options: BrowserContextOptions): Promise<WatchedPage> {
  const context = await browser.newContext({
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

/** Signs in through the form, as a person does. */
export async function signIn(page: Page, account: { email: string; password: string }): Promise<void> {
  await page.goto('/sign-in');
  await page.getByLabel('E-mail or user name').fill(account.email);
  await page.getByLabel('Password').fill(account.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => url.pathname !== '/sign-in');
}

const UUID = /[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}/g;

/**
 * Paths that a person reaches by links from where they are, at most `each` of one kind (two athletes' pages are of one
 * kind), in the order found.
 */
export async function reachablePaths(page: Page, each = 1): Promise<string[]> {
  const kindOf = (path: string) => path.replace(UUID, '…').replace(/^\/method\/.+/, '/method/…');
  const found: string[] = [new URL(page.url()).pathname];
  for (let i = 0; i < found.length; i += 1) {
    await page.goto(found[i]!);
    const links = await page.$$eval('a[href^="/"]', (anchors) =>
      anchors.map((a) => new URL((a as HTMLAnchorElement).href).pathname),
    );
    for (const link of links) {
      if (found.includes(link) || /\.[a-z]+$/.test(link)) continue;
      if (found.filter((path) => kindOf(path) === kindOf(link)).length < each) found.push(link);
    }
  }
  return found;
}
