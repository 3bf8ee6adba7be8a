import { handle } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { term } from '#src/schemas/people.ts';
import { addTerm } from '#src/services/programme/manageTerms.ts';

export const POST = handle(async (viewer, context) => {
  const { input, done } = await readInput(context, term);
  return done(await addTerm(viewer, input), '/programme/terms?done=saved');
});
