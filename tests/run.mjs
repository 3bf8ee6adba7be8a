import { spawn } from 'node:child_process';
import { existsSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { projectRoot, stateFolder } from '#db/cluster/paths.mjs';
import { ensureBuild } from '#src/server/launch/build.mjs';
import { plainEnvironment } from '#src/server/launch/child.mjs';
import { requireNodeVersion } from '#src/server/launch/nodeVersion.mjs';
import { ensurePackages } from '#src/server/launch/packages.mjs';
import { onStop } from '#src/server/launch/stopping.mjs';
import { ensureChromium } from '#tests/config/chromium.mjs';
import { ensureTestCluster } from '#tests/config/testCluster.mjs';

/** Every check of the project, in order, stopping at the first that fails. What is missing is installed first. */
const counts = { passed: 0, failed: 0 };
let running;
let cluster;

const steps = [
  ['What is needed', install],
  ['Types', () => tool('node_modules/astro/astro.js', 'check', '--minimumFailingSeverity', 'warning')],
  ['Lint', () => tool('node_modules/eslint/bin/eslint.js', '.', '--max-warnings', '0')],
  ['Format', () => tool('node_modules/prettier/bin/prettier.cjs', '--check', '.')],
  ['Unit tests', () => vitest('unit')],
  ['Integration tests', () => vitest('integration')],
  ['Build', build],
  ['End-to-end tests', () => vitest('e2e')],
];

async function install() {
  requireNodeVersion();
  await ensurePackages();
  ensureChromium(console.log);
  // Held until the end, so that the test runs below join it instead of starting one each.
  cluster = await ensureTestCluster(console.log);
  return 0;
}

async function build() {
  console.log((await ensureBuild()) ? 'built' : 'up to date');
  return 0;
}

/** Runs a tool of node_modules, its output shown as it comes. Resolves to its exit code. */
function tool(file, ...args) {
  const env = plainEnvironment(['NODE_ENV']);
  return new Promise((resolve) => {
    running = spawn(process.execPath, [join(projectRoot, file), ...args], {
      cwd: projectRoot,
      env,
      stdio: ['ignore', 'inherit', 'inherit'],
    });
    running.once('error', () => resolve(1));
    running.once('exit', (code) => resolve(code ?? 1));
  });
}

async function vitest(project) {
  const report = join(stateFolder, `vitest-${project}.json`);
  rmSync(report, { force: true });
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  const code = await tool('node_modules/vitest/vitest.mjs', 'run', '--project', project, ...reporters);
  if (existsSync(report)) {
    const { numPassedTests, numFailedTests } = JSON.parse(readFileSync(report, 'utf8'));
    counts.passed += numPassedTests;
    counts.failed += numFailedTests;
  }
  return code;
}

async function main() {
  const start = Date.now();
  for (const [name, run] of steps) {
    console.log(`\n== ${name}`);
    const began = Date.now();
    const code = await run().catch((error) => {
      console.log(error.message);
      return 1;
    });
    console.log(`== ${name}: ${code === 0 ? 'ok' : `failed (${code})`}, ${seconds(began)}`);
    if (code !== 0) return code;
  }
  console.log(`\nEverything took ${seconds(start)}`);
  return 0;
}

function seconds(since) {
  return `${((Date.now() - since) / 1000).toFixed(1)} s`;
}

async function finish(code) {
  running?.kill('SIGTERM');
  await cluster?.stop().catch((error) => console.log(error.message));
  console.log(`${counts.passed} passed, ${counts.failed} failed`);
  process.exit(code);
}

onStop(finish);
main().then(finish);
