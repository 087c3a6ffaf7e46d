import helmet from 'helmet';
import type { RequestHandler } from 'express';

/**
 * Headers that keep foreign code out. Scripts come from here only, and inline ones only by their hash; styles may
 * be inline, because components place themselves with them.
 */
export function securityHeaders(scriptHashes: readonly string[]): RequestHandler {
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        // A solver runs as WebAssembly in a worker; that compiles no text as script.
        scriptSrc: ["'self'", "'wasm-unsafe-eval'", ...scriptHashes.map((hash) => `'${hash}'`)],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'", 'data:'],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    strictTransportSecurity: { maxAge: 15_552_000, includeSubDomains: false },
    referrerPolicy: { policy: 'same-origin' },
    xFrameOptions: { action: 'deny' },
  });
}
