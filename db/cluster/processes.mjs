import { readFileSync, readdirSync, readlinkSync } from 'node:fs';

/**
 * What Linux says of a process, or undefined when there is none.
 * `state` is the letter of `/proc/PID/stat`; `startedAt` is in clock ticks since boot and tells a reused id apart.
 */
export function findProcess(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The name in parentheses may itself hold spaces and parentheses.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return { pid: Number(pid), state: fields[0], parent: Number(fields[1]), startedAt: Number(fields[19]) };
  } catch {
    return undefined;
  }
}

/** Whether the process runs: a zombie, dead but not yet collected by its parent, does not. */
export function isRunning(pid) {
  const found = findProcess(pid);
  return found !== undefined && found.state !== 'Z' && found.state !== 'X';
}

/** The words of the process's command line, empty when it cannot be read. */
export function commandLine(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0');
  } catch {
    return [];
  }
}

/** Ids of running processes whose working folder is `folder`. Every PostgreSQL process works in its data folder. */
export function processesIn(folder) {
  return readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name))
    .map(Number)
    .filter((pid) => {
      try {
        return readlinkSync(`/proc/${pid}/cwd`) === folder && isRunning(pid);
      } catch {
        return false;
      }
    });
}

/** Asks `check` every 50 ms until it answers true; false when `limitMs` has passed. */
export async function waitUntil(check, limitMs) {
  const until = Date.now() + limitMs;
  while (!(await check())) {
    if (Date.now() > until) return false;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  return true;
}
