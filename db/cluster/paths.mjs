import { mkdirSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

/** The folder of the checkout. */
export const projectRoot = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/**
 * The folder of everything this installation makes for itself: secrets, the database, stamps, logs. Never committed.
 * It can be passed through (not listed) by other users, because the database runs as a user of its own below it.
 */
export const stateFolder = join(projectRoot, '.marram');

/** Makes the folder if it is missing and returns it. */
export function madeFolder(folder, mode = 0o711) {
  mkdirSync(folder, { recursive: true, mode });
  return folder;
}
