import fc from 'fast-check';
import type { JobHelpers } from 'graphile-worker';
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { sendMail } from '#src/jobs/sendMail.ts';
import { startFakeSmtp, type FakeSmtp } from '#src/mail/fakeSmtp.ts';
import { mailbox } from '#src/mail/mailbox.ts';
import { sendMessage } from '#src/mail/sendMessage.ts';
import { enqueueMail } from '#src/services/mail/enqueueMail.ts';
import { sealToken } from '#src/services/mail/sealToken.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';
import { TestAcademy } from '#tests/integration/judging/academy.ts';

const database = useTestDatabase();
let academy: TestAcademy;
let swing: Viewer;
let director: Viewer;
let fake: FakeSmtp;
let refusal: number | undefined;
const later = vi.fn();

beforeAll(async () => {
  academy = await TestAcademy.make(database().superuserUrl);
  swing = await academy.staff('swing_coach', 'first');
  director = await academy.staff('director');
  await academy.insert('person_contact', { person_id: swing.personId, email: 'swing@example.org' });
  fake = await startFakeSmtp({ refuse: () => refusal });
});
beforeEach(async () => {
  process.env['SMTP_URL'] = fake.url;
  refusal = undefined;
  later.mockClear();
  mailbox().length = 0;
  await academy.rows('delete from outbox');
});
afterEach(() => {
  delete process.env['SMTP_URL'];
});
afterAll(() => Promise.all([academy.end(), fake.close()]));

const outrun = {
  kind: 'outrun' as const,
  payload: {
    outrunId: '0198c1f2-7a7b-7000-8000-000000000001',
    squadName: 'First',
    level: 'act' as const,
    risen: false,
  },
};
const ask = (key: string, personId = swing.personId) =>
  asViewer(swing, (trx) => enqueueMail(trx, swing, { ...outrun, personId, key }));
const run = () => sendMail({ academyId: academy.id }, { addJob: later } as unknown as JobHelpers);
const outbox = () =>
  academy.rows<{ state: string; attempts: number; last_answer: string | null; payload: object }>(
    'select state, attempts, last_answer, payload from outbox order by made_at, message_key',
  );
const makeDue = () => academy.rows(`update outbox set not_before = now() - interval '1 second'`);

describe('the outbox', () => {
  it('stands or falls with the transaction that gives the occasion, the job too', async () => {
    const jobs = () => academy.rows(`select key from graphile_worker.jobs where task_identifier = 'sendMail'`);
    const before = await jobs();
    await expect(
      asViewer(swing, async (trx) => {
        await enqueueMail(trx, swing, { ...outrun, personId: swing.personId, key: 'rolled back' });
        throw new Error('rolled back');
      }),
    ).rejects.toThrow('rolled back');
    expect(await outbox()).toEqual([]);
    expect(await jobs()).toEqual(before);
    await ask('kept');
    expect(await outbox()).toMatchObject([{ state: 'queued' }]);
    expect(await jobs()).toEqual([{ key: `sendMail:${academy.id}` }]);
  });

  it('sends a message asked for twice once, however many runs there are at once', async () => {
    for (const key of ['a', 'b', 'c', 'a', 'b', 'c']) await ask(key);
    await Promise.all(Array.from({ length: 20 }, run));
    expect(mailbox()).toHaveLength(3);
    expect(new Set(mailbox().map(({ id }) => id)).size).toBe(3);
    expect((await outbox()).map(({ state, attempts }) => ({ state, attempts }))).toEqual(
      Array.from({ length: 3 }, () => ({ state: 'sent', attempts: 1 })),
    );
    await run();
    expect(mailbox()).toHaveLength(3);
  });

  it('says in the message what it is, with a link to our own address and nothing about health', async () => {
    await ask('one');
    await run();
    expect(mailbox()).toMatchObject([
      {
        to: 'swing@example.org',
        subject: 'An outrun is raised: Act',
        links: [`${process.env['PUBLIC_URL']}/outruns/${outrun.payload.outrunId}`],
      },
    ]);
  });

  it('keeps a message while the server is down, and sends it when it is up', async () => {
    process.env['SMTP_URL'] = 'smtp://127.0.0.1:1';
    await ask('down');
    await run();
    expect(await outbox()).toMatchObject([{ state: 'queued', attempts: 1, last_answer: 'ESOCKET' }]);
    expect(later).toHaveBeenCalledExactlyOnceWith(
      'sendMail',
      { academyId: academy.id },
      { jobKey: `sendMail:later:${academy.id}`, runAt: expect.any(Date) as Date },
    );
    const [{ wait_s: waitS } = { wait_s: 0 }] = await academy.rows<{ wait_s: number }>(
      'select extract(epoch from not_before - claimed_at)::float8 as wait_s from outbox',
    );
    expect(waitS).toBeGreaterThanOrEqual(30);
    process.env['SMTP_URL'] = fake.url;
    await run();
    expect(mailbox(), 'not before its time').toEqual([]);
    await makeDue();
    await run();
    expect(mailbox()).toHaveLength(1);
    expect(await outbox()).toMatchObject([{ state: 'sent', attempts: 2 }]);
  });

  it('tries a 4xx again and gives up on a 5xx, with the answer kept', async () => {
    refusal = 451;
    await ask('x');
    await run();
    expect(await outbox()).toMatchObject([{ state: 'queued', last_answer: '451 not taken' }]);
    refusal = 550;
    await makeDue();
    await run();
    expect(await outbox()).toMatchObject([{ state: 'failed', last_answer: '550 not taken', payload: {} }]);
    refusal = undefined;
    await run();
    expect(mailbox()).toEqual([]);
  });

  it('gives up after twelve tries', async () => {
    refusal = 451;
    await ask('x');
    await academy.rows('update outbox set attempts = 11');
    await run();
    expect(await outbox()).toMatchObject([{ state: 'failed', attempts: 12 }]);
  });

  it('never sends again what a dead sender left without an answer', async () => {
    await ask('lost');
    await ask('fresh');
    await academy.rows(
      `update outbox set state = 'sending', claimed_at = now() - interval '11 minutes' where message_key = 'lost'`,
    );
    await academy.rows(`update outbox set state = 'sending', claimed_at = now() where message_key = 'fresh'`);
    await run();
    expect((await outbox()).map(({ state }) => state).sort()).toEqual(['sending', 'unknown']);
    expect(mailbox()).toEqual([]);
    expect(later).toHaveBeenCalledOnce();
  });

  it('sends nothing to a member without an address, or to one who has left', async () => {
    await ask('none', director.personId);
    await academy.rows('update membership set ended_at = now() where person_id = $1', [swing.personId]);
    await asViewer(director, (trx) => enqueueMail(trx, director, { ...outrun, personId: swing.personId, key: 'left' }));
    await run();
    await academy.rows('update membership set ended_at = null where person_id = $1', [swing.personId]);
    expect((await outbox()).map(({ state }) => state)).toEqual(['failed', 'failed']);
    expect(mailbox()).toEqual([]);
  });

  it('holds a token only under the server’s secret, and not at all once it is sent', async () => {
    const token = 'a-token-that-opens-something';
    await asViewer(director, (trx) =>
      enqueueMail(trx, director, {
        kind: 'invite',
        address: 'new@example.org',
        payload: { sealed: sealToken(token), academyName: 'Marsh', role: 'swing_coach' },
        key: 'invite',
      }),
    );
    expect(JSON.stringify(await outbox())).not.toContain(token);
    await run();
    expect(mailbox()[0]!.links).toEqual([`${process.env['PUBLIC_URL']}/invite/${token}`]);
    expect(await outbox()).toMatchObject([{ state: 'sent', payload: {} }]);
  });
});

describe('a hostile address or subject', () => {
  const settings = () => ({ smtpUrl: fake.url, from: { name: 'Marram', address: 'marram@example.org' } });
  const send = (to: string, subject = 'Hello') =>
    sendMessage(settings(), { id: 'one', to, message: { subject, html: '<p>x</p>', text: 'x' } });

  it.each([
    'a@example.org\r\nBcc: b@example.org',
    'a@example.org, b@example.org',
    '"a@evil.example"@example.org',
    'a@evil.example>@example.org',
    'a\uFF20evil.example@example.org',
    'a@\u212Aelvin.example',
    'a@example.org\0',
    'a b@example.org',
    '@example.org',
    'a@',
  ])('never leaves: %j', async (to) => {
    expect(await send(to)).toMatchObject({ verdict: 'never' });
    expect(mailbox()).toEqual([]);
  });

  it('reaches exactly the address that was checked, or nobody', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.oneof(fc.stringMatching(/^[a-z.+'-]{1,12}$/), fc.string({ unit: 'binary', maxLength: 20 })),
        fc.string({ unit: 'binary', maxLength: 20 }),
        async (local, subject) => {
          mailbox().length = 0;
          const to = `${local}@example.org`;
          const { verdict } = await send(to, subject);
          expect(verdict === 'sent' ? mailbox().map((message) => message.to) : mailbox()).toEqual(
            verdict === 'sent' ? [to] : [],
          );
        },
      ),
      { numRuns: 60 },
    );
  });

  it('cannot add a header by its subject', async () => {
    for (const end of ['\r\n', '\n', '\r', '\0']) {
      expect(await send('a@example.org', `Hi${end}Bcc: b@example.org`)).toMatchObject({ verdict: 'never' });
    }
  });
});
