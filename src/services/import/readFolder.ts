import { createHash } from 'node:crypto';
import { lstat, readdir, readFile } from 'node:fs/promises';
import { join, sep } from 'node:path';
import { AppError } from '#src/errors/appError.ts';

/** One file of a folder; `path` is relative to the folder, with slashes. */
export interface FolderFile {
  path: string;
  bytes: Uint8Array;
  sha256: Buffer;
}

const TABLES = /\.(csv|txt|tsv|tab|dat|asc)$/i;
const MOST_FILES = 20_000;
const MOST_BYTES = 600_000_000;

/**
 * Every table of a folder and its folders, in the order of their names. Links are not followed.
 *
 * @returns the tables, and the names of files that are none
 * @throws {AppError} invalid where there is no such folder, it is empty, or it is too large
 */
export async function readFolder(folder: string): Promise<{ files: FolderFile[]; others: string[] }> {
  const paths = await filesBelow(folder);
  const tables = paths.filter((path) => TABLES.test(path));
  if (tables.length === 0) throw new AppError('invalid', `There is no CSV file in ${folder}`);
  if (tables.length > MOST_FILES) throw new AppError('too-large', `${folder} holds more than ${MOST_FILES} files`);
  const files: FolderFile[] = [];
  let total = 0;
  for (const path of tables) {
    const bytes = await readFile(join(folder, path));
    total += bytes.length;
    if (total > MOST_BYTES)
      throw new AppError('too-large', `${folder} holds more than ${MOST_BYTES / 1e6} MB of tables`);
    files.push({ path: path.split(sep).join('/'), bytes, sha256: createHash('sha256').update(bytes).digest() });
  }
  return { files, others: paths.filter((path) => !TABLES.test(path)) };
}

async function filesBelow(folder: string): Promise<string[]> {
  const entries = await lstat(folder).then(
    (status) => (status.isDirectory() ? readdir(folder, { recursive: true, withFileTypes: true }) : null),
    () => null,
  );
  if (entries === null) throw new AppError('invalid', `There is no folder ${folder}`);
  return entries
    .filter((entry) => entry.isFile() && !entry.name.startsWith('.'))
    .map((entry) =>
      join(entry.parentPath, entry.name)
        .slice(folder.length)
        .replace(/^[/\\]+/, ''),
    )
    .sort((a, b) => (a < b ? -1 : 1));
}
