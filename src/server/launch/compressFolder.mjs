import { readFile, readdir, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { brotliCompress, gzip } from 'node:zlib';

const compressible = /\.(js|css|svg|json|txt|webmanifest)$/;

/** Writes `.br` and `.gz` beside each text file over 1 kB, once at build time instead of at each request. */
export async function compressFolder(folder) {
  for (const entry of await readdir(folder, { withFileTypes: true, recursive: true })) {
    if (!entry.isFile() || !compressible.test(entry.name)) continue;
    const path = join(entry.parentPath, entry.name);
    const content = await readFile(path);
    if (content.length < 1024) continue;
    await writeFile(`${path}.br`, await promisify(brotliCompress)(content));
    await writeFile(`${path}.gz`, await promisify(gzip)(content, { level: 9 }));
  }
}
