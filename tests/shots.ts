// Every page as each demo role, at three widths, light and dark, as PNG:  npm run shots -- <folder> [role …]
import { mkdirSync } from 'node:fs';
import { join, resolve } from 'node:path';
import { ensureChromium } from '#tests/config/chromium.mjs';
import { startProduct } from '#tests/config/product.ts';
import { launchBrowser, reachablePaths, signIn, watchedPage } from '#tests/e2e/chromium.ts';

const WIDTHS = [360, 820, 1440];
const SCHEMES = ['light', 'dark'] as const;

const [folder, ...wanted] = process.argv.slice(2);
if (!folder) {
  process.stderr.write('Say where to: npm run shots -- <folder> [role …]\n');
  process.exit(2);
}
ensureChromium((line: string) => process.stdout.write(`${line}\n`));
const { product, stop } = await startProduct('shots');
const browser = await launchBrowser();
const say = (line: string) => process.stdout.write(`${line}\n`);
let pictures = 0;

/** Pictures of what one person reaches; a stranger where there is no account. */
async function shoot(name: string, account?: { email: string; password: string }): Promise<void> {
  const out = join(resolve(folder!), name);
  mkdirSync(out, { recursive: true });
  const { page, context, problems } = await watchedPage(browser, { baseURL: product.baseUrl });
  if (account) await signIn(page, account);
  else await page.goto('/');
  const paths = [...(await reachablePaths(page)), '/no-such-page', ...(account ? ['/forbidden'] : [])];
  const refused = /\/(no-such-page|forbidden) console error/;
  for (const path of paths) {
    for (const colorScheme of SCHEMES) {
      await page.emulateMedia({ colorScheme, reducedMotion: 'reduce' });
      for (const width of WIDTHS) {
        await page.setViewportSize({ width, height: 900 });
        await page.goto(path);
        const file = `${
          path
            .slice(1)
            .replace(/[0-9a-f]{8}-[0-9a-f-]{27}/g, 'id')
            .replaceAll('/', '_') || 'home'
        }-${width}-${colorScheme}.png`;
        await page.screenshot({ path: join(out, file), fullPage: true });
        pictures += 1;
      }
    }
  }
  await context.close();
  const unexpected = problems.filter((problem) => !refused.test(problem));
  say(`${name}: ${paths.length} pages${unexpected.length > 0 ? `, complaints:\n  ${unexpected.join('\n  ')}` : ''}`);
}

try {
  if (wanted.length === 0 || wanted.includes('stranger')) await shoot('stranger');
  for (const account of product.accounts) {
    const name = `${account.role.replaceAll(' ', '-')}-${account.email.split('@')[0]}`;
    if (wanted.length === 0 || wanted.some((role) => name.startsWith(role))) await shoot(name, account);
  }
  say(`${pictures} pictures in ${resolve(folder)}`);
} finally {
  await browser.close();
  await stop();
}
