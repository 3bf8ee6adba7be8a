import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** The policy of everything that is not a page: it may load nothing. Pages bring their own, with hashes. */
export const strictPolicy = "default-src 'none'; base-uri 'none'; form-action 'none'; frame-ancestors 'none'";

const unused = ['accelerometer', 'camera', 'display-capture', 'geolocation', 'gyroscope', 'magnetometer', 'microphone'];
const permissions = [...unused, 'midi', 'payment', 'serial', 'usb', 'xr-spatial-tracking', 'browsing-topics']
  .map((feature) => `${feature}=()`)
  .join(', ');

/** Security headers for every answer; whoever answers later may replace the content policy. */
export function securityHeaders(https: boolean): RequestHandler[] {
  const common = helmet({
    contentSecurityPolicy: false,
    // A stricter "no-referrer" would make browsers hide the Origin of our own forms.
    referrerPolicy: { policy: 'same-origin' },
    strictTransportSecurity: https ? { maxAge: 31_536_000, includeSubDomains: true } : false,
    xFrameOptions: { action: 'deny' },
    crossOriginEmbedderPolicy: false,
  });
  const own: RequestHandler = (_req, res, next) => {
    res.setHeader('Content-Security-Policy', strictPolicy);
    res.setHeader('Permissions-Policy', permissions);
    next();
  };
  return [common, own];
}
