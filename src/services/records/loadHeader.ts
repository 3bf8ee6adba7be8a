import { requirePermission } from '#src/access/permissions.ts';
import { isStaff, type Viewer } from '#src/access/viewer.ts';
import type { Tx } from '#src/db/client.ts';
import { findAthlete, type AthleteRow } from '#src/db/queries/athletes.ts';
import { listGrowthMeasures } from '#src/db/queries/growthMeasures.ts';
import { notFound } from '#src/errors/appError.ts';
import { ageYears } from '#src/domain/growth/ageYears.ts';
import { leadSideOf, type Side } from '#src/services/records/compareLegs.ts';
import {
  growthWarning,
  newestVelocity,
  type GrowthRow,
  type VelocityPoint,
} from '#src/services/records/growthFigures.ts';
import { todayIn } from '#src/services/today.ts';

/** What stands above everything on a record: a restriction first, then what growth asks. */
export interface Cautions {
  restrictions: AthleteRow['restrictions'];
  growth: string | null;
}

export interface RecordHeader {
  id: string;
  givenName: string;
  name: string;
  squadId: string;
  squadName: string;
  sex: 'female' | 'male';
  birthDate: string;
  age: number;
  plays: Side;
  leadSide: Side;
  velocity: VelocityPoint | null;
  cautions: Cautions;
  outrun: OpenOutrun | null;
  marks: AthleteRow['marks'];
  terms: AthleteRow['terms'];
}

export interface OpenOutrun {
  id: string;
  level: 'look' | 'act';
  state: string;
  raisedOn: string;
  levelSince: string;
  route: string | null;
  lookAgainOn: string | null;
  mayBeCleared: boolean;
}

/**
 * Header and growth of one athlete in scope.
 *
 * @throws {AppError} forbidden, not-found
 */
export async function loadHeader(
  trx: Tx,
  viewer: Viewer,
  athleteId: string,
): Promise<{ header: RecordHeader; growth: GrowthRow[] }> {
  requirePermission(viewer, isStaff(viewer) ? 'record:see' : viewer.role === 'guardian' ? 'family:see' : 'own:see');
  const athlete = (await findAthlete(trx, athleteId)) ?? notFound('athlete');
  const growth = await listGrowthMeasures(trx, [athleteId]);
  return { header: headerOf(athlete, growth, todayIn(viewer.timeZone)), growth };
}

/** The header of a row; `growth` oldest first. */
export function headerOf(athlete: AthleteRow, growth: readonly GrowthRow[], today: string): RecordHeader {
  const { id, givenName, familyName, squadId, squadName, sex, birthDate, plays, restrictions, marks, terms } = athlete;
  return {
    id,
    givenName,
    name: `${givenName} ${familyName}`,
    squadId,
    squadName,
    sex,
    birthDate,
    age: ageYears(birthDate, today),
    plays,
    leadSide: leadSideOf(plays),
    velocity: newestVelocity(growth),
    cautions: { restrictions, growth: growthWarning(growth, sex) },
    outrun: openOutrun(athlete),
    marks,
    terms,
  };
}

/** The open outrun of a row, if its reader may see one. */
export function openOutrun(athlete: AthleteRow): OpenOutrun | null {
  const { outrunId, outrunLevel, outrunState, outrunRaisedOn, outrunLevelSince } = athlete;
  if (!outrunId || !outrunLevel || !outrunState || !outrunRaisedOn || !outrunLevelSince) return null;
  return {
    id: outrunId,
    level: outrunLevel === 'act' ? 'act' : 'look',
    state: outrunState,
    raisedOn: outrunRaisedOn,
    levelSince: outrunLevelSince,
    route: athlete.outrunRoute,
    lookAgainOn: athlete.outrunLookAgainOn,
    mayBeCleared: athlete.outrunMayBeCleared ?? false,
  };
}
