/**
 * The headers that Astro's answer needs from us: personal pages are kept by nobody, and the content policy allows the
 * style attributes that charts are drawn with (Astro's own setting cannot say so).
 */
export function pageHeaders(response: Response, { personal }: { personal: boolean }): Response {
  const { headers } = response;
  if (personal) headers.set('cache-control', 'no-store');
  const policy = headers.get('content-security-policy');
  if (policy && !policy.includes('style-src-attr')) {
    headers.set('content-security-policy', `${policy.replace(/;\s*$/, '')}; style-src-attr 'unsafe-inline';`);
  }
  return response;
}
