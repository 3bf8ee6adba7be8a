import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { dirname, join, relative, resolve, sep } from 'node:path';
import { describe, expect, it } from 'vitest';
import { PERMISSIONS, rolesWith } from '#src/access/permissions.ts';
import { ROUTES } from '#src/http/routes.ts';

const root = resolve(import.meta.dirname, '..');
const source = join(root, 'src');

/** Layer → the layers it may import (HOUSE: the table), beside itself. */
const MAY_IMPORT: Readonly<Record<string, readonly string[]>> = {
  pages: [
    'layouts',
    'components',
    'islands',
    'ui',
    'services',
    'http',
    'schemas',
    'domain',
    'access',
    'errors',
    'auth',
    'styles',
    'mail',
  ],
  'middleware.ts': ['auth', 'access', 'http', 'errors'],
  'env.d.ts': ['access'],
  // The demo's own mail server and its page.
  server: ['http', 'jobs', 'db', 'errors', 'mail'],
  cli: ['services', 'db', 'errors', 'access', 'domain', 'auth'],
  layouts: ['components', 'islands', 'ui', 'domain', 'access', 'styles', 'services'],
  components: ['islands', 'ui', 'domain', 'services', 'access'],
  islands: ['ui', 'client', 'schemas', 'domain'],
  ui: ['domain'],
  client: ['schemas', 'domain'],
  http: ['access', 'errors'],
  schemas: ['domain'],
  services: ['db', 'queue', 'domain', 'access', 'schemas', 'errors'],
  db: ['access'],
  queue: ['db'],
  jobs: ['services', 'mail', 'reports', 'db', 'queue'],
  mail: ['domain', 'errors'],
  auth: ['services', 'db', 'access', 'errors', 'http', 'schemas', 'domain'],
  access: ['errors'],
  domain: [],
  errors: [],
  styles: [],
};

/** Packages that pure code may use: numbers in, numbers out. */
const DOMAIN_PACKAGES = /^@stdlib\/stats-base-dists-/;

function filesBelow(folder: string): string[] {
  if (!existsSync(folder)) return [];
  return readdirSync(folder).flatMap((name) => {
    const path = join(folder, name);
    return statSync(path).isDirectory() ? filesBelow(path) : /\.(ts|tsx|astro)$/.test(name) ? [path] : [];
  });
}

const files = filesBelow(source).map((path) => ({
  path,
  name: relative(root, path).split(sep).join('/'),
  layer: relative(source, path).split(sep)[0]!,
  text: readFileSync(path, 'utf8'),
}));

function importsOf({ path, text }: { path: string; text: string }): string[] {
  const found = text.matchAll(
    /(?:^|\n)\s*(?:import|export)\b[^'"`;]*?from\s*['"]([^'"]+)['"]|\bimport\s*\(?\s*['"]([^'"]+)['"]/g,
  );
  return [...found].map(([, from, bare]) => {
    const name = (from ?? bare)!;
    return name.startsWith('.')
      ? `#src/${relative(source, resolve(dirname(path), name))
          .split(sep)
          .join('/')}`
      : name;
  });
}

const layerOf = (name: string): string | undefined => /^#src\/([^/]+)/.exec(name)?.[1];

describe('layers', () => {
  it('finds the sources, and an import in them', () => {
    expect(files.length).toBeGreaterThan(100);
    expect(importsOf({ path: join(source, 'domain/x.ts'), text: `import { a } from '../db/client.ts';` })).toEqual([
      '#src/db/client.ts',
    ]);
  });

  it('imports only what the table allows', () => {
    const breaches = files.flatMap((file) =>
      importsOf(file)
        .map(layerOf)
        .filter((layer) => layer !== undefined && layer !== file.layer)
        .filter((layer) => !(MAY_IMPORT[file.layer] ?? []).includes(layer!))
        .map((layer) => `${file.name} imports ${layer}`),
    );
    expect(breaches).toEqual([]);
  });

  it('spells SQL only in db', () => {
    const spelled = files.filter(
      ({ layer, text }) =>
        layer !== 'db' &&
        /from 'kysely'|from 'pg'|\bsql`|\.(selectFrom|insertInto|updateTable|deleteFrom)\(/.test(text),
    );
    expect(spelled.map(({ name }) => name)).toEqual([]);
  });

  it('keeps the domain pure: no clock, no chance, no I/O', () => {
    const impure = files.filter(
      (file) =>
        file.layer === 'domain' &&
        (/\bDate\.now\b|\bnew Date\(\)|\bMath\.random\b|\bprocess\./.test(file.text) ||
          importsOf(file).some((name) => !name.startsWith('#src/domain/') && !DOMAIN_PACKAGES.test(name))),
    );
    expect(impure.map(({ name }) => name)).toEqual([]);
  });

  it('has no place for leftovers', () => {
    const vague = files.filter(({ name }) =>
      /\/(utils?|helpers?|misc|manager|data|info|index\.ts)(\/|\.ts|$)/.test(name),
    );
    const pages = (name: string) => name.startsWith('src/pages/') || name === 'src/jobs/index.ts';
    expect(vague.map(({ name }) => name).filter((name) => !pages(name))).toEqual([]);
  });
});

describe('routes', () => {
  const pages = files.filter(({ layer }) => layer === 'pages');
  const patternOf = (name: string) =>
    `/${name
      .replace(/^src\/pages\//, '')
      .replace(/\.(astro|ts)$/, '')
      .replace(/(^|\/)index$/, '')}`.replace(/\/$/, '') || '/';
  // The demo's own pages exist only there; the sign-in library brings its route itself.
  const registered = ROUTES.filter(({ pattern }) => pattern !== '/api/auth/[...auth]');

  it('registers every route and method that has a file, and nothing else', () => {
    const methods = pages.flatMap(({ name, text }) =>
      name.endsWith('.astro')
        ? [`GET ${patternOf(name)}`]
        : [...text.matchAll(/export const (GET|POST|PUT|PATCH|DELETE)\b/g)].map(
            ([, method]) => `${method} ${patternOf(name)}`,
          ),
    );
    expect(methods.sort()).toEqual(registered.map(({ method, pattern }) => `${method} ${pattern}`).sort());
  });

  it('asks for a permission that some role holds', () => {
    for (const permission of PERMISSIONS) expect(rolesWith(permission).length, permission).toBeGreaterThan(0);
  });
});
