import { createTransport } from 'nodemailer';
import { checkAddress, checkHeaderLine } from '#src/domain/mail/checkAddress.ts';
import type { Message } from '#src/mail/composeMessage.ts';

/** What the mail server said, and what it means for the message. */
export interface Sent {
  verdict: 'sent' | 'later' | 'never' | 'unknown';
  answer: string;
}

/** Where mail goes, from the environment. */
export interface MailSettings {
  smtpUrl: string;
  from: { name: string; address: string };
}

/**
 * SMTP_URL and MAIL_FROM (`Name <address>` or an address); null where there is no mail server.
 *
 * @throws {RangeError} where MAIL_FROM is not one plain mailbox
 */
export function mailSettings(env: Readonly<Record<string, string | undefined>>): MailSettings | null {
  const smtpUrl = env['SMTP_URL'];
  if (!smtpUrl) return null;
  const [, name = 'Marram', address] =
    /^(?:([^<>]*?)\s*<)?([^<>]+)>?$/.exec(env['MAIL_FROM'] || 'marram@localhost') ?? [];
  return { smtpUrl, from: { name: checkHeaderLine(name), address: checkAddress(address ?? '') } };
}

/** Sends one message to one address. The id stays the same from try to try, so a double can be told. */
export async function sendMessage(
  { smtpUrl, from }: MailSettings,
  { id, to, message }: { id: string; to: string; message: Message },
): Promise<Sent> {
  let address: string;
  let subject: string;
  try {
    address = checkAddress(to);
    subject = checkHeaderLine(message.subject);
  } catch (error) {
    return { verdict: 'never', answer: (error as Error).message };
  }
  const { hostname, protocol } = new URL(smtpUrl);
  const transport = createTransport({
    url: smtpUrl,
    // Only a mail server on this machine may be spoken to in the open.
    requireTLS: protocol === 'smtp:' && !['127.0.0.1', 'localhost'].includes(hostname),
    connectionTimeout: 10_000,
    greetingTimeout: 10_000,
    socketTimeout: 30_000,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  try {
    const { response } = await transport.sendMail({
      from,
      to: { name: '', address },
      envelope: { from: from.address, to: [address] },
      subject,
      html: message.html,
      text: message.text,
      messageId: `<${id}@${from.address.split('@')[1]!}>`,
      headers: { 'Auto-Submitted': 'auto-generated' },
    });
    return { verdict: 'sent', answer: response };
  } catch (error) {
    return verdictOf(error as { responseCode?: number; response?: string; code?: string; command?: string });
  } finally {
    transport.close();
  }
}

function verdictOf(error: { responseCode?: number; response?: string; code?: string; command?: string }): Sent {
  const answer = error.response ?? error.code ?? 'no answer';
  if (error.responseCode !== undefined) return { verdict: error.responseCode >= 500 ? 'never' : 'later', answer };
  // The text went out and no answer came back: the server may have taken it, so it is not sent again.
  return { verdict: error.command === 'DATA' ? 'unknown' : 'later', answer };
}
