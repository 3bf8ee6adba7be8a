/** A message that the demo's own mail server took. */
export interface KeptMessage {
  id: string;
  to: string;
  subject: string;
  text: string;
  links: string[];
  receivedAt: Date;
}

/** How many messages the demo keeps; the oldest go first. */
export const MOST_KEPT = 200;

// The built pages and the server around them are two module graphs of one process: they meet here.
const SHARED = Symbol.for('marram.demo.mailbox');

/** The messages of this process's demo mail server, newest last. */
export function mailbox(): KeptMessage[] {
  const shared = globalThis as { [SHARED]?: KeptMessage[] };
  return (shared[SHARED] ??= []);
}
