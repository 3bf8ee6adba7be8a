import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { passwordProblem } from '#src/domain/account/passwordProblem.ts';

const WORDS = ['Saltmarsh Links Junior Academy', 'Wren', 'Halloran', 'Wren Halloran'];

/** TRUST.md S18: 8 at least, 64 and more allowed, nothing asked of its composition, common ones and our words refused. */
describe('a password', () => {
  it.each([
    ['1234567', 'short'],
    ['áéíóúýñ', 'short'],
    ['🌾🌾🌾🌾', 'short'],
    ['x'.repeat(257), 'long'],
    ['12345678', 'common'],
    ['87654321', 'common'],
    ['aaaaaaaaaaaa', 'common'],
    ['abababab', 'common'],
    ['20262026', 'common'],
    ['Password1!', 'common'],
    ['passwordpassword', 'common'],
    ['  LetMeIn  ', 'common'],
    ['qwertyuiop', 'common'],
    ['Saltmarsh2026', 'common'],
    ['Saltmarsh, links & junior', 'common'],
    ['saltmarshlinks', 'common'],
    ['Junior Academy!', 'common'],
    ['wren.halloran', 'common'],
    ['Halloran99', 'common'],
  ])('%j: %s', (password, problem) => {
    expect(passwordProblem(password, WORDS)).toBe(problem);
  });

  it.each([
    'correct horse battery staple',
    'tyhn4pqz',
    'all small letters',
    '42 9 1177 30',
    'ёжик в тумане',
    'x7'.padEnd(64, 'q4'),
  ])('may be %j', (password) => {
    expect(passwordProblem(password, WORDS)).toBeNull();
  });

  it('is judged the same in whatever way its letters are composed', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 40 }), (password) => {
        expect(passwordProblem(password.normalize('NFKD'), WORDS)).toBe(passwordProblem(password, WORDS));
      }),
    );
  });
});
