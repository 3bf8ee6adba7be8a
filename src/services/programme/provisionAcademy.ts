import { randomBytes } from 'node:crypto';
import type { Role, Viewer } from '#src/access/viewer.ts';
import { ownerDb } from '#src/db/client.ts';
import {
  addSquadCoaches,
  addSquads,
  addTerms,
  findAcademyByName,
  findDirector,
  hasTerms,
  insertAcademy,
  insertAthletes,
  insertMember,
  insertProgramme,
  listAthleteNames,
  listCoaches,
  listTakenUserNames,
} from '#src/db/queries/provisioning.ts';
import { CATALOGUE } from '#src/domain/catalogue/catalogue.ts';
import { testRow } from '#src/services/programme/testRow.ts';
import { plainLetters, wordsOf } from '#src/domain/catalogue/wordsOf.ts';
import type { Sex } from '#src/domain/growth/sex.ts';
import { DEFAULT_POLICY } from '#src/domain/outrun/policy.ts';
import { AppError } from '#src/errors/appError.ts';
import { termsOf } from '#src/services/programme/termsOf.ts';

/** A child as the academy's list has it. */
export interface ProvisionedAthlete {
  givenName: string;
  familyName: string;
  birthDate: string;
  sex: Sex;
  plays: 'left' | 'right' | null;
  squad: string;
  /** Kept, not invited. */
  guardianEmails: readonly string[];
}

export interface AcademyToProvision {
  name: string;
  athletes: readonly ProvisionedAthlete[];
  /** Every date of the season, YYYY-MM-DD: they show the terms. */
  dates: readonly string[];
  /** Keys of the tests that make its battery; all of the catalogue where none is given. */
  batteryKeys: readonly string[];
  hashPassword: (password: string) => Promise<string>;
}

/** A sign-in made for a new academy. The password is known nowhere else. */
export interface SignIn {
  role: Role;
  userName: string;
  password: string;
}

export interface ProvisionedAcademy {
  /** The academy's director, as whom its files are imported. */
  director: Viewer;
  /** Made now; empty where the academy was there before. */
  signIns: SignIn[];
  athletesAdded: number;
}

const RULE_VERSION = '1';
const BATTERY = 'Term battery';
const STAFF = [
  { role: 'director', givenName: 'Academy', familyName: 'Director' },
  { role: 'strength_coach', givenName: 'Strength', familyName: 'Coach' },
  { role: 'swing_coach', givenName: 'Swing', familyName: 'Coach' },
] as const;

/**
 * Makes an academy ready for a season's files, as the owner: academy, catalogue, battery, policy, squads, terms, a
 * director and two coaches for all squads, athletes with what they play, parents' addresses uninvited. What is there
 * already is left as it is; what the list adds is added.
 *
 * @throws {AppError} conflict where an academy of this name has other athletes than the list's
 */
export async function provisionAcademy(input: AcademyToProvision): Promise<ProvisionedAcademy> {
  const signIns = await newSignIns(input.name);
  const hashes = await Promise.all(signIns.map(({ password }) => input.hashPassword(password)));
  return ownerDb()
    .transaction()
    .execute(async (trx) => {
      const known = await findAcademyByName(trx, input.name);
      const academyId = known?.id ?? (await insertAcademy(trx, input.name));
      if (!known) {
        const keys = input.batteryKeys.length > 0 ? input.batteryKeys : CATALOGUE.map(({ key }) => key);
        await insertProgramme(trx, academyId, {
          tests: CATALOGUE.map(testRow),
          battery: BATTERY,
          batteryKeys: keys,
          policy: { rule_version: RULE_VERSION, thresholds: JSON.stringify(DEFAULT_POLICY) },
        });
        for (const [i, { role, givenName, familyName }] of STAFF.entries()) {
          const { userName } = signIns[i]!;
          await insertMember(trx, academyId, { role, givenName, familyName, userName, passwordHash: hashes[i]! });
        }
      }
      const squads = await addSquads(trx, academyId, [...new Set(input.athletes.map(({ squad }) => squad))]);
      const coaches = await listCoaches(trx, academyId);
      await addSquadCoaches(
        trx,
        academyId,
        [...squads.values()],
        coaches.map(({ personId }) => personId),
      );
      if (!(await hasTerms(trx, academyId))) await addTerms(trx, academyId, termsOf(input.dates));
      const there = new Set((await listAthleteNames(trx, academyId)).map(athleteKey));
      const missing = input.athletes.filter((athlete) => !there.has(athleteKey(athlete)));
      if (there.size > 0 && missing.length === input.athletes.length) {
        throw new AppError('conflict', `An academy called “${input.name}” is here already, with other athletes`);
      }
      await insertAthletes(
        trx,
        academyId,
        missing.map((athlete) => ({ ...athlete, squadId: squads.get(athlete.squad)! })),
      );
      const director = await findDirector(trx, academyId);
      if (!director) throw new AppError('conflict', `The academy “${input.name}” has no director`);
      return {
        director: {
          personId: director.personId,
          membershipId: director.membershipId,
          ...{ academyId, role: 'director' as const, sessionId: '', memberships: [] },
          name: `${director.givenName} ${director.familyName}`,
          academyName: input.name,
          timeZone: known?.time_zone ?? 'Europe/London',
          safeguarding: known?.safeguarding_contact ?? '',
        },
        signIns: known ? [] : signIns,
        athletesAdded: missing.length,
      };
    });
}

const athleteKey = ({
  givenName,
  familyName,
  birthDate,
}: Pick<ProvisionedAthlete, 'givenName' | 'familyName' | 'birthDate'>) =>
  `${wordsOf(plainLetters(`${givenName} ${familyName}`)).join(' ')} ${birthDate}`;

/** User names that nobody has yet, and passwords that nobody chose. */
async function newSignIns(academyName: string): Promise<SignIn[]> {
  const stem = wordsOf(academyName).join('-').slice(0, 22).replace(/-+$/, '') || 'academy';
  for (let round = 1; ; round += 1) {
    const names = STAFF.map(({ role }) => `${stem}${round === 1 ? '' : `-${round}`}.${role.split('_')[0]!}`);
    if ((await listTakenUserNames(ownerDb(), names)).length > 0) continue;
    return STAFF.map(({ role }, i) => ({ role, userName: names[i]!, password: newPassword() }));
  }
}

const newPassword = (): string => randomBytes(15).toString('base64url').match(/.{5}/g)!.join('-');
