import { createHash } from 'node:crypto';
import type { SeededAcademy } from '#db/seed/academy.ts';
import { trueBody } from '#db/seed/body.ts';
import { generateShots } from '#db/seed/drives.ts';
import type { SeededPeople } from '#db/seed/people.ts';
import type { Random } from '#db/seed/random.ts';
import { inSlices, type SeedDb } from '#db/seed/seedDb.ts';
import { generateSwing, SWING_EVENTS, SWING_RATE_HZ } from '#db/seed/swings.ts';
import { nameOf, presentIn } from '#db/seed/testingDay.ts';
import { TERMS, type Truth } from '#db/seed/truth.ts';
import { airDensity } from '#src/domain/driver/airDensity.ts';
import { carryStandard } from '#src/domain/driver/carryStandard.ts';
import { shotExclusion } from '#src/domain/driver/shotExclusion.ts';
import { groundTrace } from '#src/domain/ground/groundTrace.ts';

const TERMS_WITH_PLATES = 3;
const SWINGS = 5;

/** The driver session of a term: shots with their conditions, and ground traces in the terms that have plates. */
export async function seedDriverSession(
  db: SeedDb,
  random: Random,
  academy: SeededAcademy,
  { ids }: SeededPeople,
  term: number,
): Promise<string[]> {
  const { droveOn, temperatureC, pressurePa, windMps, place } = TERMS[term]!;
  const own = { academy_id: academy.academyId };
  const sessionId = random.uuid();
  await db
    .insertInto('driver_session')
    .values({
      ...{ ...own, id: sessionId, held_on: droveOn, place, temperature_c: temperatureC, pressure_pa: pressurePa },
      ...{ wind_mps: windMps, surface: 'mat', ball: 'premium ball', recorded_by: ids['swing'] },
    })
    .execute();
  const present = presentIn(term);
  const idOf = (truth: Truth) => academy.athletes.get(nameOf(truth))!;
  await db
    .insertInto('driver_session_athlete')
    .values(present.map((truth) => ({ ...own, driver_session_id: sessionId, athlete_id: idOf(truth) })))
    .execute();
  const shots = present.flatMap((truth) =>
    shotRows(truth, term, random).map((row) => ({
      ...{ ...own, id: random.uuid(), driver_session_id: sessionId, athlete_id: idOf(truth) },
      ...row,
    })),
  );
  await inSlices(shots, (slice) => db.insertInto('shot').values(slice).execute());
  if (term >= TERMS.length - TERMS_WITH_PLATES) {
    for (const truth of present)
      await seedTraces(db, random, academy, { truth, term, sessionId, recordedBy: ids['swing']! });
  }
  return present.map(idOf);
}

function shotRows(truth: Truth, term: number, random: Random) {
  const { temperatureC, pressurePa, windMps } = TERMS[term]!;
  const shots = generateShots(truth, term, random);
  const standard = carryStandard({
    shots: shots.map(({ ballSpeedMps, launchDeg, spinRpm, carryM }) => ({
      ...{ ballSpeed: ballSpeedMps, launchDeg, spinRpm, carry: carryM },
    })),
    conditions: { temperatureC, pressurePa, wind: windMps },
  });
  const drives = shots.filter(({ club }) => club === 'driver');
  const { density } = airDensity({ temperatureC, pressurePa });
  const verdicts = shotExclusion({
    shots: drives.map(({ ballSpeedMps, clubSpeedMps, launchDeg, spinRpm, carryM }) => ({
      ...{ ballSpeed: ballSpeedMps, clubSpeed: clubSpeedMps, launchDeg, spinRpm, carry: carryM },
    })),
    density,
    wind: windMps,
  }).shots;
  return shots.map((shot, i) => {
    const verdict = shot.club === 'driver' ? verdicts[drives.indexOf(shot)] : null;
    return {
      ...{ shot_no: i + 1, club: shot.club, club_label: shot.clubLabel, club_speed_mps: shot.clubSpeedMps },
      ...{ ball_speed_mps: shot.ballSpeedMps, launch_deg: shot.launchDeg, spin_rpm: shot.spinRpm },
      ...{ attack_deg: shot.attackDeg, carry_m: shot.carryM, offline_m: shot.offlineM },
      carry_standard_m: standard.shots[i]!.carryStandard,
      state: verdict ? 'excluded' : 'counted',
      exclusion_rule: verdict?.rule ?? null,
      exclusion_reason: verdict?.reason ?? null,
    };
  });
}

async function seedTraces(
  db: SeedDb,
  random: Random,
  { academyId, athletes, rigId }: SeededAcademy,
  { truth, term, sessionId, recordedBy }: { truth: Truth; term: number; sessionId: string; recordedBy: string },
): Promise<void> {
  const athleteId = athletes.get(nameOf(truth))!;
  const { massKg } = trueBody(truth, TERMS[term]!.droveOn);
  const events = { ...SWING_EVENTS };
  for (let swingNo = 1; swingNo <= SWINGS; swingNo += 1) {
    const { left, right } = generateSwing(truth, term, random);
    const asLead = (lead: number[], trail: number[]) =>
      groundTrace({ sampleRate: SWING_RATE_HZ, lead, trail, mass: massKg, events });
    const id = random.uuid();
    const channels = { left: floats(left), right: floats(right) };
    await db
      .insertInto('ground_trace')
      .values({
        ...{ academy_id: academyId, id, athlete_id: athleteId, driver_session_id: sessionId, device_id: rigId },
        ...{ recorded_on: TERMS[term]!.droveOn, swing_no: swingNo, measure: 'force', sample_rate_hz: SWING_RATE_HZ },
        events: JSON.stringify(events),
        figures: JSON.stringify({ left: asLead(left, right), right: asLead(right, left) }),
        source_hash: createHash('sha256').update(channels.left).update(channels.right).digest(),
        recorded_by: recordedBy,
      })
      .execute();
    await db
      .insertInto('ground_channel')
      .values(
        (['left', 'right'] as const).map((side) => ({
          ...{ academy_id: academyId, athlete_id: athleteId, ground_trace_id: id, side, samples: channels[side] },
        })),
      )
      .execute();
  }
}

/** Samples as little-endian 32-bit floats. */
function floats(values: readonly number[]): Buffer {
  const bytes = Buffer.alloc(values.length * 4);
  values.forEach((value, i) => bytes.writeFloatLE(value, i * 4));
  return bytes;
}
