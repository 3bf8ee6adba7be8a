import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { squadCoaches } from '#src/schemas/people.ts';
import { setSquadCoaches } from '#src/services/programme/manageSquads.ts';

export const POST = handle(async (viewer, context) => {
  const id = uuidParam(context, 'id');
  const { input, done } = await readInput(context, squadCoaches);
  await setSquadCoaches(viewer, id, input.personIds);
  return done({ coaches: input.personIds.length }, '/programme/squads?done=saved');
});
