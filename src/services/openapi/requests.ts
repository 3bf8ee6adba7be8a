import type { z } from 'zod';
import { actingAs } from '#src/schemas/actingAs.ts';
import { PEOPLE_REQUESTS } from '#src/services/openapi/peopleRequests.ts';
import { correctHandedness, nothing, setRestriction, settle } from '#src/schemas/settle.ts';

/** What the description says of a route beside its path. */
export interface DescribedRequest {
  summary: string;
  /** The schema that the route parses its body with. */
  body?: z.ZodType;
  /** Says what the answer holds. */
  answer: string;
  /** The body may also come as a plain form. */
  form?: boolean;
}

/** By method and pattern, as the route registry spells them; the calculators describe themselves. */
export const REQUESTS: Readonly<Record<string, DescribedRequest>> = {
  'GET /api/auth/[...auth]': {
    summary: 'The sign-in library’s own paths; none of them is open to GET',
    answer: 'Nothing',
  },
  'POST /api/auth/[...auth]': {
    summary: 'Sign in (callback/password) and sign out (signout) by a form',
    answer: 'The way on',
  },
  'POST /api/session/acting-as': {
    summary: 'Act as another of one’s own roles',
    body: actingAs,
    form: true,
    answer: 'The role',
  },
  'POST /api/trials/[id]/settle': {
    summary: 'Confirm or void an asked trial',
    body: settle,
    form: true,
    answer: 'The verdict',
  },
  'POST /api/growth-measures/[id]/settle': {
    summary: 'Confirm or void an asked height or mass',
    body: settle,
    form: true,
    answer: 'The verdict',
  },
  'POST /api/athletes/[id]/handedness': {
    summary: 'Correct which way an athlete plays',
    body: correctHandedness,
    form: true,
    answer: 'What was kept',
  },
  'POST /api/athletes/[id]/restrictions': {
    summary: 'Set what a child may and may not do',
    body: setRestriction,
    form: true,
    answer: 'What was kept',
  },
  'POST /api/restrictions/[id]/clear': {
    summary: 'Clear a restriction',
    body: nothing,
    form: true,
    answer: 'What was kept',
  },
  ...PEOPLE_REQUESTS,
  'GET /api/method': { summary: 'The calculators', answer: 'Their names, titles and addresses' },
  'GET /api/openapi.json': { summary: 'This description', answer: 'OpenAPI 3.1' },
};
