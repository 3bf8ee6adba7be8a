import { sql, type ExpressionBuilder } from 'kysely';
import type { DB } from '#src/db/types.ts';

/** The newest handedness of the athlete of a row, for a lateral join; `plays` of nobody written down is right. */
export const newestHand = (eb: ExpressionBuilder<DB, 'athlete'>) =>
  eb
    .selectFrom('handedness')
    .select('handedness.plays')
    .whereRef('handedness.athlete_id', '=', 'athlete.id')
    .orderBy('handedness.recorded_at', 'desc')
    .limit(1)
    .as('hand');

/** What the athlete of a row plays. */
export const plays = sql<'left' | 'right'>`coalesce(hand.plays, 'right')`.as('plays');
