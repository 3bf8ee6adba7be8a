const known = /^[a-z][a-z0-9.-]{0,23}$/;

/** The path of a request as a log may have it: without query, and with `:id` for whatever may tell a person or a token. */
export function routeName(target: string): string {
  const path = target.split('?', 1)[0] ?? '';
  return path
    .slice(0, 512)
    .split('/')
    .map((segment) => (segment === '' || known.test(segment) || segment === '_astro' ? segment : ':id'))
    .join('/');
}
