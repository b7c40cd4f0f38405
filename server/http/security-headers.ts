import type { RequestHandler } from 'express';
import helmet from 'helmet';

const YEAR_SECONDS = 31_536_000;

/**
 * @param scriptHashes of the inline scripts of the exported client, such as 'sha256-…'; no other inline script runs
 */
export const securityHeaders = (scriptHashes: readonly string[]): RequestHandler =>
  helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        'default-src': ["'none'"],
        'script-src': ["'self'", ...scriptHashes.map((hash) => `'${hash}'`)],
        // react-native-web writes its style sheet into the page.
        'style-src': ["'self'", "'unsafe-inline'"],
        'img-src': ["'self'", 'data:'],
        'font-src': ["'self'"],
        'connect-src': ["'self'"],
        'manifest-src': ["'self'"],
        'base-uri': ["'none'"],
        'form-action': ["'self'"],
        'frame-ancestors': ["'none'"],
        'object-src': ["'none'"],
      },
    },
    strictTransportSecurity: { maxAge: YEAR_SECONDS, includeSubDomains: true },
    referrerPolicy: { policy: 'no-referrer' },
    frameguard: { action: 'deny' },
  });
