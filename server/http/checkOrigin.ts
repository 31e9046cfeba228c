import type { RequestHandler } from 'express';
import type { Env } from '../env.ts';
import { forbidden } from './problem.ts';

const safe = new Set(['GET', 'HEAD', 'OPTIONS']);

/** Unsafe calls that another site made the browser send are refused, signing in included. */
export function checkOrigin(env: Env): RequestHandler {
  return (request, _response, next) => {
    if (safe.has(request.method)) return next();
    if (request.get('sec-fetch-site') === 'cross-site') {
      throw forbidden('Calls from another site are refused.');
    }
    const origin = request.get('origin');
    if (origin !== undefined && !isOwn(origin, env, request.get('host') ?? '')) {
      throw forbidden('Calls from another origin are refused.');
    }
    next();
  };
}

function isOwn(origin: string, env: Env, host: string): boolean {
  if (env.origin !== null) return origin === new URL(env.origin).origin;
  return URL.canParse(origin) && new URL(origin).host === host;
}
