import { handle } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { newAthlete } from '#src/schemas/people.ts';
import { addAthlete } from '#src/services/programme/manageSquads.ts';

export const POST = handle(async (viewer, context) => {
  const { input, done } = await readInput(context, newAthlete);
  return done(await addAthlete(viewer, input), '/programme/squads?done=athlete');
});
