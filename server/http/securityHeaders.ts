import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** The policy of architecture.md section 6, word by word; HSTS only where TLS stands in front. */
export function securityHeaders(overTls: boolean): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        workerSrc: ["'self'"],
        styleSrc: ["'self'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        objectSrc: ["'none'"],
        frameAncestors: ["'none'"],
        baseUri: ["'none'"],
      },
    },
    strictTransportSecurity: overTls,
    crossOriginEmbedderPolicy: false,
  });
}
