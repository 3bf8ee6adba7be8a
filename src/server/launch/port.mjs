import { isPortFree } from '#db/cluster/freePort.mjs';

/** The port to serve on. */
export function wantedPort() {
  const port = Number(process.env['PORT'] || 4321);
  if (Number.isInteger(port) && port > 0 && port < 65536) return port;
  throw new Error(`PORT requires a number from 1 to 65535, got ${process.env['PORT']}`);
}

/** Throws, saying what to do, when something listens on the port already. */
export async function requireFreePort(port) {
  if (await isPortFree(port)) return;
  const other = `PORT=${port + 1} npm start`;
  const running = await marramOn(port);
  if (running) {
    throw new Error(
      `Marram runs already on http://127.0.0.1:${port} (process ${running.pid}). To run another: ${other}`,
    );
  }
  throw new Error(`Port ${port} is taken by another program. Choose another port: ${other}`);
}

async function marramOn(port) {
  try {
    const answer = await fetch(`http://127.0.0.1:${port}/healthz`, { signal: AbortSignal.timeout(1_000) });
    const body = await answer.json();
    return body.name === 'marram' ? body : undefined;
  } catch {
    return undefined;
  }
}
