import type { Viewer } from '#src/access/viewer.ts';
import { requirePermission } from '#src/access/permissions.ts';
import { asViewer } from '#src/db/client.ts';
import { listAcademyTests, listAthletesToRecord, listBatteries } from '#src/db/queries/academyTests.ts';
import { noteImportFiles } from '#src/db/queries/importFiles.ts';
import { listOpenOutruns } from '#src/db/queries/openOutruns.ts';
import { CATALOGUE } from '#src/domain/catalogue/catalogue.ts';
import { AppError } from '#src/errors/appError.ts';
import { commitDate } from '#src/services/import/commitDate.ts';
import { readAthletes, type ListedAthlete } from '#src/services/import/readAthletes.ts';
import { readFolder, type FolderFile } from '#src/services/import/readFolder.ts';
import { readSeason, type Season } from '#src/services/import/readSeason.ts';
import { fileLine, recogniseFolder } from '#src/services/import/recogniseFolder.ts';
import type { RecognisedTable } from '#src/services/import/recogniseTable.ts';
import { summarise, type ReportLine, type SeasonSummary } from '#src/services/import/seasonReport.ts';
import { settleDateOrders } from '#src/services/import/settleDates.ts';
import { provisionAcademy, type SignIn } from '#src/services/programme/provisionAcademy.ts';

export interface SeasonToImport {
  folder: string;
  academy: string;
  /** YYYY-MM-DD */
  today: string;
  /** Told each step, in words for the person who waits. */
  say: (words: string) => void;
  /** Told the sign-ins of a new academy, once. */
  onSignIns: (signIns: readonly SignIn[]) => void;
  hashPassword: (password: string) => Promise<string>;
}

/**
 * Brings a folder of an academy's files into the academy, made if need be, through the services that the screens use:
 * dates in order, all of a date or nothing, its athletes judged. Run again it finds everything there, and takes only
 * what is new.
 *
 * @returns the summary and the report's lines, one a row, cell or recording that was read
 * @throws {AppError} invalid for a folder without a list of athletes; conflict for an academy with other athletes
 */
export async function importSeason(input: SeasonToImport): Promise<{ summary: SeasonSummary; lines: ReportLine[] }> {
  const { folder, academy, say } = input;
  const { files, others } = await readFolder(folder);
  say(`${files.length} files in ${folder}`);
  const { tables, lines } = recogniseFolder(files, others);
  say(`${tables.length} files recognised: ${kindsInWords(tables)}`);
  const dates = settleDateOrders(
    tables,
    files.map(({ path }) => path),
  );
  const listed = readLists(tables, dates, input.today, lines, folder);
  const rest = tables.filter(({ kinds }) => kinds[0] !== 'athletes');

  // Read once without ids, for the dates and the tests that the new academy needs.
  const unborn = listed.map((athlete, i) => ({
    ...athlete,
    id: String(i),
    plays: athlete.plays ?? ('right' as const),
  }));
  const draft = readSeason(rest, { athletes: unborn, tests: CATALOGUE, dates });
  const { director, signIns } = await provisionAcademy({
    name: academy,
    athletes: listed,
    dates: datesOf(draft),
    batteryKeys: [...new Set(draft.trials.map(({ value }) => value.testKey))],
    hashPassword: input.hashPassword,
  });
  requirePermission(director, 'season:import');
  if (signIns.length > 0) input.onSignIns(signIns);

  const { athletes, tests, batteryId } = await loadAcademy(director);
  const season = readSeason(rest, { athletes, tests, dates });
  const ids = {
    batteryId,
    testIds: new Map(tests.map(({ key, id }) => [key, id])),
    squadOf: new Map(athletes.map(({ id, squadId }) => [id, squadId])),
  };
  let sessions = 0;
  for (const on of datesOf(season)) {
    const committed = await commitDate(director, season, on, ids);
    sessions += committed.sessions;
    say(`${on}: committed, ${committed.judged === 0 ? 'nothing new' : `${committed.judged} athletes judged`}`);
  }
  await noteFiles(director, files, tables, season);
  lines.push(...season.lines);
  const outruns = await openOutruns(director);
  return { summary: summarise(lines, { academy, athletes: athletes.length, sessions, outruns }), lines };
}

function readLists(
  tables: readonly RecognisedTable[],
  dates: ReturnType<typeof settleDateOrders>,
  today: string,
  lines: ReportLine[],
  folder: string,
): ListedAthlete[] {
  const lists = tables.filter(({ kinds }) => kinds[0] === 'athletes');
  if (lists.length === 0) {
    const unread = lines.find(({ kind, verdict }) => kind === 'file' && verdict === 'refused');
    const hint = unread ? ` (${unread.file}, row ${unread.row}: ${unread.reason})` : '';
    throw new AppError('invalid', `No file in ${folder} is a list of athletes with names and dates of birth${hint}`);
  }
  const found = lists.flatMap((table) => {
    const { readings, leftOut } = readAthletes(table, dates.orderOf(table), today);
    for (const { file, line, column, label, value, refused } of readings) {
      const reason =
        refused ?? (value?.plays === null ? 'no handedness: taken as right-handed until someone says' : '');
      const verdict = refused === null ? 'taken' : 'refused';
      lines.push({ file, row: line, column, kind: 'athletes', what: label, verdict, reason });
    }
    lines.push(...leftOut.map(({ file, line, why }) => ({ ...fileLine(file, 'left out', why), row: line })));
    return readings.flatMap(({ value }) => (value === null ? [] : [value]));
  });
  if (found.length === 0) {
    const first = lines.find(({ kind }) => kind === 'athletes');
    const why = first ? `: row ${first.row}, ${first.reason}` : ' holds no row';
    throw new AppError('invalid', `No athlete of ${lists[0]!.file} can be read${why}`);
  }
  return [
    ...new Map(
      found.map((athlete) => [JSON.stringify([athlete.givenName, athlete.familyName, athlete.birthDate]), athlete]),
    ).values(),
  ];
}

async function loadAcademy(director: Viewer) {
  return asViewer(director, async (trx) => {
    const [battery] = await listBatteries(trx);
    if (!battery) throw new AppError('conflict', 'The academy has no battery');
    return {
      athletes: await listAthletesToRecord(trx),
      tests: await listAcademyTests(trx),
      batteryId: battery.id,
    };
  });
}

function datesOf(season: Season): string[] {
  const dates = [
    ...season.trials.map(({ value }) => value.heldOn),
    ...season.growth.map(({ value }) => value.measuredOn),
    ...season.shots.map(({ value }) => value.heldOn),
    ...season.traces.map(({ value }) => value.recordedOn),
    ...season.curves.map(({ value }) => value.recordedOn),
  ];
  return [...new Set(dates)].sort();
}

const noteFiles = (
  director: Viewer,
  files: readonly FolderFile[],
  tables: readonly RecognisedTable[],
  season: Season,
) =>
  asViewer(director, (trx) =>
    noteImportFiles(
      trx,
      director,
      tables.map(({ file, kinds, body }) => ({
        kind: kinds.join(', '),
        name: file,
        sha256: files.find(({ path }) => path === file)!.sha256,
        rowsRead: season.rowsRead.get(file) ?? body.length,
      })),
    ),
  );

async function openOutruns(director: Viewer): Promise<SeasonSummary['outruns']> {
  const rows = await asViewer(director, listOpenOutruns);
  return rows.map(({ givenName, familyName, level, result }) => {
    const { criteria } = result as unknown as { criteria: { name: string; verdict: string }[] };
    const held = criteria.filter(({ verdict }) => verdict === 'met' || verdict === 'strong');
    return { athlete: `${givenName} ${familyName}`, level, criteria: held.map(({ name }) => name) };
  });
}

function kindsInWords(tables: readonly RecognisedTable[]): string {
  const counts = new Map<string, number>();
  for (const { kinds } of tables) counts.set(kinds.join(' and '), (counts.get(kinds.join(' and ')) ?? 0) + 1);
  return [...counts].map(([kind, count]) => `${count} ${kind}`).join(', ') || 'none';
}
