import { existsSync } from 'node:fs';
import { installPackages } from '#db/cluster/installPackages.mjs';

export const chromiumPath = '/usr/bin/chromium';

/** Makes sure that Debian's Chromium is here, installing it by the same rule as PostgreSQL. */
export function ensureChromium(log) {
  if (existsSync(chromiumPath)) return;
  installPackages(['chromium'], { log });
  if (!existsSync(chromiumPath)) throw new Error(`Chromium was installed, but ${chromiumPath} is not there.`);
}
