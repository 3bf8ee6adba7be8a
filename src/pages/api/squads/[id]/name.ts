import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { newSquad } from '#src/schemas/people.ts';
import { renameSquad } from '#src/services/programme/manageSquads.ts';

export const POST = handle(async (viewer, context) => {
  const id = uuidParam(context, 'id');
  const { input, done } = await readInput(context, newSquad);
  await renameSquad(viewer, id, input.name);
  return done({ name: input.name }, '/programme/squads?done=saved');
});
