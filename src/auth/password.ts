import { hash, verify } from '@node-rs/argon2';

/** OWASP's first choice for argon2id: 19 MiB, two passes, one lane. */
const PARAMETERS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** Argon2id hash of a password, in the PHC string form. */
export const hashPassword = (password: string): Promise<string> => hash(password.normalize('NFKC'), PARAMETERS);

// A hash of nothing in particular: an unknown name costs the same time as a wrong password.
let unknownPersonHash: Promise<string> | undefined;

/**
 * Whether the password is the one behind the hash. Without a hash it does the same work and says no, so that the time
 * does not tell who has an account.
 */
export async function verifyPassword(passwordHash: string | undefined, password: string): Promise<boolean> {
  unknownPersonHash ??= hashPassword('nobody has this one');
  const right = await bounded(async () =>
    verify(passwordHash ?? (await unknownPersonHash!), password.normalize('NFKC')),
  );
  return right && passwordHash !== undefined;
}

// Each hash takes a thread and 19 MiB: a burst of sign-ins must not take the pages with it.
const MOST_AT_ONCE = 2;
let running = 0;
const waiting: (() => void)[] = [];

async function bounded<T>(work: () => Promise<T>): Promise<T> {
  if (running >= MOST_AT_ONCE) await new Promise<void>((resolve) => waiting.push(resolve));
  running += 1;
  try {
    return await work();
  } finally {
    running -= 1;
    waiting.shift()?.();
  }
}
