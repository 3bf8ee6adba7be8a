/** What the process reads from its environment, checked once at start. */
export interface ServerSettings {
  port: number;
  publicUrl: URL;
  /** Host names that a request may name, without port. */
  hosts: ReadonlySet<string>;
  /** Origins from which an unsafe request may come. */
  origins: ReadonlySet<string>;
  /** Addresses whose X-Forwarded-For is believed. */
  trustedProxies: ReadonlySet<string>;
  logLevel: string;
}

const required = ['DATABASE_URL', 'DATABASE_AUTH_URL', 'DATABASE_JOB_URL'] as const;

/**
 * Reads the settings, refusing to start with a missing address, a bad port or a short or well-known secret.
 *
 * @throws {Error} naming the variable, never its value
 */
export function readSettings(env: Readonly<Record<string, string | undefined>>): ServerSettings {
  for (const name of required) if (!env[name]) throw new Error(`${name} is not set`);
  const secret = env['AUTH_SECRET'] ?? '';
  if (secret.length < 32 || new Set(secret).size < 10) {
    throw new Error('AUTH_SECRET requires at least 32 random characters');
  }
  const port = Number(env['PORT'] ?? 4321);
  if (!Number.isInteger(port) || port < 1 || port > 65535) throw new Error('PORT requires a whole number, 1 to 65535');
  const publicUrl = new URL(env['PUBLIC_URL'] || `http://127.0.0.1:${port}`);
  return {
    port,
    publicUrl,
    hosts: new Set(['127.0.0.1', 'localhost', publicUrl.hostname]),
    origins: new Set([`http://127.0.0.1:${port}`, `http://localhost:${port}`, publicUrl.origin]),
    trustedProxies: new Set((env['TRUSTED_PROXY'] ?? '').split(',').flatMap((each) => each.trim() || [])),
    logLevel: env['LOG_LEVEL'] || 'info',
  };
}
