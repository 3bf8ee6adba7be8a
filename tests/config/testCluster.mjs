import { createHash } from 'node:crypto';
import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { ensureCluster } from '#db/cluster.mjs';
import { projectRoot, stateFolder } from '#db/cluster/paths.mjs';

/** The tests' own PostgreSQL: own folder, own port, nothing in it that matters. */
export function ensureTestCluster(log = () => {}) {
  return ensureCluster({ dataDir: join(stateFolder, 'test-pg'), durable: false, log });
}

/** Name of the template database of the present migrations. */
export function templateName() {
  const hash = createHash('sha256');
  const db = join(projectRoot, 'db');
  const files = readdirSync(db, { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile() && entry.name.endsWith('.ts'))
    .map((entry) => join(entry.parentPath, entry.name))
    .filter((path) => !path.startsWith(join(db, 'seed')))
    .sort();
  for (const file of files) hash.update(file.slice(db.length)).update(readFileSync(file));
  return `template_${hash.digest('hex').slice(0, 12)}`;
}
