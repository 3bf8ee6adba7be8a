import { mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { findProcess, isRunning } from './processes.mjs';

/**
 * Which processes use a cluster: one small file a process, named by its id and holding its start time, so that the
 * last one to leave knows that it is the last, even after others were killed.
 */
export function enter(folder, pid = process.pid) {
  mkdirSync(folder, { recursive: true });
  writeFileSync(join(folder, String(pid)), String(findProcess(pid)?.startedAt));
}

/** Takes this process off the list and says whether another one is still on it. */
export function leave(folder, pid = process.pid) {
  rmSync(join(folder, String(pid)), { force: true });
  return others(folder, pid).length > 0;
}

/** Ids of the other running users; files of dead ones are cleared away. */
export function others(folder, pid = process.pid) {
  mkdirSync(folder, { recursive: true });
  return readdirSync(folder)
    .map(Number)
    .filter((user) => {
      if (user === pid) return false;
      const file = join(folder, String(user));
      let startedAt = '';
      try {
        startedAt = readFileSync(file, 'utf8');
      } catch {
        return false;
      }
      const alive = isRunning(user) && String(findProcess(user)?.startedAt) === startedAt;
      if (!alive) rmSync(file, { force: true });
      return alive;
    });
}
