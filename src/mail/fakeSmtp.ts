import type { AddressInfo } from 'node:net';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { mailbox, MOST_KEPT } from '#src/mail/mailbox.ts';

export interface FakeSmtp {
  /** For SMTP_URL. */
  url: string;
  close: () => Promise<void>;
}

const LARGEST_BYTES = 256 * 1024;

/**
 * A mail server for the demo and for tests, on this machine alone. It passes nothing on: what it takes is kept in memory
 * and read at `/dev/mail`. Not for real data.
 *
 * @param options `refuse` answers a recipient with an SMTP error: a code, or undefined to take the message; `port` 0 is
 *   any free one
 */
export async function startFakeSmtp(
  options: { refuse?: (address: string) => number | undefined; port?: number } = {},
): Promise<FakeSmtp> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: LARGEST_BYTES,
    onRcptTo: ({ address }, _session, done) => {
      const code = options.refuse?.(address);
      done(code === undefined ? null : Object.assign(new Error('not taken'), { responseCode: code }));
    },
    onData: (stream, session, done) => {
      simpleParser(stream).then(({ messageId, subject, text }) => {
        const kept = mailbox();
        kept.push({
          id: messageId ?? '',
          to: session.envelope.rcptTo.map(({ address }) => address).join(', '),
          subject: subject ?? '',
          text: text ?? '',
          links: text?.match(/https?:\/\/[^\s<>"]+/g) ?? [],
          receivedAt: new Date(),
        });
        kept.splice(0, kept.length - MOST_KEPT);
        done();
      }, done);
    },
  });
  // A client that drops its connection must not take the process with it.
  server.on('error', () => undefined);
  await new Promise<void>((ready) => server.listen(options.port ?? 0, '127.0.0.1', ready));
  const { port } = server.server.address() as AddressInfo;
  return {
    url: `smtp://127.0.0.1:${port}`,
    close: () => new Promise((closed) => server.close(closed)),
  };
}
