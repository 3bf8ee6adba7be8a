// Writes src/db/types.ts and db/schema.sql from a migrated database: MARRAM_SCHEMA_URL as a superuser's connection.
import { execFileSync } from 'node:child_process';
import { readFileSync, writeFileSync } from 'node:fs';

const url = process.env.MARRAM_SCHEMA_URL;
if (!url) throw new Error('generate requires MARRAM_SCHEMA_URL');

const codegen = ['--dialect', 'postgres', '--url', url, '--out-file', 'src/db/types.ts', '--date-parser', 'string'];
codegen.push('--numeric-parser', 'number', '--include-pattern', 'public.*', '--exclude-pattern', 'public.kysely_*');
execFileSync('node_modules/.bin/kysely-codegen', codegen, { stdio: 'inherit' });

// The client reads 8-byte integers as numbers (src/db/client.ts).
const types = readFileSync('src/db/types.ts', 'utf8');
writeFileSync(
  'src/db/types.ts',
  types.replace(
    /export type Int8 = [^;]+;/,
    'export type Int8 = ColumnType<number, bigint | number | string, bigint | number | string>;',
  ),
);

const args = ['--schema-only', '--no-owner', '--schema=public', '--schema=app', '--exclude-table=kysely_*', url];
const dump = execFileSync('pg_dump', args, { encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 });
// Comments, settings and session keys change from one pg_dump to the next; the schema does not.
const lines = dump.split('\n').filter((line) => !/^(--|SET |SELECT pg_catalog|\\)/.test(line));
writeFileSync(
  'db/schema.sql',
  `${lines
    .join('\n')
    .replace(/\n{3,}/g, '\n\n')
    .trim()}\n`,
);
process.stdout.write(
  `types: ${readFileSync('src/db/types.ts', 'utf8').split('\n').length} lines, schema: ${lines.length} lines\n`,
);
