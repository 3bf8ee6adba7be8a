import { dayNumber } from '#src/domain/calendar/dayNumber.ts';
import type { Season, SeasonOutrun, SeasonPoint } from '#src/ui/chart/season/season.ts';

interface Interval {
  interval: readonly [number, number] | null;
}

interface SeasonFigures {
  terms: readonly { name: string; startsOn: string; endsOn: string }[];
  carry: readonly ({ heldOn: string; carryM: number } & Interval)[];
  strength: readonly { on: string; lead: number; trail: number; leadHalf: number | null; trailHalf: number | null }[];
  velocity: readonly { on: string; perYear: number | null; interval90: readonly [number, number] | null }[];
}

interface OutrunEvent {
  outrunId: string;
  kind: string;
  on: string;
  level: string | null;
}

/** The record's figures as the Season line draws them; `events` is left out for families, and with it the lane. */
export function seasonOf({ terms, carry, strength, velocity }: SeasonFigures, events?: readonly OutrunEvent[]): Season {
  const around = (value: number, half: number | null): [number, number] | null =>
    half === null ? null : [value - half, value + half];
  const leg = (side: 'lead' | 'trail'): SeasonPoint[] =>
    strength.map((point) => ({
      on: point.on,
      value: point[side],
      interval: around(point[side], side === 'lead' ? point.leadHalf : point.trailHalf),
    }));
  return {
    terms,
    carry: carry.map(({ heldOn, carryM, interval }) => ({ on: heldOn, value: carryM, interval })),
    strength:
      strength.length === 0
        ? null
        : { name: 'Push, one leg', unit: 'N/kg', digits: 1, lead: leg('lead'), trail: leg('trail') },
    growth: velocity.flatMap(({ on, perYear, interval90 }) =>
      perYear === null ? [] : [{ on, value: perYear, interval: interval90 }],
    ),
    ...(events ? { outruns: lanes(events) } : {}),
  };
}

const DRAWN = new Set(['raised', 'level up', 'level down', 'cleared', 'set aside']);

function lanes(events: readonly OutrunEvent[]): SeasonOutrun[] {
  const ids = [...new Set(events.map(({ outrunId }) => outrunId))];
  return ids.map((id) => ({
    steps: settled(events.filter(({ outrunId, kind }) => outrunId === id && DRAWN.has(kind))).map(
      ({ on, kind, level }) => {
        const ended = kind === 'cleared' || kind === 'set aside';
        return ended
          ? { on, level: null, word: kind === 'cleared' ? 'Cleared' : 'Set aside' }
          : { on, level: level === 'act' ? ('act' as const) : ('look' as const) };
      },
    ),
  }));
}

const SETTLES_WITHIN_DAYS = 14;

/**
 * Tests and driving of one term come days apart, and the level may move between them: the line shows what it settled
 * at, and a level that only came back as it was is not drawn again.
 */
function settled(events: readonly OutrunEvent[]): OutrunEvent[] {
  const kept = events.filter((event, i) => {
    const next = events[i + 1];
    return !next || next.level === null || dayNumber(next.on) - dayNumber(event.on) > SETTLES_WITHIN_DAYS;
  });
  return kept.filter((event, i) => i === 0 || event.level === null || event.level !== kept[i - 1]!.level);
}
