/**
 * The text of `marram.conf` in the data folder, written at each start. Sized for two cores and 2 GB; nothing that a
 * person typed may reach the log (details, statements and parameters are left out).
 *
 * @param durable false for test databases only: they may lose everything in a crash, and are faster
 */
export function settings({ durable }) {
  const lines = [
    "listen_addresses = '127.0.0.1'",
    "unix_socket_directories = ''",
    'max_connections = 80',
    'shared_buffers = 128MB',
    'effective_cache_size = 512MB',
    'work_mem = 8MB',
    'maintenance_work_mem = 64MB',
    'max_wal_size = 512MB',
    'random_page_cost = 1.1',
    'jit = off',
    'password_encryption = scram-sha-256',
    "timezone = 'UTC'",
    "log_timezone = 'UTC'",
    "lc_messages = 'C.UTF-8'",
    'logging_collector = off',
    'log_checkpoints = off',
    'log_min_messages = warning',
    'log_min_error_statement = panic',
    'log_error_verbosity = terse',
    'log_parameter_max_length = 0',
    'log_parameter_max_length_on_error = 0',
    'idle_in_transaction_session_timeout = 60s',
    'tcp_keepalives_idle = 60',
  ];
  if (!durable) lines.push('fsync = off', 'synchronous_commit = off', 'full_page_writes = off', 'autovacuum = off');
  return `${lines.join('\n')}\n`;
}

/** The whole of `pg_hba.conf`: passwords only, from this machine only. */
export const hostRules = '# Written at each start\nhost all all 127.0.0.1/32 scram-sha-256\n';
