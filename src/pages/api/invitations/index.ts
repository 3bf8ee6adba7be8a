import { handle } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { invitation } from '#src/schemas/people.ts';
import { invite } from '#src/services/people/invite.ts';

export const POST = handle(async (viewer, context) => {
  const { input, done } = await readInput(context, invitation);
  return done(await invite(viewer, input), '/programme/people?done=invited');
});
