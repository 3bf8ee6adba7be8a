import type { SeededAcademy } from '#db/seed/academy.ts';
import type { SeededPeople } from '#db/seed/people.ts';
import type { SeedDb } from '#db/seed/seedDb.ts';

type State = 'discussed' | 'in hand' | 'cleared' | 'set aside';

interface Decision {
  athlete: string;
  /** After the driver session of this term, counted from 0. */
  afterTerm: number;
  on: string;
  state: State;
  route?: 'build' | 'hold' | 'club set-up' | 'ask a clinician';
  lookAgainOn?: string;
  reason?: string;
  notes: readonly { by: 'strength' | 'swing'; on: string; body: string }[];
}

/** What the two coaches agreed in the demo, so that an outrun stands in each of its states. */
const DECISIONS: readonly Decision[] = [
  {
    athlete: 'Linnea Okonjo',
    ...{ afterTerm: 6, on: '2026-11-24', state: 'in hand', route: 'build', lookAgainOn: '2027-01-09' },
    notes: [
      {
        by: 'swing',
        on: '2026-11-20',
        body: 'She found the extra carry by herself this summer. I am happy to leave the move alone and keep driver balls under forty a week.',
      },
      { by: 'strength', on: '2026-11-23', body: 'Agreed. Six weeks, lead leg first, then a retest with the squad.' },
    ],
  },
  {
    athlete: 'Emeka Achterberg',
    ...{ afterTerm: 6, on: '2026-11-25', state: 'discussed' },
    notes: [
      {
        by: 'strength',
        on: '2026-11-21',
        body: 'The lead leg has not gained in three terms. He grew a lot; I would like one more push test before we choose.',
      },
      { by: 'swing', on: '2026-11-25', body: 'No new speed work until then. He is not sore anywhere.' },
    ],
  },
  {
    athlete: 'Jonas Petrosyan',
    ...{ afterTerm: 6, on: '2026-11-26', state: 'set aside' },
    reason:
      'New driver with more loft since October; the carry came with the club. Judge again from the next session with it.',
    notes: [
      {
        by: 'swing',
        on: '2026-11-22',
        body: 'He was fitted in October: more loft, same shaft. Most of the gain is there.',
      },
      { by: 'strength', on: '2026-11-25', body: 'Fine with me. The lead side stays in his block anyway.' },
    ],
  },
  {
    athlete: 'Aroha Tamatea',
    ...{ afterTerm: 6, on: '2026-11-27', state: 'cleared' },
    reason: 'Two testing days running without a level; the lead leg is level with the trail again.',
    notes: [
      {
        by: 'strength',
        on: '2026-03-14',
        body: 'Eight weeks of landing and lead-leg work planned, driver balls held at thirty.',
      },
      { by: 'swing', on: '2026-11-27', body: 'Carry has settled and she moves well. I would clear it.' },
    ],
  },
];

/** Applies the decisions that fall after a term's driver session. Unknown outruns are an error: the demo shows them all. */
export async function seedDecisions(
  db: SeedDb,
  { academyId, athletes }: SeededAcademy,
  { ids }: SeededPeople,
  term: number,
): Promise<void> {
  for (const decision of DECISIONS.filter(({ afterTerm }) => afterTerm === term)) {
    const athleteId = athletes.get(decision.athlete)!;
    const { id } = await db
      .selectFrom('outrun')
      .select('id')
      .where('athlete_id', '=', athleteId)
      .where('state', '=', 'raised')
      .executeTakeFirstOrThrow(() => new Error(`The demo expects an open outrun of ${decision.athlete}`));
    const about = { academy_id: academyId, athlete_id: athleteId, outrun_id: id };
    const notes = decision.notes.map(({ by, on, body }) => ({
      ...about,
      author_id: ids[by]!,
      body,
      made_at: `${on}T17:00:00Z`,
    }));
    await db.insertInto('outrun_note').values(notes).execute();
    const last = decision.notes.at(-1)!;
    const event = (kind: string, on: string, text = '') => ({
      ...{ ...about, kind, happened_on: on, text, actor_id: ids[last.by]!, made_at: `${on}T18:00:00Z` },
    });
    const events = [event('discussed', last.on)];
    if (decision.state === 'in hand') events.push(event('route', decision.on, decision.route));
    if (decision.state === 'cleared' || decision.state === 'set aside')
      events.push(event(decision.state, decision.on, decision.reason));
    await db.insertInto('outrun_event').values(events).execute();
    const ended = decision.state === 'cleared' || decision.state === 'set aside';
    await db
      .updateTable('outrun')
      .set({
        state: decision.state,
        route: decision.route ?? null,
        look_again_on: decision.lookAgainOn ?? null,
        ...(ended ? { closed_on: decision.on, close_reason: decision.reason } : {}),
      })
      .where('id', '=', id)
      .execute();
  }
}
