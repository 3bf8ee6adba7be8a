import { statSync } from 'node:fs';
import { createServer } from 'node:net';
import { waitUntil } from './processes.mjs';

/**
 * Runs `work` while no other process holds the lock of this folder and name.
 *
 * The lock is a listening socket in Linux's abstract namespace: the kernel lets it go when its holder dies, however it
 * dies, so there is no stale lock to judge. It is named after the folder's identity, not its path.
 */
export async function withLock(folder, name, work, limitMs = 300_000) {
  const { dev, ino } = statSync(folder);
  const path = `\0marram-${dev}-${ino}-${name}`;
  let server;
  const got = await waitUntil(async () => {
    server = await tryListen(path);
    return server !== undefined;
  }, limitMs);
  if (!got) throw new Error(`Another start has held the lock "${name}" of ${folder} for ${limitMs / 60_000} minutes.`);
  try {
    return await work();
  } finally {
    await new Promise((resolve) => server.close(resolve));
  }
}

function tryListen(path) {
  return new Promise((resolve, reject) => {
    const server = createServer((socket) => socket.destroy());
    server.once('error', (error) => (error.code === 'EADDRINUSE' ? resolve(undefined) : reject(error)));
    server.listen(path, () => resolve(server));
  });
}
