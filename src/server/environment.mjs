/**
 * The environment that the application reads, for one database of a running cluster.
 *
 * @param {object} options
 * @param {{host: string, port: number, superuserUrl: string, secrets: {authSecret: string, roles: Record<string, string>}}} options.cluster
 * @param {string} [options.database]
 * @param {number} [options.port] of the web server
 * @returns {Record<string, string>} DATABASE_URL, DATABASE_AUTH_URL, DATABASE_JOB_URL, DATABASE_OWNER_URL, AUTH_SECRET,
 *   PUBLIC_URL, PORT, MARRAM_DEMO
 */
export function environmentOf({ cluster, database = 'marram', port = Number(process.env['PORT'] || 4321) }) {
  const url = (role) => `postgres://${role}:${cluster.secrets.roles[role]}@${cluster.host}:${cluster.port}/${database}`;
  return {
    DATABASE_URL: url('marram_app'),
    DATABASE_AUTH_URL: url('marram_auth'),
    DATABASE_JOB_URL: url('marram_job'),
    DATABASE_OWNER_URL: url('marram_owner'),
    AUTH_SECRET: process.env['AUTH_SECRET'] || cluster.secrets.authSecret,
    PUBLIC_URL: process.env['PUBLIC_URL'] || `http://127.0.0.1:${port}`,
    PORT: String(port),
    MARRAM_DEMO: process.env['MARRAM_DEMO'] === '0' ? '0' : '1',
  };
}

/** What `db/migrate.ts` reads: the only place that is told the superuser's address. */
export function migrationEnvironment({ cluster, database = 'marram' }) {
  return {
    MARRAM_SUPERUSER_URL: cluster.superuserUrl,
    MARRAM_DATABASE: database,
    MARRAM_ROLE_PASSWORDS: JSON.stringify(cluster.secrets.roles),
  };
}

/** The environment of the web server: without the owner's address, which only migrations and set-up use. */
export function serverEnvironment(options) {
  const { DATABASE_OWNER_URL: _owner, ...rest } = environmentOf(options);
  return rest;
}
