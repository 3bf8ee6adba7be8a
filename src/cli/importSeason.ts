import { mkdir, writeFile } from 'node:fs/promises';
import { join, resolve } from 'node:path';
import { parseArgs } from 'node:util';
import { stateFolder } from '#db/cluster/paths.mjs';
import { ROLE_NAMES } from '#src/access/viewer.ts';
import { hashPassword } from '#src/auth/password.ts';
import { closeDatabases } from '#src/db/client.ts';
import { wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import { AppError } from '#src/errors/appError.ts';
import { importSeason } from '#src/services/import/importSeason.ts';
import { reportCsv, type ReportLine } from '#src/services/import/seasonReport.ts';

/**
 * `npm run import:season -- <folder> --academy "<name>"`: progress on standard error; on standard output the sign-ins
 * of a new academy, the path of the report, and as the last line one JSON object.
 */
async function main(): Promise<void> {
  const { folder, academy } = readArguments();
  const say = (words: string) => void process.stderr.write(`  ${words}\n`);
  const { summary, lines } = await importSeason({
    folder,
    academy,
    today: new Date().toISOString().slice(0, 10),
    say,
    onSignIns: (signIns) => {
      process.stdout.write(`Sign-ins of ${academy}, shown this once:\n`);
      for (const { role, userName, password } of signIns) {
        process.stdout.write(`  ${ROLE_NAMES[role].padEnd(15)} ${userName}  ${password}\n`);
      }
    },
    hashPassword,
  });
  process.stdout.write(`Report, row by row: ${await writeReport(academy, lines)}\n`);
  process.stdout.write(`${JSON.stringify(summary)}\n`);
}

function readArguments(): { folder: string; academy: string } {
  const usage = 'Usage: npm run import:season -- <folder> --academy "<name>"';
  const parsed = (() => {
    try {
      return parseArgs({ allowPositionals: true, options: { academy: { type: 'string' } } });
    } catch (error) {
      throw new AppError('invalid', `${(error as Error).message}\n${usage}`);
    }
  })();
  const [folder] = parsed.positionals;
  const academy = parsed.values.academy?.trim().replace(/\s+/g, ' ') ?? '';
  if (!folder || parsed.positionals.length > 1 || academy === '') throw new AppError('invalid', usage);
  if (academy.length > 120) throw new AppError('invalid', 'The name of an academy has at most 120 characters');
  // npm changes to the project's folder; the person named the season's folder from their own.
  return { folder: resolve(process.env['INIT_CWD'] ?? process.cwd(), folder), academy };
}

async function writeReport(academy: string, lines: readonly ReportLine[]): Promise<string> {
  const reports = join(stateFolder, 'reports');
  await mkdir(reports, { recursive: true, mode: 0o700 });
  const stamp = new Date().toISOString().slice(0, 19).replace(/[:T]/g, '-');
  const path = join(reports, `${wordsOf(academy).join('-') || 'academy'}-${stamp}`);
  await writeFile(`${path}.csv`, reportCsv(lines), { mode: 0o600 });
  await writeFile(`${path}.json`, `${JSON.stringify(lines, null, 1)}\n`, { mode: 0o600 });
  return `${path}.csv`;
}

main()
  .catch((error: unknown) => {
    process.exitCode = 1;
    if (error instanceof AppError) process.stderr.write(`${error.message}\n`);
    else {
      process.stderr.write('The import stopped. What was committed by then stays; run the same command to go on.\n');
      process.stderr.write(`${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
    }
  })
  .finally(closeDatabases);
