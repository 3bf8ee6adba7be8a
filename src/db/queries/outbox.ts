import { sql } from 'kysely';
import type { Tx } from '#src/db/client.ts';

interface NewMessage {
  kind: string;
  personId: string | null;
  address: string | null;
  payload: unknown;
  key: string;
}

/** The academy that the transaction works for. */
export async function currentAcademyId(trx: Tx): Promise<string | null> {
  const { rows } = await sql<{ id: string | null }>`select app.academy_id() as id`.execute(trx);
  return rows[0]?.id ?? null;
}

/** Adds a message to the outbox unless one of this key is there. */
export async function insertMessage(trx: Tx, { kind, personId, address, payload, key }: NewMessage): Promise<void> {
  await trx
    .insertInto('outbox')
    .values({
      academy_id: sql<string>`app.academy_id()`,
      kind,
      person_id: personId,
      address,
      payload: JSON.stringify(payload),
      message_key: key,
    })
    // Without naming the columns: those who may add a message may not read one.
    .onConflict((conflict) => conflict.doNothing())
    .execute();
}

/**
 * Takes up to `most` messages that are due, marks them as being sent, and gives them with the address of the member or
 * the one that was typed; null where the member has none or has left.
 */
export async function claimMessages(trx: Tx, most: number) {
  const claimed = await trx
    // Its own step: inside the update, the planner may run the choice again for each row.
    .with('due', (db) =>
      db
        .selectFrom('outbox')
        .select('id')
        .where('state', '=', 'queued')
        .where('not_before', '<=', sql<Date>`clock_timestamp()`)
        .orderBy('made_at')
        .limit(most)
        .forUpdate()
        .skipLocked(),
    )
    .updateTable('outbox')
    .from('due')
    .set((eb) => ({
      state: 'sending',
      claimed_at: sql<Date>`clock_timestamp()`,
      attempts: eb('outbox.attempts', '+', 1),
    }))
    .whereRef('outbox.id', '=', 'due.id')
    .returning([
      'outbox.id',
      'outbox.kind',
      'outbox.payload',
      'outbox.attempts',
      'outbox.address',
      'outbox.person_id as personId',
    ])
    .execute();
  const people = claimed.flatMap(({ personId }) => personId ?? []);
  const contacts = people.length === 0 ? [] : await listAddresses(trx, people);
  const addresses = new Map(contacts.map(({ personId, email }) => [personId, email]));
  return claimed.map(({ address, personId, ...message }) => ({
    ...message,
    address: address ?? (personId === null ? null : (addresses.get(personId) ?? null)),
  }));
}

const listAddresses = (trx: Tx, personIds: readonly string[]) =>
  trx
    .selectFrom('person_contact')
    .innerJoin('person', 'person.id', 'person_contact.person_id')
    .select(['person.id as personId', 'person_contact.email'])
    .where('person.id', 'in', [...personIds])
    .where('person.disabled_at', 'is', null)
    .where((eb) =>
      eb.exists(
        eb
          .selectFrom('membership')
          .select('membership.id')
          .whereRef('membership.person_id', '=', 'person.id')
          .where('membership.ended_at', 'is', null),
      ),
    )
    .execute();

export interface Outcome {
  state: 'sent' | 'failed' | 'queued' | 'unknown';
  answer: string | null;
  /** For `queued`: how long to wait. */
  waitS?: number;
}

/** Notes what became of a message. What is over keeps no payload: it may hold a sealed token. */
export async function settleMessage(trx: Tx, id: string, { state, answer, waitS = 0 }: Outcome): Promise<void> {
  await trx
    .updateTable('outbox')
    .set({
      state,
      last_answer: answer?.slice(0, 500) ?? null,
      not_before: sql<Date>`clock_timestamp() + make_interval(secs => ${waitS})`,
      ...(state === 'sent' ? { sent_at: sql<Date>`clock_timestamp()` } : {}),
      ...(state === 'queued' ? {} : { payload: '{}' }),
    })
    .where('id', '=', id)
    .where('state', '=', 'sending')
    .execute();
}

/** Messages whose sender died between sending and noting it: nobody knows, and they are not sent again. */
export async function markLost(trx: Tx): Promise<void> {
  await trx
    .updateTable('outbox')
    .set({ state: 'unknown', last_answer: 'The sender stopped before the answer came', payload: '{}' })
    .where('state', '=', 'sending')
    .where('claimed_at', '<', sql<Date>`clock_timestamp() - interval '10 minutes'`)
    .execute();
}

/** Seconds until there is something to do again: a message is due, or one is long enough without an answer. */
export async function nextDueS(trx: Tx): Promise<number | null> {
  const { rows } = await sql<{ dueS: number | null }>`
    select extract(epoch from min(case state when 'queued' then not_before else claimed_at + interval '10 minutes' end)
      - clock_timestamp())::float8 as "dueS"
    from outbox where state in ('queued', 'sending')
  `.execute(trx);
  return rows[0]?.dueS ?? null;
}
