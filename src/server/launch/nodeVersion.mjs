/** Throws a sentence when this Node.js is not one that Marram is made for (package.json says which). */
export function requireNodeVersion(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  if (major === 20 && minor >= 19) return;
  throw new Error(
    `Marram needs Node.js 20.19 or a later 20; this is ${version}. Get it from nodejs.org, then start again.`,
  );
}
