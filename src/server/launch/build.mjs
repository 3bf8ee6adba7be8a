import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, writeFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { madeFolder, projectRoot, stateFolder } from '#db/cluster/paths.mjs';
import { withLock } from '#db/cluster/withLock.mjs';
import { plainEnvironment, runQuietly, testTraces } from './child.mjs';
import { compressFolder } from './compressFolder.mjs';

const sources = ['src', 'emails', 'public', 'db', 'astro.config.mjs', 'tsconfig.json', 'package-lock.json'];

/** Folders whose files are run from source and so are no part of the build. */
const unbuilt = new Set(['src/server', 'src/cli', 'src/jobs', 'db/cluster', 'db/seed']);

const stamp = join(projectRoot, 'dist', 'source.stamp');

/** A hash of everything that the build is made from. */
export function sourceHash(root = projectRoot) {
  const hash = createHash('sha256');
  const add = (path) => {
    const name = relative(root, path);
    if (unbuilt.has(name)) return;
    hash.update(`${name}\0`).update(readFileSync(path)).update('\0');
  };
  for (const source of sources) {
    const path = join(root, source);
    if (!existsSync(path)) continue;
    if (source.includes('.')) add(path);
    else walk(path, add, root);
  }
  return hash.update(publicHost()).digest('hex');
}

function walk(folder, add, root) {
  const entries = readdirSync(folder, { withFileTypes: true }).sort((a, b) => (a.name < b.name ? -1 : 1));
  for (const entry of entries) {
    const path = join(folder, entry.name);
    if (unbuilt.has(relative(root, path))) continue;
    if (entry.isDirectory()) walk(path, add, root);
    else if (entry.isFile()) add(path);
  }
}

/** The configuration names the public host; on this machine's own names nothing changes. */
function publicHost() {
  const url = process.env['PUBLIC_URL'];
  if (!url) return '';
  const { protocol, hostname } = new URL(url);
  return hostname === '127.0.0.1' || hostname === 'localhost' ? '' : `${protocol}${hostname}`;
}

/** Whether `dist` was built from the present sources. */
export function isBuilt() {
  return (
    existsSync(join(projectRoot, 'dist', 'server', 'entry.mjs')) &&
    existsSync(stamp) &&
    readFileSync(stamp, 'utf8') === sourceHash()
  );
}

/**
 * Builds when the sources have changed. No secret and no trace of a test run goes into the build: variables found in the
 * environment are otherwise written into it, and one made inside a test run cannot draw its pages.
 *
 * @param {{ signal?: AbortSignal, force?: boolean }} [options]
 * @returns {Promise<boolean>} whether it was built now
 */
export async function ensureBuild({ signal, force = false } = {}) {
  if (!force && isBuilt()) return false;
  return withLock(madeFolder(stateFolder), 'build', async () => {
    if (!force && isBuilt()) return false;
    const hash = sourceHash();
    const secrets = Object.keys(process.env).filter((name) => /^(DATABASE_|AUTH_|MARRAM_)/.test(name));
    const env = plainEnvironment([...testTraces, ...secrets]);
    const astro = join(projectRoot, 'node_modules', 'astro', 'astro.js');
    await runQuietly(process.execPath, [astro, 'build'], { env: { ...env, NODE_ENV: 'production' }, signal });
    await compressFolder(join(projectRoot, 'dist', 'client'));
    writeFileSync(stamp, hash);
    return true;
  });
}
