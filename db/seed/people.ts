import { hashPassword } from '#src/auth/password.ts';
import type { Role } from '#src/access/viewer.ts';
import type { Random } from '#db/seed/random.ts';
import type { SeedDb } from '#db/seed/seedDb.ts';

/** The demo's password, the same for all: it is public, and the accounts exist only in the demo. */
const DEMO_PASSWORD = 'marram holds the dune';

interface DemoPerson {
  key: string;
  role: Role;
  givenName: string;
  familyName: string;
  email: string;
  /** Squads coached. */
  squads?: readonly string[];
  /** Children, by full name; or for an athlete's own account the athlete. */
  athletes?: readonly string[];
}

export const PEOPLE: readonly DemoPerson[] = [
  {
    key: 'director',
    role: 'director',
    givenName: 'Isolde',
    familyName: 'Marchetti',
    email: 'director@saltmarsh.example',
  },
  {
    ...{ key: 'strength', role: 'strength_coach', givenName: 'Tendai', familyName: 'Reyes-Lund' },
    ...{ email: 'strength@saltmarsh.example', squads: ['Curlew', 'Dunlin'] },
  },
  {
    ...{ key: 'swing', role: 'swing_coach', givenName: 'Mirren', familyName: 'Aldous' },
    ...{ email: 'swing@saltmarsh.example', squads: ['Curlew', 'Dunlin'] },
  },
  {
    ...{ key: 'swingDunlin', role: 'swing_coach', givenName: 'Oriol', familyName: 'Vance' },
    ...{ email: 'swing.dunlin@saltmarsh.example', squads: ['Dunlin'] },
  },
  {
    ...{ key: 'parent', role: 'guardian', givenName: 'Adaeze', familyName: 'Okonjo' },
    ...{ email: 'parent@saltmarsh.example', athletes: ['Linnea Okonjo', 'Teodor Okonjo'] },
  },
  {
    ...{ key: 'otherParent', role: 'guardian', givenName: 'Signe', familyName: 'Lindahl' },
    ...{ email: 'parent.lindahl@saltmarsh.example', athletes: ['Saoirse Lindahl'] },
  },
  {
    ...{ key: 'athlete', role: 'athlete', givenName: 'Linnea', familyName: 'Okonjo' },
    ...{ email: 'athlete@saltmarsh.example', athletes: ['Linnea Okonjo'] },
  },
];

export interface SeededPeople {
  ids: Readonly<Record<string, string>>;
  memberships: Readonly<Record<string, string>>;
  accounts: { role: Role; email: string; password: string }[];
}

/** People with their sign-in, memberships, squads and children. */
export async function seedPeople(
  db: SeedDb,
  random: Random,
  { academyId, squads, athletes }: { academyId: string; squads: Map<string, string>; athletes: Map<string, string> },
): Promise<SeededPeople> {
  const ids: Record<string, string> = {};
  const memberships: Record<string, string> = {};
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  for (const person of PEOPLE) {
    const id = random.uuid();
    const membership = random.uuid();
    ids[person.key] = id;
    memberships[person.key] = membership;
    await db
      .insertInto('person')
      .values({ id, given_name: person.givenName, family_name: person.familyName })
      .execute();
    await db.insertInto('person_contact').values({ person_id: id, email: person.email }).execute();
    await db.insertInto('credential').values({ person_id: id, password_hash: passwordHash }).execute();
    await db
      .insertInto('membership')
      .values({ id: membership, academy_id: academyId, person_id: id, role: person.role })
      .execute();
    for (const squad of person.squads ?? []) {
      const squadId = squads.get(squad)!;
      await db.insertInto('squad_coach').values({ academy_id: academyId, squad_id: squadId, person_id: id }).execute();
    }
    for (const name of person.athletes ?? []) {
      const athleteId = athletes.get(name)!;
      if (person.role === 'athlete') {
        await db.updateTable('athlete').set({ person_id: id }).where('id', '=', athleteId).execute();
      } else {
        await db
          .insertInto('guardianship')
          .values({ academy_id: academyId, athlete_id: athleteId, person_id: id })
          .execute();
      }
    }
  }
  const accounts = PEOPLE.map(({ role, email }) => ({ role, email, password: DEMO_PASSWORD }));
  return { ids, memberships, accounts };
}
