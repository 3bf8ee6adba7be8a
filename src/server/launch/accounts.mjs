import { existsSync, readFileSync } from 'node:fs';

/**
 * One demo account a role as lines to print; none outside the demo.
 *
 * @param {string} file where the seed left them
 * @returns {string[]}
 */
export function accountLines(file) {
  if (!existsSync(file)) return [];
  const seen = new Set();
  return JSON.parse(readFileSync(file, 'utf8'))
    .filter(({ role }) => !seen.has(role) && seen.add(role))
    .map(
      ({ role, email, password }) =>
        `${String(role).replaceAll('_', ' ').padEnd(16)} ${String(email).padEnd(34)} ${password}`,
    );
}
