import { fork, type ChildProcess } from 'node:child_process';
import { chmodSync, existsSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import pg from 'pg';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { ensureCluster } from '#db/cluster.mjs';
import { readPostmaster, runningPostmaster } from '#db/cluster/postmaster.mjs';
import { commandLine, findProcess, isRunning, waitUntil } from '#db/cluster/processes.mjs';

let stateFolder = '';
beforeEach(() => {
  stateFolder = mkdtempSync(join(tmpdir(), 'marram-cluster-'));
  chmodSync(stateFolder, 0o711);
});
afterEach(() => rmSync(stateFolder, { recursive: true, force: true }));

const ensure = () => ensureCluster({ stateFolder, dataDir: join(stateFolder, 'probe'), durable: true });

async function ask(url: string, text: string): Promise<unknown> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  const { rows } = await client.query<Record<string, unknown>>(text).finally(() => client.end());
  return rows[0] && Object.values(rows[0])[0];
}

/** Kills the server of this test's own folder, having looked that it is that one. */
function killServer(dataDir: string): void {
  const found = runningPostmaster(dataDir);
  if (!found || !commandLine(found.pid).includes(dataDir)) throw new Error('not our server');
  process.kill(found.pid, 'SIGKILL');
}

it('listens on this machine only, asks for passwords, and keeps them to its owner', async () => {
  const cluster = await ensure();
  try {
    expect(await ask(cluster.superuserUrl, 'show listen_addresses')).toBe('127.0.0.1');
    expect(await ask(cluster.superuserUrl, 'show unix_socket_directories')).toBe('');
    await expect(ask(cluster.superuserUrl.replace(cluster.secrets.superuser, 'wrong'), 'select 1')).rejects.toThrow(
      /password authentication failed/,
    );
    expect(statSync(join(stateFolder, 'secrets.json')).mode & 0o777).toBe(0o600);
    expect(statSync(cluster.dataDir).mode & 0o777).toBe(0o700);
  } finally {
    await cluster.stop();
  }
  expect(isRunning(cluster.pid)).toBe(false);
});

it('comes back on its port with everything committed after it was killed', async () => {
  const first = await ensure();
  await ask(first.superuserUrl, 'create table kept as select 7 as value');
  killServer(first.dataDir);
  await waitUntil(() => !isRunning(first.pid), 10_000);
  const second = await ensure();
  try {
    expect(second.port).toBe(first.port);
    expect(second.pid).not.toBe(first.pid);
    expect(await ask(second.superuserUrl, 'select value from kept')).toBe(7);
  } finally {
    await second.stop();
  }
});

it('does not take another process for the server, though postmaster.pid names it', async () => {
  const first = await ensure();
  await first.stop();
  writeFileSync(
    join(first.dataDir, 'postmaster.pid'),
    `${process.pid}\n${first.dataDir}\n0\n1\n\n127.0.0.1\n\nready\n`,
  );
  expect(runningPostmaster(first.dataDir)).toBeUndefined();
  const second = await ensure();
  expect(readPostmaster(first.dataDir)?.pid).toBe(second.pid);
  await second.stop();
});

it('gives new passwords to the data that it finds when the secrets are gone', async () => {
  const first = await ensure();
  await ask(first.superuserUrl, 'create table kept as select 7 as value');
  await first.stop();
  rmSync(join(stateFolder, 'secrets.json'));
  const second = await ensure();
  try {
    expect(second.secrets.superuser).not.toBe(first.secrets.superuser);
    expect(await ask(second.superuserUrl, 'select value from kept')).toBe(7);
  } finally {
    await second.stop();
  }
});

it('serves two starts at once with one server, which the last to leave stops', async () => {
  const script = join(stateFolder, 'user.mjs');
  const module = new URL('../../../db/cluster.mjs', import.meta.url).href;
  writeFileSync(
    script,
    `import { ensureCluster } from '${module}';
     const cluster = await ensureCluster({ stateFolder: process.argv[2], dataDir: process.argv[2] + '/probe' });
     process.send({ pid: cluster.pid, port: cluster.port });
     process.once('message', async () => { await cluster.stop(); process.exit(0); });`,
  );
  const start = () => fork(script, [stateFolder], { execArgv: [] });
  const told = (child: ChildProcess) =>
    new Promise<{ pid: number; port: number }>((done) => child.once('message', (m) => done(m as never)));
  const left = async (child: ChildProcess) => {
    const exit = new Promise((done) => child.once('exit', done));
    child.send('leave');
    await exit;
  };
  const children = [start(), start()] as const;
  const [one, two] = await Promise.all(children.map(told));
  expect(one).toEqual(two);
  await left(children[0]);
  expect(isRunning(one!.pid)).toBe(true);
  await left(children[1]);
  expect(isRunning(one!.pid)).toBe(false);
});

it('forgets a user that was killed', async () => {
  const cluster = await ensure();
  const dead = join(stateFolder, 'users-probe', '4194304');
  writeFileSync(dead, '1');
  const reused = join(stateFolder, 'users-probe', String(process.ppid));
  writeFileSync(reused, String((findProcess(process.ppid)?.startedAt ?? 0) + 1));
  await cluster.stop();
  expect(isRunning(cluster.pid)).toBe(false);
  expect([existsSync(dead), existsSync(reused)]).toEqual([false, false]);
});

it('says what is wrong with unreadable secrets, and touches nothing', async () => {
  writeFileSync(join(stateFolder, 'secrets.json'), '{"superuser":"short"}');
  await expect(ensure()).rejects.toThrow(/is not complete: put it back, or delete it/);
  expect(readFileSync(join(stateFolder, 'secrets.json'), 'utf8')).toBe('{"superuser":"short"}');
});
