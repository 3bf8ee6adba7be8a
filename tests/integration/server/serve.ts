import { createServer, type Server, type ServerOptions } from 'node:http';
import { connect, type AddressInfo } from 'node:net';
import { createApp, type AppParts, type PageHandler } from '#src/server/app.ts';
import { createLog } from '#src/server/log.ts';
import { readSettings } from '#src/server/settings.ts';

/** The HTTP side around a small handler, listening on a free port; its log lines are kept. */
export interface Served {
  origin: string;
  port: number;
  server: Server;
  log: Record<string, unknown>[];
  /** Sends bytes as they are and gives everything that came back when the server closed the connection. */
  raw: (request: string) => Promise<string>;
  close: () => Promise<void>;
}

const env = {
  DATABASE_URL: 'postgres://a',
  DATABASE_AUTH_URL: 'postgres://b',
  DATABASE_JOB_URL: 'postgres://c',
  AUTH_SECRET: 'k3v9QpXz7LmT2wYbR8nD5sHfJ4gC6aE1',
};

export async function serve(
  pages: PageHandler,
  options: Partial<AppParts> & { env?: Record<string, string>; server?: ServerOptions } = {},
): Promise<Served> {
  const log: Record<string, unknown>[] = [];
  const destination = { write: (line: string) => void log.push(JSON.parse(line) as Record<string, unknown>) };
  const server = createServer(options.server ?? {});
  await new Promise<void>((done) => server.listen(0, '127.0.0.1', done));
  const { port } = server.address() as AddressInfo;
  const settings = readSettings({ ...env, PORT: String(port), ...options.env });
  const { clientFolder, ready = () => Promise.resolve(true) } = options;
  const app = createApp({
    settings,
    log: createLog('debug', destination),
    pages,
    ready,
    ...(clientFolder ? { clientFolder } : {}),
  });
  server.on('request', app);
  return {
    origin: `http://127.0.0.1:${port}`,
    port,
    server,
    log,
    raw: (request) => sendRaw(port, request),
    close: async () => {
      server.closeAllConnections();
      await new Promise((done) => server.close(done));
    },
  };
}

function sendRaw(port: number, request: string): Promise<string> {
  return new Promise((resolve, reject) => {
    let answer = '';
    const socket = connect(port, '127.0.0.1', () => socket.write(request));
    socket.setEncoding('latin1');
    socket.on('data', (chunk) => {
      answer += String(chunk);
    });
    socket.on('error', reject);
    socket.on('close', () => resolve(answer));
  });
}
