import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { correctHandedness as schema } from '#src/schemas/settle.ts';
import { correctHandedness } from '#src/services/settling/changeAthlete.ts';

export const POST = handle(async (viewer, context) => {
  const athleteId = uuidParam(context, 'id');
  const { input, done } = await readInput(context, schema);
  await correctHandedness(viewer, athleteId, input);
  return done({ plays: input.plays }, `/athletes/${athleteId}`);
});
