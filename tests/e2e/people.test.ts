import { AxeBuilder } from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';
import pg from 'pg';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { accountOf, newPage, pageAs } from '#tests/e2e/browser.ts';
import { launchBrowser, signIn } from '#tests/e2e/chromium.ts';

let browser: Browser;
let superuser: pg.Client;
beforeAll(async () => {
  browser = await launchBrowser();
  superuser = new pg.Client({ connectionString: inject('product').superuserUrl });
  await superuser.connect();
});
afterAll(() => Promise.all([browser.close(), superuser.end()]));

const PASSWORD = 'heron beside the ninth tee';

/** The link of the newest message to an address, as the demo's own mail page shows it once it has come. */
async function linkTo(address: string, kind: 'invite' | 'reset'): Promise<string> {
  const { page, context } = await newPage(browser);
  const link = page
    .getByRole('article')
    .filter({ hasText: `To ${address}` })
    .first()
    .locator(`a[href*="/${kind}/"]`);
  await expect
    .poll(
      async () => {
        await page.goto('/dev/mail');
        return link.count();
      },
      { timeout: 30_000, interval: 200 },
    )
    .toBe(1);
  const href = (await link.getAttribute('href'))!;
  await context.close();
  return href;
}

const axe = async (page: Page) => (await new AxeBuilder({ page }).analyze()).violations.map(({ id }) => id);

describe('people', () => {
  it('a swing coach is invited, follows the link in the mail, and sees only their squad', async () => {
    const email = 'new.swing@saltmarsh.example';
    const director = await pageAs(browser, accountOf('director'));
    await director.page.getByRole('link', { name: 'Programme' }).click();
    await director.page.getByLabel('E-mail of the coach or director').fill(email);
    await director.page.getByLabel('As', { exact: true }).first().selectOption('swing coach');
    await director.page.getByRole('checkbox', { name: 'Dunlin' }).check();
    await director.page.getByRole('button', { name: 'Invite', exact: true }).first().click();
    await director.page.getByText('Invited. The message is on its way').waitFor();
    await director.page
      .getByRole('table', { name: 'Invitations that wait' })
      .getByRole('rowheader', { name: email })
      .waitFor();
    expect(await axe(director.page)).toEqual([]);

    const link = await linkTo(email, 'invite');
    // A scanner that opens the link uses nothing up.
    const scanned = await fetch(link);
    expect(scanned.status).toBe(200);
    expect(scanned.headers.get('referrer-policy')).toBe('no-referrer');
    expect(scanned.headers.get('cache-control')).toBe('no-store');

    const { page, context, problems } = await newPage(browser);
    const referers: string[] = [];
    page.on('request', (request) => {
      const { referer } = request.headers();
      if (referer) referers.push(referer);
    });
    await page.goto(link);
    await page.getByText('invites new.swing@saltmarsh.example to Marram as swing coach for 1 squad').waitFor();
    expect(await axe(page)).toEqual([]);
    await page.getByLabel('Given name').fill('Ottilie');
    await page.getByLabel('Family name').fill('Brandreth');
    await page.getByLabel('Password').fill('Saltmarsh2026');
    await page.getByRole('button', { name: 'Accept' }).click();
    await page.getByText('Choose another password').waitFor();
    await page.getByLabel('Given name').fill('Ottilie');
    await page.getByLabel('Family name').fill('Brandreth');
    await page.getByLabel('Password').fill(PASSWORD);
    await page.getByRole('button', { name: 'Accept' }).click();
    await page.waitForURL('**/today');
    await page.goto('/squads');
    expect(await page.getByRole('rowheader').allInnerTexts()).toEqual(['Dunlin']);
    expect(referers.join(' ')).not.toContain(link.split('/').at(-1));
    expect(problems).toEqual([]);

    expect((await fetch(link)).status).toBe(404);
    await director.page.goto('/programme/people');
    await director.page.getByRole('row', { name: /Ottilie Brandreth swing coach Dunlin/ }).waitFor();
    expect(director.problems).toEqual([]);
    await Promise.all([context.close(), director.context.close()]);
  });

  it('an invitation that is revoked opens nothing', async () => {
    const email = 'never@saltmarsh.example';
    const { page, context, problems } = await pageAs(browser, accountOf('director'));
    await page.goto('/programme/people');
    await page.getByLabel('E-mail of the coach or director').fill(email);
    await page.getByRole('button', { name: 'Invite', exact: true }).first().click();
    const link = await linkTo(email, 'invite');
    await page.goto('/programme/people');
    await page.getByRole('button', { name: `Revoke the invitation of ${email}` }).click();
    await page.getByText('The invitation is revoked').waitFor();
    expect((await fetch(link)).status).toBe(404);
    expect(problems).toEqual([]);
    await context.close();
  });

  it('a parent makes a user name, and the child signs in with it and sees only their own progress', async () => {
    const parent = await pageAs(browser, accountOf('parent', 'parent@'));
    await superuser.query(
      `update athlete set birth_date = current_date - interval '12 years' where given_name = 'Teodor'`,
    );
    await parent.page.goto('/family');
    await parent.page.getByRole('link', { name: 'Teodor Okonjo' }).click();
    await parent.page.getByText('Make a user name and a password').click();
    await parent.page.getByLabel('User name').fill('teo.tern');
    await parent.page.getByLabel('Password for Teodor').fill(PASSWORD);
    expect(await axe(parent.page)).toEqual([]);
    await parent.page.getByRole('button', { name: 'Make the sign-in' }).click();
    await parent.page.getByText('Teodor can sign in now').waitFor();

    const { page, context, problems } = await newPage(browser);
    await signIn(page, { email: 'teo.tern', password: PASSWORD });
    await page.goto('/my/progress');
    await page.getByRole('heading', { level: 1 }).waitFor();
    expect((await page.goto('/squads'))!.status()).toBe(403);
    expect(problems.filter((problem) => !problem.includes('403'))).toEqual([]);
    expect(parent.problems).toEqual([]);
    await Promise.all([context.close(), parent.context.close()]);
  });

  it('a password is reset by the link in the mail, and the earlier session is over', async () => {
    const account = accountOf('swing coach', 'swing.dunlin');
    const before = await pageAs(browser, account);
    const { page, context, problems } = await newPage(browser);
    await page.goto('/sign-in');
    await page.getByRole('link', { name: 'I do not know my password' }).click();
    expect(await axe(page)).toEqual([]);
    await page.getByLabel('E-mail').fill(account.email);
    await page.getByRole('button', { name: 'Send me a link' }).click();
    await page.getByText('If this address is a member’s').waitFor();
    await page.goto(await linkTo(account.email, 'reset'));
    expect(await axe(page)).toEqual([]);
    await page.getByLabel('New password').fill(PASSWORD);
    await page.getByRole('button', { name: 'Set the password' }).click();
    await page.getByText('The new password is set').waitFor();
    await before.page.goto('/today');
    expect(new URL(before.page.url()).pathname).toBe('/sign-in');
    await signIn(page, { email: account.email, password: PASSWORD });
    await page.getByRole('heading', { level: 1 }).waitFor();

    // Changed back on the account's own page, which asks for the present one.
    await page.goto('/account');
    await page.getByLabel('Present password').fill('not this one at all');
    await page.getByLabel('New password').fill(account.password);
    await page.getByRole('button', { name: 'Change it' }).click();
    await page.getByText('That is not your present password.').waitFor();
    await page.getByLabel('Present password').fill(PASSWORD);
    await page.getByLabel('New password').fill(account.password);
    await page.getByRole('button', { name: 'Change it' }).click();
    await page.getByText('The password is changed').waitFor();
    expect(problems).toEqual([]);
    await Promise.all([context.close(), before.context.close()]);
  });

  it('an unknown address is answered exactly as a known one', async () => {
    const { baseUrl } = inject('product');
    const ask = async (email: string) => {
      const response = await fetch(`${baseUrl}/api/reset/ask`, {
        method: 'POST',
        redirect: 'manual',
        headers: { origin: baseUrl },
        body: new URLSearchParams({ email }),
      });
      return { status: response.status, to: response.headers.get('location'), body: await response.text() };
    };
    const known = await ask(accountOf('strength coach').email);
    expect(known).toEqual({ status: 303, to: '/reset?done=asked', body: '' });
    expect(await ask('nobody@saltmarsh.example')).toEqual(known);
  });

  it('takes the forms of a token page from this site alone, without a Referer', async () => {
    const { baseUrl } = inject('product');
    const post = (headers: Record<string, string>) =>
      fetch(`${baseUrl}/api/reset/set`, {
        method: 'POST',
        redirect: 'manual',
        headers,
        body: new URLSearchParams({ token: 'x'.repeat(43), password: PASSWORD }),
      });
    // What a browser sends of such a page: no origin named, and the browser's own word for where it comes from.
    const own = await post({ origin: 'null', 'sec-fetch-site': 'same-origin' });
    expect([own.status, own.headers.get('location')]).toEqual([303, `/reset/${'x'.repeat(43)}?problem=not-found`]);
    for (const headers of [
      { origin: 'null' },
      { origin: 'null', 'sec-fetch-site': 'cross-site' },
      { origin: 'http://evil.example' },
    ]) {
      expect((await post(headers as Record<string, string>)).status).toBe(403);
    }
  });

  it('the director makes a squad, adds an athlete to it, names its coach, and moves the athlete', async () => {
    const { page, context, problems } = await pageAs(browser, accountOf('director'));
    await page.goto('/programme/squads');
    expect(await axe(page)).toEqual([]);
    await page.getByLabel('Name of the new squad').fill('Whimbrel');
    await page.getByRole('button', { name: 'Make the squad' }).click();
    await page.getByRole('heading', { name: 'Whimbrel' }).waitFor();
    await page.getByLabel('Given name').fill('Ines');
    await page.getByLabel('Family name').fill('Marr');
    await page.getByLabel('Day').fill('27');
    await page.getByLabel('Month').fill('3');
    await page.getByLabel('Year').fill('2013');
    await page.getByLabel('Plays').selectOption('left-handed');
    await page.getByLabel('Squad', { exact: true }).selectOption('Whimbrel');
    await page.getByRole('button', { name: 'Add the athlete' }).click();
    await page.getByText('The athlete is added.').waitFor();
    await page.getByText('Move athletes of Whimbrel').click();
    await page.getByLabel('Squad for Ines Marr').selectOption('Curlew');
    await page.getByRole('button', { name: 'Move Ines Marr' }).click();
    await page.getByText('Moved.').waitFor();
    await page.getByText('Name and coaches of Whimbrel').click();
    await page
      .getByRole('group', { name: 'Coaches of Whimbrel' })
      .getByRole('checkbox', { name: /Mirren Aldous/ })
      .check();
    await page.getByRole('group', { name: 'Coaches of Whimbrel' }).getByRole('checkbox', { checked: true }).waitFor();
    await page
      .locator('form', { has: page.getByRole('group', { name: 'Coaches of Whimbrel' }) })
      .getByRole('button', { name: 'Save the coaches' })
      .click();
    await page.getByText('Saved.').waitFor();
    const { rows } = await superuser.query(
      `select s.name, a.birth_date::text as born, h.plays,
         (select array_agg(p.family_name) from squad_coach c join squad w on w.id = c.squad_id
          join person p on p.id = c.person_id where w.name = 'Whimbrel') as coaches
       from athlete a join squad s on s.id = a.squad_id join handedness h on h.athlete_id = a.id
       where a.family_name = 'Marr'`,
    );
    expect(rows).toEqual([{ name: 'Curlew', born: '2013-03-27', plays: 'left', coaches: ['Aldous'] }]);
    expect(problems).toEqual([]);
    await context.close();
  });
});
