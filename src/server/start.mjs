import { spawn } from 'node:child_process';
import { join } from 'node:path';
import { ensureCluster } from '#db/cluster.mjs';
import { projectRoot } from '#db/cluster/paths.mjs';
import { isRunning } from '#db/cluster/processes.mjs';
import { serverEnvironment } from './environment.mjs';
import { accountLines } from './launch/accounts.mjs';
import { ensureBuild } from './launch/build.mjs';
import { demoAccountsFile, prepareDatabase } from './launch/database.mjs';
import { requireNodeVersion } from './launch/nodeVersion.mjs';
import { ensurePackages } from './launch/packages.mjs';
import { requireFreePort, wantedPort } from './launch/port.mjs';
import { say, step } from './launch/progress.mjs';
import { answers, serverLog, spawnServer, stopChild } from './launch/server.mjs';
import { onStop } from './launch/stopping.mjs';

const dev = process.argv.includes('--dev');
const demo = process.env['MARRAM_DEMO'] !== '0';
const abort = new AbortController();
const { signal } = abort;
const children = new Set();
let cluster;
let stopping = false;

async function start() {
  requireNodeVersion();
  const port = wantedPort();
  await requireFreePort(port);
  await step('npm packages', () => ensurePackages({ signal }));
  await step('PostgreSQL', async () => {
    cluster = await ensureCluster({ log: say });
  });
  await step('Database', () => prepareDatabase({ cluster, seed: demo, signal }));
  if (!dev) await step('Build', () => ensureBuild({ signal }));
  if (stopping) return;
  await step('Server', () => (dev ? startDev(port) : startServer(port)));
  watchCluster(port);
  announce(port);
}

/** Starts the server and keeps it running: a server that dies is started again, five times a minute at most. */
async function startServer(port, ends = []) {
  const child = spawnServer(serverEnvironment({ cluster, port }));
  children.add(child);
  child.once('exit', (code) => {
    children.delete(child);
    if (stopping || child.replaced) return;
    if (code === 98)
      return fail(new Error(`Port ${port} was taken meanwhile. Choose another: PORT=${port + 1} npm start`));
    const recent = [...ends, Date.now()].filter((at) => at > Date.now() - 60_000);
    if (!child.wasReady || recent.length > 5) return fail(new Error(`The server stopped. Its log: ${serverLog}`));
    say('The server stopped unexpectedly; starting it again');
    startServer(port, recent).catch(fail);
  });
  child.wasReady = await answers(`http://127.0.0.1:${port}/readyz`, child, 60_000);
  if (!child.wasReady && !stopping) throw new Error(`The server did not get ready. Its log: ${serverLog}`);
}

/** The development server of Astro, and the job queue beside it; the page's own errors are shown here. */
async function startDev(port) {
  const env = {
    ...process.env,
    ...serverEnvironment({ cluster, port }),
    ASTRO_TELEMETRY_DISABLED: '1',
    ASTRO_DISABLE_UPDATE_CHECK: 'true',
  };
  const astro = [
    join(projectRoot, 'node_modules/astro/astro.js'),
    'dev',
    '--host',
    '127.0.0.1',
    '--port',
    String(port),
  ];
  for (const args of [astro, ['--import', 'tsx', 'src/server/devWorker.ts']]) {
    const child = spawn(process.execPath, args, {
      cwd: projectRoot,
      env,
      stdio: ['ignore', 'inherit', 'inherit', 'ipc'],
    });
    children.add(child);
    child.once('exit', () => {
      children.delete(child);
      if (!stopping) fail(new Error(`${args.at(-1)} stopped.`));
    });
  }
}

/** Brings a killed database back, on its port if that is still free, so that the server finds it again by itself. */
function watchCluster(port) {
  let waitMs = 1_000;
  const look = async () => {
    if (stopping) return;
    if (!isRunning(cluster.pid)) {
      say('The database stopped; starting it again');
      const before = cluster.port;
      try {
        cluster = await ensureCluster({ log: say });
        waitMs = 1_000;
        if (cluster.port !== before && !dev) await replaceServer(port);
      } catch (error) {
        say(error.message);
        waitMs = Math.min(waitMs * 2, 30_000);
      }
    }
    if (!stopping) setTimeout(look, waitMs);
  };
  setTimeout(look, waitMs);
}

async function replaceServer(port) {
  for (const child of children) {
    child.replaced = true;
    await stopChild(child);
  }
  if (!stopping) await startServer(port);
}

function announce(port) {
  const lines = ['', `Marram runs on http://127.0.0.1:${port}`];
  const accounts = demo ? accountLines(demoAccountsFile) : [];
  if (accounts.length > 0)
    lines.push('', 'Demo accounts (role, e-mail, password):', ...accounts.map((line) => `  ${line}`));
  if (demo && !dev && !process.env['SMTP_URL']) lines.push('', `Mail of the demo: http://127.0.0.1:${port}/dev/mail`);
  lines.push('', `Log: ${serverLog}`, 'Stop with Ctrl-C', '');
  process.stdout.write(lines.join('\n'));
}

async function stop(exitCode) {
  if (stopping) return;
  stopping = true;
  abort.abort();
  if (cluster) process.stderr.write('- Stopping\n');
  // A step in the middle ends first: what it started, we stop.
  await Promise.race([starting, new Promise((resolve) => setTimeout(resolve, 20_000).unref())]);
  await Promise.all([...children].map((child) => stopChild(child)));
  await cluster?.stop().catch((error) => say(error.message));
  process.exit(exitCode);
}

function fail(error) {
  if (stopping) return;
  process.stderr.write(`\n${error.message}\n`);
  stop(1);
}

onStop(stop);
const starting = start().catch(fail);
