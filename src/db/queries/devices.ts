import type { Tx } from '#src/db/client.ts';

/** The id of an academy's device by its name, added if need be. */
export async function addDevice(trx: Tx, academyId: string, name: string): Promise<string> {
  await trx
    .insertInto('device')
    .values({ academy_id: academyId, name })
    .onConflict((conflict) => conflict.columns(['academy_id', 'name']).doNothing())
    .execute();
  const { id } = await trx
    .selectFrom('device')
    .select('id')
    .where('academy_id', '=', academyId)
    .where('name', '=', name)
    .executeTakeFirstOrThrow();
  return id;
}
