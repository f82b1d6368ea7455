import type { RequestHandler } from 'express';
import helmet from 'helmet';
import { contentSecurityPolicy } from './content-security-policy';

/** The security headers of every answer. */
export function securityHeaders(pagesDirectory: string, overTls: boolean): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: contentSecurityPolicy(pagesDirectory, overTls),
    },
    // Over plain HTTP the header is ignored; behind TLS the name is ours for a year.
    strictTransportSecurity: overTls ? { maxAge: 365 * 24 * 3600 } : false,
    frameguard: { action: 'deny' },
    crossOriginResourcePolicy: { policy: 'same-origin' },
    referrerPolicy: { policy: 'same-origin' },
  });
}
