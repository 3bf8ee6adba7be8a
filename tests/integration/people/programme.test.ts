import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ROLES, type Viewer } from '#src/access/viewer.ts';
import { asViewer } from '#src/db/client.ts';
import { listOwnAthletes } from '#src/db/queries/athletes.ts';
import { newAthlete, term as termSchema } from '#src/schemas/people.ts';
import * as squads from '#src/services/programme/manageSquads.ts';
import { addTerm, changeTerm, listTerms } from '#src/services/programme/manageTerms.ts';
import { useTestDatabase } from '#tests/config/testDatabase.ts';
import { TestAcademy } from '#tests/integration/judging/academy.ts';

const database = useTestDatabase();
let academy: TestAcademy;
let other: TestAcademy;
let director: Viewer;
let coach: Viewer;

beforeAll(async () => {
  academy = await TestAcademy.make(database().superuserUrl);
  other = await TestAcademy.make(database().superuserUrl);
  director = await academy.staff('director');
  coach = await academy.staff('swing_coach', 'first');
});
afterAll(() => Promise.all([academy.end(), other.end()]));

const birth = { day: '27', month: '3', year: '2013' };
const athleteIn = (squadId: string, more: Record<string, unknown> = {}) =>
  newAthlete.parse({
    ...{ givenName: 'Ines', familyName: 'Marr', sex: 'female', plays: 'left', squadId, ...birth, ...more },
  });
const seenBy = async (viewer: Viewer) => (await asViewer(viewer, listOwnAthletes)).map(({ id }) => id);

describe('squads', () => {
  it('are made and renamed, each name once', async () => {
    const { id } = await squads.addSquad(director, 'Whimbrel');
    await squads.renameSquad(director, id, 'Godwit');
    expect((await squads.listSquadsToManage(director)).squads.map(({ name }) => name)).toContain('Godwit');
    await expect(squads.addSquad(director, 'Godwit')).rejects.toMatchObject({ code: 'invalid' });
    await expect(squads.renameSquad(director, academy.squads.first, 'Godwit')).rejects.toMatchObject({
      code: 'invalid',
    });
  });

  it('are seen by their coaches from the next page on, and no more by who coaches them no longer', async () => {
    const { id } = await squads.addAthlete(director, athleteIn(academy.squads.second));
    expect(await seenBy(coach)).not.toContain(id);
    await squads.setSquadCoaches(director, academy.squads.second, [coach.personId]);
    expect(await seenBy(coach)).toContain(id);
    await squads.setSquadCoaches(director, academy.squads.second, []);
    expect(await seenBy(coach)).not.toContain(id);
    await squads.moveAthlete(director, id, academy.squads.first);
    expect(await seenBy(coach)).toContain(id);
  });

  it('add an athlete with the birth date and what they play', async () => {
    const { id } = await squads.addAthlete(director, athleteIn(academy.squads.first));
    const found = (await asViewer(director, listOwnAthletes)).find((athlete) => athlete.id === id);
    expect(found).toMatchObject({ givenName: 'Ines', birthDate: '2013-03-27', plays: 'left', sex: 'female' });
    await expect(async () =>
      squads.addAthlete(director, athleteIn(academy.squads.first, { year: '2099' })),
    ).rejects.toMatchObject({ code: 'invalid' });
  });

  it.each([{ day: '31', month: '4' }, { day: '29', month: '2', year: '2013' }, { month: '13' }, { day: 'x' }])(
    'take no birth date that the calendar does not have: %j',
    (parts) => {
      expect(() => athleteIn(academy.squads.first, parts)).toThrow();
    },
  );

  it('of another academy do not exist', async () => {
    const foreign = await other.athlete();
    const foreignCoach = await other.staff('swing_coach', 'first');
    const { first } = academy.squads;
    const own = await academy.athlete();
    const attempts = [
      () => squads.renameSquad(director, other.squads.first, 'Mine'),
      () => squads.setSquadCoaches(director, other.squads.first, []),
      () => squads.setSquadCoaches(director, first, [foreignCoach.personId]),
      () => squads.moveAthlete(director, foreign, first),
      () => squads.moveAthlete(director, own, other.squads.first),
      () => squads.addAthlete(director, athleteIn(other.squads.first)),
    ];
    for (const attempt of attempts) await expect(attempt()).rejects.toMatchObject({ code: 'not-found' });
  });
});

describe('terms', () => {
  const term = (startsOn: string, endsOn: string) => termSchema.parse({ name: 'A term', startsOn, endsOn });

  it('are added and changed, and never overlap', async () => {
    const { id } = await addTerm(director, term('2026-01-05', '2026-03-27'));
    await addTerm(director, term('2026-03-28', '2026-07-17'));
    await expect(addTerm(director, term('2026-07-17', '2026-08-01'))).rejects.toMatchObject({ code: 'invalid' });
    await changeTerm(director, id, term('2026-01-12', '2026-03-20'));
    expect((await listTerms(director)).map(({ startsOn, endsOn }) => [startsOn, endsOn])).toEqual([
      ['2026-03-28', '2026-07-17'],
      ['2026-01-12', '2026-03-20'],
    ]);
    await expect(changeTerm(director, id, term('2026-01-12', '2026-03-28'))).rejects.toMatchObject({ code: 'invalid' });
  });

  it('end after they begin, on days that there are', () => {
    expect(() => term('2026-03-02', '2026-03-01')).toThrow();
    expect(() => term('2026-02-30', '2026-03-01')).toThrow();
  });
});

it('is all the director’s alone', async () => {
  for (const role of ROLES.filter((each) => each !== 'director')) {
    const viewer = { ...director, role };
    const { first } = academy.squads;
    for (const attempt of [
      () => squads.listSquadsToManage(viewer),
      () => squads.setSquadCoaches(viewer, first, []),
      () => squads.addAthlete(viewer, athleteIn(first)),
      () => squads.moveAthlete(viewer, first, first),
      () => listTerms(viewer),
      () => squads.addSquad(viewer, 'Mine'),
      () => squads.renameSquad(viewer, first, 'Mine'),
    ]) {
      await expect(async () => attempt(), role).rejects.toMatchObject({ code: 'forbidden' });
    }
  }
});
