import type { ErrorRequestHandler } from 'express';
import type { Logger } from 'pino';
import { errorNumber } from '../database/inTransaction.ts';
import {
  malformed,
  notFound,
  ProblemError,
  tooLarge,
  unavailable,
  unsupported,
} from './problem.ts';

/** Writes every failure as a problem document; only what we meant to say leaves the server. */
export function errorHandler(log: Logger): ErrorRequestHandler {
  return (error: unknown, request, response, next) => {
    if (response.headersSent) return next(error);
    const problem = toProblem(error);
    if (problem.status >= 500) log.error({ err: error, requestId: request.id }, problem.title);
    if (problem.details.retryAfter !== undefined) {
      response.set('Retry-After', String(problem.details.retryAfter));
    }
    response.status(problem.status).type('application/problem+json');
    response.send(JSON.stringify(problem.toDocument()));
  };
}

function toProblem(error: unknown): ProblemError {
  if (error instanceof ProblemError) return error;
  const type = property(error, 'type');
  if (type === 'entity.too.large') return tooLarge('The body is larger than this call takes.');
  if (type === 'entity.parse.failed') return malformed('The body is not valid JSON.');
  if (type === 'encoding.unsupported' || type === 'charset.unsupported') {
    return unsupported('Send the body as plain UTF-8 JSON.');
  }
  const status = property(error, 'status');
  if (status === 404) return notFound('file');
  if (error instanceof URIError || (typeof status === 'number' && status >= 400 && status < 500)) {
    return malformed('The request could not be read.');
  }
  if (isDatabaseGone(error))
    return unavailable('The database does not answer. Nothing was stored.');
  return new ProblemError(500, 'Unexpected error');
}

const goneCodes = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'ETIMEDOUT',
  'EPIPE',
  'PROTOCOL_CONNECTION_LOST',
  'PROTOCOL_SEQUENCE_TIMEOUT',
  'POOL_CLOSED',
]);
/** Too many connections, disk full, table space full, statement time exceeded, server going down. */
const goneNumbers = new Set([1040, 1021, 1114, 1969, 1053, 1927]);

function isDatabaseGone(error: unknown): boolean {
  const code = property(error, 'code');
  return (
    (typeof code === 'string' && goneCodes.has(code)) || goneNumbers.has(errorNumber(error) ?? 0)
  );
}

function property(value: unknown, name: string): unknown {
  if (typeof value !== 'object' || value === null) return undefined;
  return (value as Record<string, unknown>)[name];
}
