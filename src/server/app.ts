import type { IncomingMessage, ServerResponse } from 'node:http';
import express, { type Express } from 'express';
import { accessLog } from '#src/server/accessLog.ts';
import { bodyCap } from '#src/server/bodyCap.ts';
import { compressed } from '#src/server/compressed.ts';
import { securityHeaders } from '#src/server/headers.ts';
import { healthz, readyz } from '#src/server/health.ts';
import { hostGuard } from '#src/server/hostGuard.ts';
import { jsonOnly } from '#src/server/jsonOnly.ts';
import { lastResort } from '#src/server/lastResort.ts';
import type { Log } from '#src/server/log.ts';
import { originGuard } from '#src/server/originGuard.ts';
import { pathGuard } from '#src/server/pathGuard.ts';
import { proxyHeaders } from '#src/server/proxyHeaders.ts';
import type { ServerSettings } from '#src/server/settings.ts';
import { staticFiles } from '#src/server/staticFiles.ts';

/** The built pages and routes; without `next` it answers unknown paths with its own 404 page. */
export type PageHandler = (
  req: IncomingMessage,
  res: ServerResponse,
  next: undefined,
  locals: Record<string, unknown>,
) => Promise<void>;

export interface AppParts {
  settings: ServerSettings;
  log: Log;
  pages: PageHandler;
  /** Folder of the built client files, if there is one. */
  clientFolder?: string;
  /** Whether the database answers and has the newest migration. */
  ready: () => Promise<boolean>;
}

/**
 * The HTTP side around the pages. The order is the point: name the request, set headers, refuse what is odd, foreign or
 * too large, and only then route. No body parser stands before the pages: it would rewrite or break their bodies.
 */
export function createApp({ settings, log, pages, clientFolder, ready }: AppParts): Express {
  const https = settings.publicUrl.protocol === 'https:';
  const app = express();
  app.disable('x-powered-by');
  app.disable('etag');
  app.use(accessLog(log));
  app.use(...securityHeaders(https));
  app.use(pathGuard);
  app.use(hostGuard(settings.hosts));
  app.use(proxyHeaders(settings.trustedProxies, https));
  app.use(originGuard(settings.origins));
  app.use(bodyCap);
  app.use(jsonOnly);
  app.get('/healthz', healthz);
  app.get('/readyz', readyz(ready, log));
  app.use(compressed());
  if (clientFolder) app.use(staticFiles(clientFolder));
  app.use((req, res) => pages(req, res, undefined, { requestId: res.locals['requestId'] }));
  app.use(lastResort(log));
  return app;
}
