import { migrations } from '#db/migrate.ts';
import { appDb } from '#src/db/client.ts';
import { appliedMigrations } from '#src/db/queries/appliedMigrations.ts';

/** Whether the database answers and every migration that this version knows has run. */
export async function isReady(): Promise<boolean> {
  const applied = new Set(await appliedMigrations(appDb()));
  return Object.keys(migrations).every((name) => applied.has(name));
}
