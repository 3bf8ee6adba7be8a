import { makeChildSignIn } from '#src/auth/childSignIn.ts';
import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { childSignIn } from '#src/schemas/people.ts';

export const POST = handle(async (viewer, context) => {
  const athleteId = uuidParam(context, 'athleteId');
  const { input, done } = await readInput(context, childSignIn);
  await makeChildSignIn(viewer, athleteId, input);
  return done({ userName: input.userName }, `/family/${athleteId}?done=sign-in`);
});
