import { spawn } from 'node:child_process';
import { projectRoot } from '#db/cluster/paths.mjs';

/** What a test runner leaves in the environment, and what a build or a server must not take for its own. */
export const testTraces = [
  'VITEST',
  'VITEST_MODE',
  'VITEST_POOL_ID',
  'VITEST_WORKER_ID',
  'TEST',
  'MODE',
  'DEV',
  'PROD',
  'SSR',
  'BASE_URL',
];

/** The environment without what would change how a tool works. */
export function plainEnvironment(without = []) {
  const env = { ...process.env, NO_COLOR: '1', FORCE_COLOR: '0', ASTRO_TELEMETRY_DISABLED: '1' };
  for (const name of without) delete env[name];
  return env;
}

/**
 * Runs a program to its end, its output kept back and shown only if it fails.
 *
 * @param {string} command
 * @param {string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, signal?: AbortSignal }} [options]
 * @returns {Promise<string>} what it printed
 * @throws {Error} with the end of its output
 */
export function runQuietly(command, args, { env = plainEnvironment(), signal } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { cwd: projectRoot, env, signal, stdio: ['ignore', 'pipe', 'pipe'] });
    let output = '';
    const keep = (chunk) => {
      output = (output + chunk).slice(-20_000);
    };
    child.stdout.on('data', keep);
    child.stderr.on('data', keep);
    child.once('error', reject);
    child.once('close', (code) => {
      if (code === 0) resolve(output);
      else
        reject(
          new Error(`${[...args].slice(0, 3).join(' ')} failed:\n${output.trim().split('\n').slice(-40).join('\n')}`),
        );
    });
  });
}

/**
 * Runs a TypeScript file to its end in a process of its own.
 *
 * @param {string} file
 * @param {{ env?: Record<string, string>, signal?: AbortSignal }} [options]
 */
export function runScript(file, { env = {}, signal } = {}) {
  return runQuietly(process.execPath, ['--import', 'tsx', file], { env: { ...plainEnvironment(), ...env }, signal });
}
