import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

/**
 * Installs Debian packages: root does it and says so, another user is asked through sudo, and where neither works the
 * error says in one sentence what to type.
 */
export function installPackages(packages, { log, prepare = '' }) {
  const names = packages.join(' ');
  if (!existsSync('/usr/bin/apt-get')) {
    throw new Error(
      `${names} is missing and this is not a Debian: install it with your package manager, then start again.`,
    );
  }
  const script = [
    'set -e',
    prepare,
    'export DEBIAN_FRONTEND=noninteractive',
    'apt-get -q -o DPkg::Lock::Timeout=300 update',
    `apt-get -q -y -o DPkg::Lock::Timeout=300 install --no-install-recommends ${names}`,
  ].join('\n');
  const isRoot = process.getuid?.() === 0;
  const manual = `sudo apt-get install ${names}`;
  if (isRoot) {
    log(`Installing Debian's packages: ${names}`);
    run('/bin/sh', ['-c', script], names, manual);
    return;
  }
  if (!existsSync('/usr/bin/sudo'))
    throw new Error(`${names} is missing. Install it as root: apt-get install ${names}`);
  log(`Installing Debian's packages through sudo: ${names}`);
  // Without a terminal nobody can answer sudo's question, so it must not ask.
  const quiet = process.stdin.isTTY ? [] : ['-n'];
  run('/usr/bin/sudo', [...quiet, '/bin/sh', '-c', script], names, manual);
}

function run(command, args, names, manual) {
  const asked = process.stdin.isTTY ? 'inherit' : 'ignore';
  const done = spawnSync(command, args, {
    stdio: [asked, 'pipe', 'pipe'],
    encoding: 'utf8',
    maxBuffer: 64 * 1024 * 1024,
  });
  if (done.status === 0) return;
  const last = `${done.stdout ?? ''}${done.stderr ?? ''}`.trim().split('\n').slice(-3).join(' ');
  throw new Error(`${names} could not be installed (${last || done.error?.message}). Install it with: ${manual}`);
}
