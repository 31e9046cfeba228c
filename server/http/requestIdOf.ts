import type { Request } from 'express';

/** The id that the request's log lines and events share. */
export function requestIdOf(request: Request): string | null {
  const { id } = request as { id?: unknown };
  return typeof id === 'string' ? id : null;
}
