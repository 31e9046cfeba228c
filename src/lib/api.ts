import type { Problem } from '../../shared/schemas/problem.ts';

/** An answer that is not a success: the problem document, or what can be said without one. */
export class ApiError extends Error {
  constructor(readonly problem: Problem) {
    super(problem.detail ?? problem.title);
    this.name = 'ApiError';
  }

  get status(): number {
    return this.problem.status;
  }

  /** Message of each field that was refused. */
  get fields(): { path: string; message: string }[] {
    return this.problem.errors ?? [];
  }
}

let csrfToken = '';

/** Kept from the session's answers; sent with every change. */
export function setCsrfToken(token: string): void {
  csrfToken = token;
}

type Call = {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** Sent as JSON, unless it is a form. */
  body?: unknown;
  signal?: AbortSignal;
};

/**
 * Calls the server. It neither shows nor redirects anything: the caller decides.
 *
 * @throws ApiError for every answer that is not a success, and for a server out of reach
 */
export async function api<T>(
  path: string,
  { method = 'GET', body, signal }: Call = {},
): Promise<T> {
  const headers: Record<string, string> = { Accept: 'application/json' };
  if (method !== 'GET') headers['X-CSRF-Token'] = csrfToken;
  const form = body instanceof FormData;
  if (body !== undefined && !form) headers['Content-Type'] = 'application/json';
  const response = await reach(path, {
    method,
    headers,
    ...(body === undefined ? {} : { body: form ? body : JSON.stringify(body) }),
    ...(signal === undefined ? {} : { signal }),
  });
  if (!response.ok) throw new ApiError(await problemOf(response));
  return (response.status === 204 ? undefined : await response.json()) as T;
}

async function reach(path: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(path, { credentials: 'same-origin', ...init });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw new ApiError({
      type: 'about:blank',
      title: 'No connection',
      status: 0,
      detail:
        'The server cannot be reached. Check the network and try again; nothing was lost here.',
    });
  }
}

async function problemOf(response: Response): Promise<Problem> {
  const type = response.headers.get('content-type') ?? '';
  if (type.includes('problem+json')) return (await response.json()) as Problem;
  return { type: 'about:blank', title: 'Unexpected answer', status: response.status };
}
