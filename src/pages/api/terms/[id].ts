import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { term } from '#src/schemas/people.ts';
import { changeTerm } from '#src/services/programme/manageTerms.ts';

export const POST = handle(async (viewer, context) => {
  const id = uuidParam(context, 'id');
  const { input, done } = await readInput(context, term);
  await changeTerm(viewer, id, input);
  return done({ id }, '/programme/terms?done=saved');
});
