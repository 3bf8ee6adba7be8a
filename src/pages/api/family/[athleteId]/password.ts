import { setChildPassword } from '#src/auth/childSignIn.ts';
import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { childPassword } from '#src/schemas/people.ts';

export const POST = handle(async (viewer, context) => {
  const athleteId = uuidParam(context, 'athleteId');
  const { input, done } = await readInput(context, childPassword);
  await setChildPassword(viewer, athleteId, input.password);
  return done({ set: true }, `/family/${athleteId}?done=password`);
});
