import type { RequestHandler } from 'express';
import helmet from 'helmet';

/**
 * The security headers of every answer. Emotion writes style elements, hence inline styles; the page loads nothing
 * from elsewhere. Over plain http nothing may be upgraded to https, or the pages would load without their files.
 */
export function securityHeaders(publicUrl: string): RequestHandler {
  const overTls = publicUrl.startsWith('https:');
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        baseUri: ["'none'"],
        connectSrc: ["'self'"],
        fontSrc: ["'self'", 'data:'],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        objectSrc: ["'none'"],
        scriptSrc: ["'self'"],
        scriptSrcAttr: ["'none'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        upgradeInsecureRequests: overTls ? [] : null,
      },
    },
    crossOriginOpenerPolicy: overTls ? { policy: 'same-origin' } : false,
    originAgentCluster: overTls,
    referrerPolicy: { policy: 'same-origin' },
    strictTransportSecurity: overTls,
  });
}
