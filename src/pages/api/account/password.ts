import { changePassword } from '#src/auth/changePassword.ts';
import { handle } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { changePassword as schema } from '#src/schemas/people.ts';

export const POST = handle(async (viewer, context) => {
  const { input, done } = await readInput(context, schema);
  await changePassword(viewer, input.present, input.password);
  return done({ changed: true }, '/account?done=password');
});
