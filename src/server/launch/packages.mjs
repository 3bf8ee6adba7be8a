import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { madeFolder, projectRoot, stateFolder } from '#db/cluster/paths.mjs';
import { withLock } from '#db/cluster/withLock.mjs';
import { plainEnvironment, runQuietly } from './child.mjs';
import { say } from './progress.mjs';

/** Whether what stands in node_modules is what the lockfile asks for, development packages included. */
export function arePackagesInstalled(root = projectRoot) {
  const wanted = packagesOf(join(root, 'package-lock.json'));
  const found = packagesOf(join(root, 'node_modules', '.package-lock.json'));
  if (!wanted || !found) return false;
  return Object.entries(wanted).every(([path, { version, optional, peer, link }]) => {
    if (path === '' || link) return true;
    // A package for another kind of machine is rightly absent.
    return found[path] ? found[path].version === version : Boolean(optional || peer);
  });
}

function packagesOf(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8')).packages;
  } catch {
    return undefined;
  }
}

/**
 * Installs the npm packages when they are not the lockfile's.
 *
 * @param {{ signal?: AbortSignal }} [options]
 */
export async function ensurePackages({ signal } = {}) {
  if (arePackagesInstalled()) return;
  await withLock(madeFolder(stateFolder), 'packages', async () => {
    if (arePackagesInstalled()) return;
    say('Installing npm packages (once, about half a minute)');
    // NODE_ENV=production would leave out what the build and the tests need.
    const env = plainEnvironment(['NODE_ENV', 'npm_config_omit', 'npm_config_production']);
    await runQuietly('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], { env, signal });
  });
}
