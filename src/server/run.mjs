import { spawn } from 'node:child_process';
import { ensureCluster } from '#db/cluster.mjs';
import { projectRoot } from '#db/cluster/paths.mjs';
import { environmentOf } from './environment.mjs';
import { prepareDatabase } from './launch/database.mjs';
import { requireNodeVersion } from './launch/nodeVersion.mjs';
import { ensurePackages } from './launch/packages.mjs';
import { say } from './launch/progress.mjs';
import { onStop } from './launch/stopping.mjs';

/** Runs a TypeScript command of this project with its database: `node src/server/run.mjs <file> [arguments]`. */
async function main() {
  const [file, ...args] = process.argv.slice(2);
  if (!file) throw new Error('run requires the file to run');
  requireNodeVersion();
  await ensurePackages();
  const cluster = await ensureCluster({ log: say });
  let child;
  onStop(() => child?.kill('SIGTERM'));
  try {
    await prepareDatabase({ cluster, seed: false });
    child = spawn(process.execPath, ['--import', 'tsx', file, ...args], {
      cwd: projectRoot,
      env: { ...process.env, ...environmentOf({ cluster }) },
      stdio: 'inherit',
    });
    return await new Promise((resolve) => child.once('exit', (code) => resolve(code ?? 1)));
  } finally {
    await cluster.stop();
  }
}

main().then(
  (code) => process.exit(code),
  (error) => {
    process.stderr.write(`${error.message}\n`);
    process.exit(1);
  },
);
