import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { nothing } from '#src/schemas/settle.ts';
import { clearRestriction } from '#src/services/settling/changeAthlete.ts';

export const POST = handle(async (viewer, context) => {
  const { done } = await readInput(context, nothing);
  const cleared = await clearRestriction(viewer, uuidParam(context, 'id'));
  return done(cleared, `/athletes/${cleared.athleteId}`);
});
