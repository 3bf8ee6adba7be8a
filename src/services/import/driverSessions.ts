import { noConditions, type SessionConditions } from '#src/services/import/readConditions.ts';
import type { ShotReading } from '#src/services/import/readDriver.ts';
import type { Read } from '#src/services/import/readSeason.ts';

/** The shots of one session, numbered, with its conditions. */
export interface SessionRead {
  conditions: SessionConditions;
  shots: { read: Read<ShotReading>; shotNo: number }[];
}

/**
 * Gathers the shots of a date into sessions by place, and numbers them. The file's own numbers stay unless one athlete
 * has two different shots of one number (files that each begin with 1): then the order counts.
 */
export function driverSessions(
  heldOn: string,
  shots: readonly Read<ShotReading>[],
  conditions: readonly SessionConditions[],
): SessionRead[] {
  const known = conditions.filter((one) => one.heldOn === heldOn);
  const places = [...new Set(shots.map(({ value }) => value.place))];
  return places.map((place) => {
    const own = shots.filter(({ value }) => value.place === place);
    const found = known.find((one) => same(one.place, place)) ?? known[0] ?? noConditions(heldOn);
    const athletes = [...new Set(own.map(({ value }) => value.athleteId))];
    return {
      conditions: { ...found, place: place === '' ? found.place : place },
      shots: athletes.flatMap((id) => numbered(own.filter(({ value }) => value.athleteId === id))),
    };
  });
}

const same = (a: string, b: string): boolean => a.trim().toLowerCase() === b.trim().toLowerCase();

function numbered(shots: readonly Read<ShotReading>[]): SessionRead['shots'] {
  const first = new Map<string, Read<ShotReading>>();
  for (const read of shots) if (!first.has(contentOf(read.value))) first.set(contentOf(read.value), read);
  const different = [...first.values()];
  const numbers = different.map(({ value }) => value.shotNo);
  const own = numbers.every((number) => number !== null) && new Set(numbers).size === numbers.length;
  return shots.map((read) => {
    const original = first.get(contentOf(read.value))!;
    const shotNo = own ? original.value.shotNo! : different.indexOf(original) + 1;
    return { read, shotNo };
  });
}

/** Two rows with the same number and the same readings are one shot, written twice. */
const contentOf = (shot: ShotReading): string =>
  JSON.stringify([
    shot.shotNo,
    shot.clubLabel,
    shot.carryM,
    shot.ballSpeedMps,
    shot.clubSpeedMps,
    shot.launchDeg,
    shot.spinRpm,
  ]);
