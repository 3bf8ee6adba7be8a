import type { FakeSmtp } from '#src/mail/fakeSmtp.ts';

/** In the demo without a mail server of its own: starts one that keeps messages to itself, and points SMTP_URL at it. */
export async function startDemoMail(env: NodeJS.ProcessEnv): Promise<FakeSmtp | null> {
  if (env['MARRAM_DEMO'] !== '1' || env['SMTP_URL']) return null;
  const { startFakeSmtp } = await import('#src/mail/fakeSmtp.ts');
  const fake = await startFakeSmtp();
  env['SMTP_URL'] = fake.url;
  return fake;
}
