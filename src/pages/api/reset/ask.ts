import { clientAddress, consumeReset } from '#src/auth/limits.ts';
import { sendReset } from '#src/auth/resetPassword.ts';
import { reportError } from '#src/errors/reportError.ts';
import { handlePublic } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { askReset } from '#src/schemas/people.ts';

/** Answers before it looks: neither the answer nor its time tells whether the address is anyone's. */
export const POST = handlePublic(async (context) => {
  const { input, done } = await readInput(context, askReset);
  await consumeReset(input.email, clientAddress(context.request));
  setImmediate(() => {
    sendReset(input.email).catch((error: unknown) => reportError(error, '/api/reset/ask'));
  });
  return done({ asked: true }, '/reset?done=asked');
});
