import { randomBytes, timingSafeEqual } from 'node:crypto';
import type { Request } from 'express';
import { forbidden } from '../http/problem.ts';

export function newToken(): string {
  return randomBytes(32).toString('base64url');
}

/** @throws ProblemError 403 unless `X-CSRF-Token` is the session's own token */
export function checkCsrfToken(request: Request): void {
  const sent = Buffer.from(request.get('x-csrf-token') ?? '');
  const own = Buffer.from(request.session.csrfToken ?? '');
  if (own.length === 0 || sent.length !== own.length || !timingSafeEqual(sent, own)) {
    throw forbidden('The X-CSRF-Token header is missing or old. Read it from GET /api/session.');
  }
}
