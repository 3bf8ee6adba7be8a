import { AxeBuilder } from '@axe-core/playwright';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { CALCULATOR_NAMES } from '#src/schemas/method/calculatorNames.ts';
import { exampleJump } from '#src/services/method/content/exampleCurves.ts';
import { newPage } from '#tests/e2e/browser.ts';
import { launchBrowser } from '#tests/e2e/chromium.ts';

let browser: Browser;
beforeAll(async () => {
  browser = await launchBrowser();
});
afterAll(() => browser.close());

describe('every Method page', () => {
  it.each([360, 820])('at %i px: axe finds nothing, nothing overflows, nothing complains', async (width) => {
    const { page, context, problems } = await newPage(browser, { viewport: { width, height: 900 } });
    const findings: string[] = [];
    for (const name of CALCULATOR_NAMES) {
      await page.goto(`/method/${name}`);
      const { violations } = await new AxeBuilder({ page }).analyze();
      for (const { id, nodes } of violations) {
        findings.push(`${name} ${id}: ${nodes.map(({ target }) => target.join(' ')).join(' | ')}`);
      }
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
      if (overflow > 0) findings.push(`${name} runs ${overflow} px over the edge`);
    }
    await context.close();
    expect(findings).toEqual([]);
    expect(problems).toEqual([]);
  });
});

describe('the calculator', () => {
  it('works out what is entered, and says what is wrong', async () => {
    const { page, context, problems } = await newPage(browser);
    await page.goto('/method/one-rep-max');
    await page.locator('#calculator').scrollIntoViewIfNeeded();
    // The form says that its script runs by leaving the checks to it.
    await page.locator('#calculator form[novalidate]').waitFor();
    const result = page.getByRole('region', { name: 'Result' });

    await page.getByRole('textbox', { name: 'Load' }).fill('80');
    await page.getByLabel('Repetitions to the limit').fill('2,5');
    await page.getByRole('button', { name: 'Work it out' }).click();
    await page
      .getByRole('alert')
      .getByRole('link', { name: /Give a whole number/ })
      .waitFor();
    expect(await page.evaluate(() => document.activeElement?.className)).toBe('error-summary');

    await page.getByLabel('Repetitions to the limit').fill('10');
    await page.getByRole('button', { name: 'Work it out' }).click();
    // by hand: 80 (1 + 10/30) = 36·80/27
    await result.getByRole('row', { name: 'Epley 106.66667' }).waitFor();
    await result.getByRole('row', { name: 'Brzycki 106.66667' }).waitFor();
    expect(await page.getByRole('alert').count()).toBe(0);
    expect(problems).toEqual([]);
    await context.close();
  });

  it('takes a curve from a file and draws it with its moments', async () => {
    const { page, context, problems } = await newPage(browser);
    await page.goto('/method/jump-curve');
    await page.locator('#calculator').scrollIntoViewIfNeeded();
    await page.locator('#calculator form[novalidate]').waitFor();
    const { force } = exampleJump();
    const lines = force.map((newton, i) => `${(i / 1000).toFixed(3)};${String(newton).replace('.', ',')}`);
    const buffer = Buffer.from(['a trial', 'Time (s);Force (N)', ...lines].join('\r\n'));
    await page
      .getByLabel('Take the samples from a file')
      .setInputFiles({ name: 'trial.csv', mimeType: 'text/csv', buffer });
    await page.getByText(`trial.csv: ${force.length} samples, 1000 a second.`).waitFor();
    await page.getByRole('button', { name: 'Work it out' }).click();
    const result = page.getByRole('region', { name: 'Result' });
    await result.getByRole('row', { name: /^Height, m 0\.2676/ }).waitFor();
    await result.getByRole('img', { name: /first movement, braking, propulsion, take-off, landing marked/ }).waitFor();
    const { violations } = await new AxeBuilder({ page }).analyze();
    expect(violations.map(({ id }) => id)).toEqual([]);

    await page
      .getByLabel('Take the samples from a file')
      .setInputFiles({ name: 'words.csv', mimeType: 'text/csv', buffer: Buffer.from('no samples here') });
    await page.getByText('words.csv: There are no samples in this file.').waitFor();
    expect(problems).toEqual([]);
    await context.close();
  });

  it('works without scripts, by its address', async () => {
    const { page, context } = await newPage(browser, { javaScriptEnabled: false });
    await page.goto('/method/week-change');
    await page.getByLabel('Weeks, the newest last').fill('100 150');
    await page.getByRole('button', { name: 'Work it out' }).click();
    await page.waitForURL(/weeks=100/);
    await page
      .getByRole('region', { name: 'Result' })
      .getByRole('row', { name: 'Change on the week before, % 50' })
      .waitFor();
    await page.getByLabel('Weeks, the newest last').fill('100 heavy');
    await page.getByRole('button', { name: 'Work it out' }).click();
    await page.getByRole('alert').getByText('Value 2: Give a number').waitFor();
    await context.close();
  });
});

it('the description of the API names every calculator', async () => {
  const { paths } = (await (await fetch(`${inject('product').baseUrl}/api/openapi.json`)).json()) as {
    paths: Record<string, unknown>;
  };
  expect(Object.keys(paths)).toEqual(expect.arrayContaining(CALCULATOR_NAMES.map((name) => `/api/method/${name}`)));
});
