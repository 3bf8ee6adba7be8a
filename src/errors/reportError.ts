import { AppError } from '#src/errors/appError.ts';

/**
 * Writes an error that nobody threw on purpose to the log: its kind, its code and where in our code it came from.
 * Never its message, which may quote what a person typed.
 */
export function reportError(error: unknown, route: string): void {
  if (error instanceof AppError) return;
  const known = error instanceof Error ? error : new Error('thrown value');
  const frames = (known.stack ?? '').split('\n').filter((line) => /^\s+at /.test(line));
  const line = {
    time: new Date().toISOString(),
    level: 'error',
    event: 'unexpected error',
    route,
    kind: known.name,
    code: (known as { code?: unknown }).code,
    at: frames.slice(0, 6).map((frame) => frame.trim().replace(/\(.*[\\/](dist|src|node_modules)[\\/]/, '($1/')),
  };
  process.stderr.write(`${JSON.stringify(line)}\n`);
}
