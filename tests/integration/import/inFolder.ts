import { mkdtemp, mkdir, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { importSeason } from '#src/services/import/importSeason.ts';
import type { SignIn } from '#src/services/programme/provisionAcademy.ts';

/** Imports a folder as the command does, without hashing passwords; the sign-ins come back with it. */
export async function importFrom(folder: string, academy: string) {
  const signIns: SignIn[] = [];
  const said: string[] = [];
  const imported = await importSeason({
    folder,
    academy,
    today: '2026-12-01',
    say: (words) => said.push(words),
    onSignIns: (made) => signIns.push(...made),
    hashPassword: async () => '$argon2id$not-a-real-one',
  });
  return { ...imported, signIns, said };
}

/** Makes a folder of files for the work and removes it. */
export async function withFolder<T>(
  files: Readonly<Record<string, string | Buffer>>,
  work: (folder: string) => Promise<T>,
): Promise<T> {
  const folder = await mkdtemp(join(tmpdir(), 'season-'));
  try {
    for (const [path, content] of Object.entries(files)) {
      await mkdir(dirname(join(folder, path)), { recursive: true });
      await writeFile(join(folder, path), content);
    }
    return await work(folder);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}
