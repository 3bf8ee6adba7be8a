import type { Server, ServerResponse } from 'node:http';

/**
 * Stops taking connections and waits for the requests in flight, each answered with `Connection: close`; after `limitMs`
 * the rest are cut. Streams that never end are the reason for the limit.
 */
export async function drain(server: Server, limitMs: number): Promise<void> {
  server.prependListener('request', (_req, res: ServerResponse) => res.setHeader('Connection', 'close'));
  const closed = new Promise<void>((resolve) => server.close(() => resolve()));
  server.closeIdleConnections();
  const sweep = setInterval(() => server.closeIdleConnections(), 100);
  const cut = setTimeout(() => server.closeAllConnections(), limitMs);
  await closed;
  clearInterval(sweep);
  clearTimeout(cut);
}

/**
 * Calls `stop` once, at the first of SIGTERM, SIGINT or the end of the process that started us, and then exits. Should
 * `stop` hang, the process exits all the same after `limitMs`.
 */
export function stopOnSignals(stop: () => Promise<void>, limitMs: number): void {
  let stopping = false;
  const once = () => {
    if (stopping) return;
    stopping = true;
    setTimeout(() => process.exit(1), limitMs).unref();
    stop().then(
      () => process.exit(0),
      () => process.exit(1),
    );
  };
  for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP'] as const) process.on(signal, once);
  if (process.channel) {
    process.once('disconnect', once);
    // The channel to the starter only tells us of its end; it must not keep us alive.
    process.channel.unref();
  }
}
