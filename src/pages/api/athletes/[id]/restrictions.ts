import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { setRestriction as schema } from '#src/schemas/settle.ts';
import { setRestriction } from '#src/services/settling/changeAthlete.ts';

export const POST = handle(async (viewer, context) => {
  const athleteId = uuidParam(context, 'id');
  const { input, done } = await readInput(context, schema);
  return done(await setRestriction(viewer, athleteId, input), `/athletes/${athleteId}`);
});
