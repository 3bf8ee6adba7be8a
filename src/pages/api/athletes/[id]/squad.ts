import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { moveAthlete as schema } from '#src/schemas/people.ts';
import { moveAthlete } from '#src/services/programme/manageSquads.ts';

export const POST = handle(async (viewer, context) => {
  const id = uuidParam(context, 'id');
  const { input, done } = await readInput(context, schema);
  await moveAthlete(viewer, id, input.squadId);
  return done({ squadId: input.squadId }, '/programme/squads?done=moved');
});
