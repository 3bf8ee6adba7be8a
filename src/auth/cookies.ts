/** Names and flags of our cookies: `__Host-` ties them to this host and to secure transport. */
const flags = { httpOnly: true, sameSite: 'lax', path: '/', secure: true } as const;

export const SESSION_COOKIE = '__Host-marram.session';

export const cookies = {
  sessionToken: { name: SESSION_COOKIE, options: flags },
  callbackUrl: { name: '__Host-marram.to', options: flags },
  csrfToken: { name: '__Host-marram.csrf', options: flags },
};
export const cookieFlags = flags;

const DAY_S = 24 * 60 * 60;

/** How long a session lives at most; idle limits by role are in the query that finds it. */
export const SESSION_MAX_AGE_S = 14 * DAY_S;
