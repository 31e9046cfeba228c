import type { RequestHandler } from 'express';
import session from 'express-session';
import type { Env } from '../env.ts';
import type { SessionStore } from './SessionStore.ts';

declare module 'express-session' {
  interface SessionData {
    userId: number;
    csrfToken: string;
  }
}

/** Under TLS the cookie takes the `__Host-` prefix; in plain mode that would lock everybody out. */
export function sessionCookieName(env: Env): string {
  return behindTls(env) ? '__Host-tautline' : 'tautline';
}

export function behindTls(env: Env): boolean {
  return env.origin?.startsWith('https:') ?? false;
}

export function sessionMiddleware(env: Env, store: SessionStore): RequestHandler {
  return session({
    name: sessionCookieName(env),
    secret: env.sessionSecrets,
    store,
    resave: false,
    // Nobody gets a cookie before signing in.
    saveUninitialized: false,
    cookie: { httpOnly: true, sameSite: 'lax', path: '/', secure: behindTls(env) },
    proxy: env.trustProxy.length > 0,
  });
}
