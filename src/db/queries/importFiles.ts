import type { Tx } from '#src/db/client.ts';

/** Notes the files that were imported; one that was noted before stays as it was. */
export async function noteImportFiles(
  trx: Tx,
  by: { academyId: string; personId: string },
  files: readonly { kind: string; name: string; sha256: Buffer; rowsRead: number }[],
): Promise<void> {
  if (files.length === 0) return;
  await trx
    .insertInto('import_file')
    .values(
      files.map(({ kind, name, sha256, rowsRead }) => ({
        academy_id: by.academyId,
        imported_by: by.personId,
        kind,
        name,
        sha256,
        rows_read: rowsRead,
      })),
    )
    .onConflict((conflict) => conflict.columns(['academy_id', 'sha256']).doNothing())
    .execute();
}
