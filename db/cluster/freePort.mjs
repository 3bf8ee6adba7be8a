import { createServer } from 'node:net';

/** Whether nothing listens on the port of 127.0.0.1 (nor on all addresses, which would shadow it). */
export function isPortFree(port) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(false));
    server.listen({ port, host: '127.0.0.1', exclusive: true }, () => server.close(() => resolve(true)));
  });
}

/** The first free port of the wanted ones, else any free one. */
export async function freePort(wanted = []) {
  for (const port of wanted) {
    if (await isPortFree(port)) return port;
  }
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port: 0, host: '127.0.0.1' }, () => {
      const { port } = server.address();
      server.close(() => resolve(port));
    });
  });
}
