import type { RequestHandler } from 'express';
import helmet from 'helmet';

/**
 * Headers that keep a page to what this server sends: no foreign scripts, frames or connections. Web workers and
 * WebAssembly are allowed, since the nesting search runs in both.
 */
export function securityHeaders(): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        baseUri: ["'self'"],
        connectSrc: ["'self'"],
        fontSrc: ["'self'", 'data:'],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        manifestSrc: ["'self'"],
        objectSrc: ["'none'"],
        scriptSrc: ["'self'", "'wasm-unsafe-eval'"],
        // react-native-web writes its styles into the page.
        styleSrc: ["'self'", "'unsafe-inline'"],
        workerSrc: ["'self'", 'blob:'],
      },
    },
    // A shop's own server often has no certificate; whoever puts TLS in front of it sets this there.
    strictTransportSecurity: false,
  });
}
