import { z } from 'zod';
import { LONGEST_PASSWORD } from '#src/domain/account/passwordProblem.ts';
import { isCalendarDate } from '#src/domain/calendar/dayNumber.ts';
import { checkAddress } from '#src/domain/mail/checkAddress.ts';

const email = z.string().trim().toLowerCase().max(200).refine(isAddress, 'An e-mail address');
const name = z.string().trim().min(1).max(80);
/** The token of a link. */
const token = z.string().regex(/^[A-Za-z0-9_-]{43}$/);
// How long it must be, and what it may not be, is asked where the person's own words are known.
const password = z.string().min(1).max(LONGEST_PASSWORD);
const ids = z.array(z.uuid()).max(200).default([]);

/** Someone to invite: staff with squads, a parent with children, an athlete with an own account. */
export const invitation = z
  .strictObject({
    email,
    role: z.enum(['director', 'strength_coach', 'swing_coach', 'guardian', 'athlete']),
    squadIds: ids,
    athleteIds: ids,
  })
  .refine(({ role, squadIds }) => squadIds.length === 0 || role === 'strength_coach' || role === 'swing_coach', {
    path: ['squadIds'],
    message: 'Only coaches have squads',
  })
  .refine(
    ({ role, athleteIds }) =>
      role === 'guardian'
        ? athleteIds.length > 0
        : role === 'athlete'
          ? athleteIds.length === 1
          : athleteIds.length === 0,
    { path: ['athleteIds'], message: 'Choose the child of a parent, or the athlete' },
  );
export type Invitation = z.infer<typeof invitation>;

/** An invitation accepted: a new person names themselves; who has a sign-in brings only the token. */
export const acceptInvitation = z.strictObject({
  token,
  givenName: name.optional(),
  familyName: name.optional(),
  password: password.optional(),
});

export const askReset = z.strictObject({ email });
export const setReset = z.strictObject({ token, password });
export const changePassword = z.strictObject({ present: password, password });

/** A child's sign-in: a user name, never an e-mail. */
export const childSignIn = z.strictObject({
  userName: z
    .string()
    .trim()
    .toLowerCase()
    .regex(/^[a-z0-9][a-z0-9._-]{2,39}$/, 'Three to forty letters, digits, dots or dashes'),
  password,
});
export const childPassword = z.strictObject({ password });

const squadName = z.string().trim().min(1).max(60);
export const newSquad = z.strictObject({ name: squadName });
/** The coaches of a squad, all of them. */
export const squadCoaches = z.strictObject({ personIds: ids });
export const moveAthlete = z.strictObject({ squadId: z.uuid() });

const wholeNumber = (low: number, high: number) => z.coerce.number().int().min(low).max(high);

/** An athlete; the birth date as it is said: day, month, year. */
export const newAthlete = z
  .strictObject({
    givenName: name,
    familyName: name,
    day: wholeNumber(1, 31),
    month: wholeNumber(1, 12),
    year: wholeNumber(1990, 2100),
    sex: z.enum(['female', 'male']),
    plays: z.enum(['left', 'right']),
    squadId: z.uuid(),
  })
  .transform(({ day, month, year, ...rest }) => ({
    ...rest,
    birthDate: `${year}-${String(month).padStart(2, '0')}-${String(day).padStart(2, '0')}`,
  }))
  .refine(({ birthDate }) => isDate(birthDate), { path: ['day'], message: 'No such day' });
export type NewAthlete = z.infer<typeof newAthlete>;

const date = z.string().refine(isDate, 'A date');
export const term = z
  .strictObject({ name: z.string().trim().min(1).max(60), startsOn: date, endsOn: date })
  .refine(({ startsOn, endsOn }) => startsOn <= endsOn, { path: ['endsOn'], message: 'The end is before the start' });
export type TermInput = z.infer<typeof term>;

function isAddress(text: string): boolean {
  try {
    return checkAddress(text) === text;
  } catch {
    return false;
  }
}

function isDate(text: string): boolean {
  const [, year, month, day] = /^(\d{4})-(\d{2})-(\d{2})$/.exec(text) ?? [];
  return isCalendarDate(Number(year), Number(month), Number(day));
}
