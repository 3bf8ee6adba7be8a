import { handle, uuidParam } from '#src/http/handle.ts';
import { readInput } from '#src/http/readInput.ts';
import { nothing } from '#src/schemas/settle.ts';
import { revokeInvitation } from '#src/services/people/invite.ts';

export const POST = handle(async (viewer, context) => {
  const id = uuidParam(context, 'id');
  const { done } = await readInput(context, nothing);
  await revokeInvitation(viewer, id);
  return done({ revoked: true }, '/programme/people?done=revoked');
});
