import { createServer } from 'node:http';
import { resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { closeDatabases } from '#src/db/client.ts';
import { tasks } from '#src/jobs/index.ts';
import { startDemoMail } from '#src/server/demoMail.ts';
import { createApp, type PageHandler } from '#src/server/app.ts';
import { drain, stopOnSignals } from '#src/server/gracefulStop.ts';
import { captureConsole, createLog } from '#src/server/log.ts';
import { isReady } from '#src/server/isReady.ts';
import { readSettings } from '#src/server/settings.ts';
import { startWorker } from '#src/server/worker.ts';
import { describeError } from '#src/server/describeError.ts';

const settings = readSettings(process.env);
const log = createLog(settings.logLevel);
captureConsole(log);
process.on('unhandledRejection', (error) => log.error({ error: describeError(error) }, 'unhandled rejection'));
process.on('uncaughtException', (error) => {
  log.fatal({ error: describeError(error) }, 'uncaught');
  process.exit(1);
});

const { handler } = (await import(pathToFileURL(resolve('dist/server/entry.mjs')).href)) as { handler: PageHandler };
const app = createApp({ settings, log, pages: handler, clientFolder: resolve('dist/client'), ready: isReady });
const server = createServer({ headersTimeout: 15_000, requestTimeout: 120_000, keepAliveTimeout: 65_000 }, app);

await new Promise<void>((done, failed) => {
  server.once('error', (error: NodeJS.ErrnoException) => {
    // The starter knows this code and says what to do about a taken port.
    if (error.code === 'EADDRINUSE') process.exit(98);
    failed(error);
  });
  server.listen(settings.port, '127.0.0.1', done);
});
log.info({ port: settings.port }, 'listening');

const demoMail = await startDemoMail(process.env);

// Only one process can hold the port, so a worker named after it cannot be alive anywhere else.
const worker = startWorker({
  connectionString: process.env['DATABASE_JOB_URL'] ?? '',
  tasks,
  workerId: `marram-${settings.port}`,
  log,
});

stopOnSignals(async () => {
  log.info('stopping');
  await Promise.all([drain(server, 10_000), worker.stop()]);
  await demoMail?.close();
  await closeDatabases();
  log.info('stopped');
}, 18_000);
