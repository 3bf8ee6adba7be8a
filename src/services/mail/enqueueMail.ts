import type { Viewer } from '#src/access/viewer.ts';
import type { Tx } from '#src/db/client.ts';
import { currentAcademyId, insertMessage } from '#src/db/queries/outbox.ts';
import { enqueue } from '#src/queue/enqueue.ts';
import { mailPayloads, type MailKind, type MailPayload } from '#src/schemas/mail.ts';

/** A message to a member (the address is looked up when it is sent) or, for an invitation, to an address. */
export type MailToSend = {
  [Kind in MailKind]: { kind: Kind; payload: MailPayload<Kind> };
}[MailKind] &
  ({ personId: string; address?: never } | { address: string; personId?: never }) & {
    /** The same key in an academy is the same message: asked for twice, sent once. */
    key: string;
  };

/**
 * Writes a message to the outbox and calls the job that sends it, both in the transaction of what gives the occasion.
 * A viewer of null is a job or a person who is not signed in: the transaction then names the academy itself.
 *
 * @throws {Error} where the transaction works for no academy
 */
export async function enqueueMail(trx: Tx, viewer: Viewer | null, mail: MailToSend): Promise<void> {
  const academyId = viewer?.academyId ?? (await currentAcademyId(trx));
  if (!academyId) throw new Error('enqueueMail requires a transaction of an academy');
  await insertMessage(trx, {
    kind: mail.kind,
    personId: mail.personId ?? null,
    address: mail.address ?? null,
    payload: mailPayloads[mail.kind].parse(mail.payload),
    key: mail.key,
  });
  await enqueue(trx, 'sendMail', { academyId }, academyId);
}
