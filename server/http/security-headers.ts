import type { RequestHandler } from 'express';
import helmet from 'helmet';

/** Scripts and fonts from here alone; react-native-web writes its styles into the page. */
export function securityHeaders({ isSecure }: { isSecure: boolean }): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'", 'data:'],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'self'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(isSecure && { upgradeInsecureRequests: [] }),
      },
    },
    strictTransportSecurity: isSecure ? { maxAge: 31_536_000 } : false,
    crossOriginOpenerPolicy: isSecure ? { policy: 'same-origin' } : false,
    originAgentCluster: isSecure,
  });
}
