/** What a log may hold of an error: where and what kind, never the values that a message may quote. */
export interface DescribedError {
  name: string;
  code?: string;
  message?: string;
  constraint?: string;
  table?: string;
  at: string[];
}

/** Messages of these name variables and system calls of ours, not what people typed. */
const plainSpoken = new Set(['TypeError', 'ReferenceError']);

/** Describes anything that was thrown; its causes are not followed. */
export function describeError(thrown: unknown): DescribedError {
  if (!(thrown instanceof Error)) return { name: typeof thrown, at: [] };
  const fields = thrown as Error & { code?: unknown; constraint?: unknown; table?: unknown; syscall?: unknown };
  const described: DescribedError = {
    name: thrown.name,
    at: (thrown.stack ?? '')
      .split('\n')
      .filter((line) => /^\s+at /.test(line))
      .slice(0, 12)
      .map((line) => line.trim()),
  };
  if (typeof fields.code === 'string') described.code = fields.code;
  if (plainSpoken.has(thrown.name) || typeof fields.syscall === 'string') described.message = thrown.message;
  if (typeof fields.constraint === 'string') described.constraint = fields.constraint;
  if (typeof fields.table === 'string') described.table = fields.table;
  return described;
}

/** A text of a library as a log may have it: without ids, addresses, queries and line breaks. */
export function describeText(text: string): string {
  return text
    .replace(/[0-9a-f]{8}-[0-9a-f-]{27}/gi, ':id')
    .replace(/\S+@\S+/g, ':address')
    .replace(/\?\S*/g, '')
    .replace(/\/\S{24,}/g, '/:id')
    .replace(/[\u0000-\u001f\u007f\u2028\u2029]+/g, ' ')
    .slice(0, 300);
}
