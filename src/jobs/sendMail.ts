import type { Task } from 'graphile-worker';
import { asJob } from '#src/db/client.ts';
import { claimMessages, markLost, nextDueS, settleMessage, type Outcome } from '#src/db/queries/outbox.ts';
import { mailSettings, sendMessage } from '#src/mail/sendMessage.ts';
import type { Jobs } from '#src/queue/enqueue.ts';
import { messageProps } from '#src/services/mail/messageProps.ts';

const BATCH = 20;
const MOST_TRIES = 12;

/**
 * Sends what waits in the outbox of an academy. A message is marked before it is sent: if the process dies in between,
 * it is unknown whether it went, and after ten minutes it is called so and never sent again by itself. A message that
 * the server could not take now waits 30 s, doubled from try to try to six hours, with up to half as much again by
 * chance.
 */
export const sendMail: Task = async (payload, helpers) => {
  const { academyId } = payload as Jobs['sendMail'];
  await asJob(academyId, markLost);
  for (;;) {
    const messages = await asJob(academyId, (trx) => claimMessages(trx, BATCH));
    for (const message of messages) {
      const outcome = await outcomeOf(message);
      await asJob(academyId, (trx) => settleMessage(trx, message.id, outcome));
    }
    if (messages.length < BATCH) break;
  }
  const dueS = await asJob(academyId, nextDueS);
  if (dueS === null) return;
  const runAt = new Date(Date.now() + Math.max(dueS, 1) * 1000);
  await helpers.addJob('sendMail', { academyId }, { jobKey: `sendMail:later:${academyId}`, runAt });
};

type Claimed = Awaited<ReturnType<typeof claimMessages>>[number];

async function outcomeOf({ id, kind, payload, attempts, address }: Claimed): Promise<Outcome> {
  if (address === null) return { state: 'failed', answer: 'The person has no address here' };
  const settings = mailSettings(process.env);
  if (!settings) return later(attempts, 'No mail server is set (SMTP_URL)');
  try {
    // Rendering brings a large library: only a process that sends mail loads it.
    const { composeMessage } = await import('#src/mail/composeMessage.ts');
    const message = await composeMessage(messageProps(kind, payload));
    const { verdict, answer } = await sendMessage(settings, { id, to: address, message });
    if (verdict === 'later') return later(attempts, answer);
    return { state: verdict === 'never' ? 'failed' : verdict, answer };
  } catch (error) {
    return { state: 'failed', answer: error instanceof Error ? error.name : 'thrown value' };
  }
}

function later(attempts: number, answer: string): Outcome {
  if (attempts >= MOST_TRIES) return { state: 'failed', answer };
  const waitS = Math.min(30 * 2 ** (attempts - 1), 6 * 3600);
  return { state: 'queued', answer, waitS: waitS * (1 + Math.random() / 2) };
}
