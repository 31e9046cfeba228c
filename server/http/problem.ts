import type { Problem } from '../../shared/schemas/problem.ts';

export type FieldError = { path: string; message: string };

type Details = {
  errors?: FieldError[];
  current?: unknown;
  /** Seconds after which the same call may succeed. */
  retryAfter?: number;
};

/** An answer that is not a success, thrown anywhere and written out once, by the error handler. */
export class ProblemError extends Error {
  constructor(
    readonly status: number,
    readonly title: string,
    readonly detail?: string,
    readonly details: Details = {},
  ) {
    super(detail ?? title);
    this.name = 'ProblemError';
  }

  /** The RFC 9457 document. */
  toDocument(): Problem {
    const slug = this.title.toLowerCase().replace(/[^a-z]+/g, '-');
    return {
      type: `/problems/${slug}`,
      title: this.title,
      status: this.status,
      ...(this.detail === undefined ? {} : { detail: this.detail }),
      ...(this.details.errors === undefined ? {} : { errors: this.details.errors }),
      ...(this.details.current === undefined ? {} : { current: this.details.current }),
    };
  }
}

export function invalid(errors: FieldError[], detail?: string): ProblemError {
  const first = errors[0];
  const text = detail ?? (first ? `${first.path || 'body'}: ${first.message}` : 'Not valid.');
  return new ProblemError(422, 'Not valid', text, { errors });
}

export function malformed(detail: string): ProblemError {
  return new ProblemError(400, 'Malformed request', detail);
}

export function notSignedIn(): ProblemError {
  return new ProblemError(401, 'Not signed in', 'Sign in and try again.');
}

export function forbidden(detail: string): ProblemError {
  return new ProblemError(403, 'Not allowed', detail);
}

export function notFound(what: string): ProblemError {
  return new ProblemError(404, 'Not found', `There is no such ${what}.`);
}

/** @param current - the present state, so that the caller can see what changed meanwhile */
export function conflict(detail: string, current?: unknown): ProblemError {
  return new ProblemError(409, 'Conflict', detail, { current });
}

export function tooLarge(detail: string): ProblemError {
  return new ProblemError(413, 'Too large', detail);
}

export function unsupported(detail: string): ProblemError {
  return new ProblemError(415, 'Unsupported media type', detail);
}

export function tooMany(detail: string, retryAfter: number): ProblemError {
  return new ProblemError(429, 'Too many attempts', detail, { retryAfter });
}

export function unavailable(detail: string, retryAfter = 2): ProblemError {
  return new ProblemError(503, 'Not available', detail, { retryAfter });
}
