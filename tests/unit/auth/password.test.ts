import { describe, expect, it } from 'vitest';
import { hashPassword, verifyPassword } from '#src/auth/password.ts';

describe('passwords', () => {
  it('are argon2id at OWASP’s first choice or stronger', async () => {
    // OWASP Password Storage Cheat Sheet: argon2id, m = 19 MiB (19456 KiB), t = 2, p = 1 (from memory).
    expect(await hashPassword('rope, sand and a low tide')).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it('are not cut short: the 99th of 100 characters counts', async () => {
    const long = 'a'.repeat(100);
    const hash = await hashPassword(long);
    expect(await verifyPassword(hash, long)).toBe(true);
    expect(await verifyPassword(hash, `${'a'.repeat(98)}ba`)).toBe(false);
  });

  it('are the same however the keyboard composed them', async () => {
    expect(await verifyPassword(await hashPassword('gr\u00fcn und sandig'), 'gru\u0308n und sandig')).toBe(true);
  });

  it('never fit nobody, whatever is typed', async () => {
    expect(await verifyPassword(undefined, 'nobody has this one')).toBe(false);
  });
});
