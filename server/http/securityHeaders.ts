import helmet from 'helmet';
import type { RequestHandler } from 'express';
import type { Env } from '../env.ts';
import { behindTls } from '../auth/sessionMiddleware.ts';

/**
 * One set of headers. HSTS and `upgrade-insecure-requests` only behind TLS: over plain HTTP on a
 * plant's network they would leave a blank page.
 */
export function securityHeaders(env: Env): RequestHandler {
  const tls = behindTls(env);
  const development = env.hotReload;
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        // Hot reload writes a script into the page.
        scriptSrc: development ? ["'self'", "'unsafe-inline'"] : ["'self'"],
        // The plots set styles as they draw.
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        fontSrc: ["'self'", 'data:'],
        connectSrc: development ? ["'self'", 'ws:'] : ["'self'"],
        workerSrc: ["'self'", 'blob:'],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
        ...(tls ? { upgradeInsecureRequests: [] } : {}),
      },
    },
    strictTransportSecurity: tls ? { maxAge: 31_536_000 } : false,
    crossOriginResourcePolicy: { policy: 'same-origin' },
    referrerPolicy: { policy: 'same-origin' },
  });
}
