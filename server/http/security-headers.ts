import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** What a page of this program never asks a browser for, so that nothing put into one may. */
const PERMISSIONS = [
  'accelerometer',
  'camera',
  'display-capture',
  'geolocation',
  'gyroscope',
  'magnetometer',
  'microphone',
  'midi',
  'payment',
  'usb',
]
  .map((feature) => `${feature}=()`)
  .join(', ');

/**
 * No inline script and no script from elsewhere. Inline style is allowed: the dialogs' scroll lock writes a style
 * element. Pictures may be `blob:` and `data:` (previews of photographs before they are sent).
 */
export function securityHeaders(publicUrl: string): RequestHandler {
  const secure = publicUrl.startsWith('https:');
  const headers = helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        scriptSrcAttr: ["'none'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'blob:', 'data:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        workerSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(secure ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    frameguard: { action: 'deny' },
    referrerPolicy: { policy: 'same-origin' },
    // Over plain HTTP browsers ignore it, and on loopback it would bind other programs' ports.
    strictTransportSecurity: secure ? { maxAge: 31_536_000, includeSubDomains: false } : false,
  });
  return (req, res, next) => {
    res.setHeader('Permissions-Policy', PERMISSIONS);
    headers(req, res, next);
  };
}
