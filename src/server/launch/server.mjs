import { spawn } from 'node:child_process';
import { closeSync, existsSync, openSync, renameSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { projectRoot, stateFolder } from '#db/cluster/paths.mjs';
import { plainEnvironment, testTraces } from './child.mjs';

export const serverLog = join(stateFolder, 'server.log');

/** Starts the web server as a child in our process group, its log in a file; the channel tells it when we are gone. */
export function spawnServer(env, logFile = serverLog) {
  if (existsSync(logFile) && statSync(logFile).size > 20_000_000) renameSync(logFile, `${logFile}.1`);
  const output = openSync(logFile, 'a', 0o600);
  const child = spawn(process.execPath, ['--import', 'tsx', 'src/server/main.ts'], {
    cwd: projectRoot,
    env: { ...plainEnvironment(testTraces), ...env, NODE_ENV: 'production' },
    stdio: ['ignore', output, output, 'ipc'],
  });
  closeSync(output);
  return child;
}

/** Waits until the path answers 200; false when the child ends first or the time is over. */
export async function answers(url, child, limitMs) {
  const until = Date.now() + limitMs;
  while (Date.now() < until && child.exitCode === null && child.signalCode === null) {
    const ok = await fetch(url, { signal: AbortSignal.timeout(2_000) }).then(
      (answer) => answer.ok,
      () => false,
    );
    if (ok) return true;
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  return false;
}

/** Asks the child to stop, and insists after `limitMs`. */
export function stopChild(child, limitMs = 20_000) {
  if (child.exitCode !== null || child.signalCode !== null) return Promise.resolve();
  return new Promise((resolve) => {
    const insist = setTimeout(() => child.kill('SIGKILL'), limitMs);
    child.once('exit', () => {
      clearTimeout(insist);
      resolve();
    });
    child.kill('SIGTERM');
  });
}
