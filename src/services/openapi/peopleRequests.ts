import type { DescribedRequest } from '#src/services/openapi/requests.ts';
import * as people from '#src/schemas/people.ts';
import { nothing } from '#src/schemas/settle.ts';

const form = (summary: string, body: DescribedRequest['body'], answer = 'What was kept'): DescribedRequest => ({
  ...{ summary, body, answer, form: true },
});

/** Routes of people, squads, terms and passwords. */
export const PEOPLE_REQUESTS: Readonly<Record<string, DescribedRequest>> = {
  'POST /api/invitations': form('Invite someone to a role', people.invitation),
  'POST /api/invitations/[id]/revoke': form('Take an invitation back', nothing),
  'POST /api/invite/accept': form(
    'Accept an invitation by its token',
    people.acceptInvitation,
    'The way on, signed in',
  ),
  'POST /api/reset/ask': form('Ask for a link to set a new password', people.askReset, 'The same for every address'),
  'POST /api/reset/set': form('Set a new password by a token', people.setReset, 'The way to sign in'),
  'POST /api/account/password': form('Change one’s own password', people.changePassword),
  'POST /api/family/[athleteId]/sign-in': form('Make a user name for a child', people.childSignIn),
  'POST /api/family/[athleteId]/password': form('Set the password of a child’s user name', people.childPassword),
  'POST /api/squads': form('Make a squad', people.newSquad),
  'POST /api/squads/[id]/name': form('Rename a squad', people.newSquad),
  'POST /api/squads/[id]/coaches': form('Set the coaches of a squad', people.squadCoaches),
  'POST /api/athletes': form('Add an athlete', people.newAthlete),
  'POST /api/athletes/[id]/squad': form('Move an athlete to another squad', people.moveAthlete),
  'POST /api/terms': form('Make a term', people.term),
  'POST /api/terms/[id]': form('Change a term', people.term),
};
