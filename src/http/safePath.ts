/**
 * A path on this site to go on to, or `/today`. Anything that a browser could read as another host is refused:
 * `//host`, `/\host`, a scheme, control characters.
 */
export function safePath(to: string | null | undefined, fallback = '/today'): string {
  if (!to || !/^\/(?![/\\])[^\\\u0000-\u001f\u007f]*$/.test(to)) return fallback;
  return to.startsWith('/api/') || to.startsWith('/sign-in') ? fallback : to;
}
