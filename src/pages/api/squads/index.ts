import { handle } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { newSquad } from '#src/schemas/people.ts';
import { addSquad } from '#src/services/programme/manageSquads.ts';

export const POST = handle(async (viewer, context) => {
  const { input, done } = await readInput(context, newSquad);
  return done(await addSquad(viewer, input.name), '/programme/squads?done=squad');
});
