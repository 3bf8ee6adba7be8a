import type { Browser } from 'playwright-core';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { accountOf, pageAs } from '#tests/e2e/browser.ts';
import { launchBrowser } from '#tests/e2e/chromium.ts';

let browser: Browser;
let superuser: pg.Client;
beforeAll(async () => {
  browser = await launchBrowser();
  superuser = new pg.Client({ connectionString: inject('product').superuserUrl });
  await superuser.connect();
});
afterAll(() => Promise.all([browser.close(), superuser.end()]));

describe('the main job', () => {
  it('leads the swing coach from Today to an outrun’s evidence and on to the Record', async () => {
    const { page, context, problems } = await pageAs(browser, accountOf('swing coach'));
    expect(new URL(page.url()).pathname).toBe('/today');
    const row = page.getByRole('row', { name: /Okonjo/ });
    await row.getByText('Act').waitFor();
    await row.getByRole('link').first().click();

    await page.getByRole('heading', { level: 1 }).waitFor();
    const evidence = page.getByRole('table', { name: 'Evidence' });
    for (const label of ['Lead deficit', 'Carry pulling away', 'Demand over capacity', 'Late return', 'Around it']) {
      await evidence.getByRole('rowheader', { name: new RegExp(`^${label}`) }).waitFor();
    }
    await page.getByRole('heading', { name: 'What would clear it' }).waitFor();
    await page.getByRole('heading', { name: 'Before you believe it' }).waitFor();
    await page.getByRole('link', { name: 'Linnea Okonjo' }).first().click();

    await page.getByRole('heading', { level: 1, name: 'Linnea Okonjo' }).waitFor();
    await page
      .getByRole('img', { name: /^Season line/ })
      .filter({ visible: true })
      .waitFor();
    await page.getByText('The figures as a table').first().click();
    await page
      .getByRole('table', { name: /Season line as figures/ })
      .getByRole('columnheader', { name: 'Outrun' })
      .waitFor();
    expect(problems).toEqual([]);
    await context.close();
  });

  it('lets the strength coach confirm an asked value, and the judgement follows', async () => {
    const { page, context, problems } = await pageAs(browser, accountOf('strength coach'));
    await page.getByRole('link', { name: /value.* unlike/ }).click();
    const judgements = async () =>
      (
        await superuser.query<{ cause: string; n: string }>(
          `select j.cause, count(*) as n from judgement j join athlete a on a.id = j.athlete_id
           where a.family_name = 'Raghunathan' group by j.cause order by 1`,
        )
      ).rows;
    const before = await judgements();
    const row = page.getByRole('row', { name: /Priya Raghunathan/ });
    await row.getByRole('button', { name: /Confirm/ }).click();
    await page.getByRole('row', { name: /Priya Raghunathan/ }).waitFor({ state: 'detached' });
    const after = await judgements();
    expect(after).not.toEqual(before);
    const { rows } = await superuser.query(
      `select t.state, t.settled_at is not null as settled, p.family_name as by from trial t
       join athlete a on a.id = t.athlete_id join person p on p.id = t.settled_by where a.family_name = 'Raghunathan'`,
    );
    expect(rows).toEqual([{ state: 'valid', settled: true, by: 'Reyes-Lund' }]);
    // The mean on the Record now holds the third trial.
    await page.goto('/squads');
    await page.getByRole('link', { name: 'Curlew' }).click();
    await page.getByRole('link', { name: 'Priya Raghunathan' }).click();
    await page.getByRole('link', { name: 'Strength' }).click();
    await page.getByText('The figures as a table').first().click();
    await page
      .getByRole('cell', { name: /and 3$/ })
      .last()
      .waitFor();
    expect(problems).toEqual([]);
    await context.close();
  });

  it('gives a parent of another child 404, and of their own child plain words without any outrun', async () => {
    const own = (await superuser.query<{ id: string }>(`select id from athlete where given_name = 'Linnea'`)).rows[0]!
      .id;
    const other = await pageAs(browser, accountOf('parent', 'parent.lindahl'));
    const refused = await other.page.goto(`/family/${own}`);
    expect(refused!.status()).toBe(404);
    await other.context.close();

    const { page, context, problems } = await pageAs(browser, accountOf('parent', 'parent@'));
    await page.getByRole('link', { name: 'Linnea Okonjo' }).click();
    await page.getByText(/carried the driver about \d+ m/).waitFor();
    const words = await page.locator('main').innerText();
    expect(words).not.toMatch(/outrun|deficit|weaker|look again|\bAct\b|noise|judge|points/i);
    expect(await page.content()).not.toMatch(/outrun|judgement/i);
    expect(problems).toEqual([]);
    await context.close();
  });

  it('sends a stranger to sign in, then back to where they were going', async () => {
    const { page, context } = await pageAs(browser, accountOf('director'));
    await context.clearCookies();
    await page.goto('/outruns');
    expect(new URL(page.url()).pathname).toBe('/sign-in');
    const { email, password } = accountOf('director');
    await page.getByLabel('E-mail or user name').fill(email);
    await page.getByLabel('Password').fill(password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL('**/outruns');
    await context.close();
  });

  it('signs out so that the back button shows nothing', async () => {
    const { page, context } = await pageAs(browser, accountOf('swing coach'));
    await page.goto('/squads');
    await page.getByText('swing coach').click();
    await page.getByRole('button', { name: 'Sign out' }).click();
    await page.getByRole('link', { name: 'Sign in' }).first().waitFor();
    await page.goBack();
    await page.getByRole('heading', { name: 'Sign in' }).waitFor();
    await context.close();
  });
});
