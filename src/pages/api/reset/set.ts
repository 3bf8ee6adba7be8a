import { clientAddress, consumeLink } from '#src/auth/limits.ts';
import { resetPassword } from '#src/auth/resetPassword.ts';
import { handleLink } from '#src/http/handleLink.ts';
import { setReset } from '#src/schemas/people.ts';

export const POST = handleLink('/reset', setReset, async ({ token, password }, { request }) => {
  await consumeLink(clientAddress(request));
  await resetPassword(token, password);
  return '/sign-in?done=reset';
});
