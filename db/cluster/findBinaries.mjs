import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { installPackages } from './installPackages.mjs';

const debianFolder = '/usr/lib/postgresql';

/** The folder of the newest PostgreSQL programs that Debian's packages have put here, or undefined. */
export function findBinaries() {
  if (!existsSync(debianFolder)) return undefined;
  return readdirSync(debianFolder)
    .filter((version) => existsSync(join(debianFolder, version, 'bin', 'postgres')))
    .sort((a, b) => Number(b) - Number(a))
    .map((version) => join(debianFolder, version, 'bin'))[0];
}

/** As `findBinaries`, installing PostgreSQL first when it is missing. */
export function requireBinaries(log) {
  const found = findBinaries();
  if (found) return found;
  // Written first, so that the package does not start a database of its own.
  const prepare = [
    'mkdir -p /etc/postgresql-common',
    "[ -e /etc/postgresql-common/createcluster.conf ] || echo 'create_main_cluster = false' > /etc/postgresql-common/createcluster.conf",
  ].join('\n');
  installPackages(['postgresql'], { log, prepare });
  const installed = findBinaries();
  if (!installed) throw new Error(`PostgreSQL was installed, but its programs are not in ${debianFolder}.`);
  return installed;
}

/** The folder of the programs of one major version, for a data folder that was made by it. */
export function binariesOfVersion(version) {
  const folder = join(debianFolder, version, 'bin');
  if (existsSync(join(folder, 'postgres'))) return folder;
  throw new Error(
    `The database was made by PostgreSQL ${version}, which is not installed any more. Install it (postgresql-${version}), or move the folder away to start empty.`,
  );
}
