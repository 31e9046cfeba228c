import type { Request } from 'express';
import type { z } from 'zod';
import { idParamSchema } from '../../shared/schemas/common.ts';
import { invalid, malformed, notFound, unsupported } from './problem.ts';

/** @throws ProblemError 422 that names each field and the remedy */
export function parseWith<S extends z.ZodType>(schema: S, value: unknown, where = ''): z.output<S> {
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  throw invalid(parsed.error.issues.flatMap((issue) => fieldErrors(issue, where)));
}

/** Ids of the path. Anything but a whole number is no address of ours. */
export function parseIds(request: Request): Record<string, number> {
  const ids: Record<string, number> = {};
  for (const [name, value] of Object.entries(request.params)) {
    const parsed = idParamSchema.safeParse(value);
    // Beyond the column's range no row can have it.
    if (!parsed.success || parsed.data > 4_294_967_295) throw notFound('address');
    ids[name] = parsed.data;
  }
  return ids;
}

/** @throws ProblemError 422 on a repeated key: which of the two was meant? */
export function queryOf(request: Request): Record<string, string> {
  const query: Record<string, string> = {};
  const errors = [];
  for (const [key, value] of Object.entries(request.query)) {
    if (typeof value === 'string') Object.defineProperty(query, key, { value, enumerable: true });
    else errors.push({ path: key, message: 'must be given once' });
  }
  if (errors.length > 0) throw invalid(errors);
  return query;
}

/** @throws ProblemError 415 unless the body is declared as JSON */
export function requireJson(request: Request): void {
  if (request.is('application/json') === false) {
    throw unsupported('Send the body as application/json.');
  }
  if (request.is('application/json') === null) throw malformed('Send a JSON body.');
}

type Issue = z.core.$ZodIssue;

function fieldErrors(issue: Issue, where: string): { path: string; message: string }[] {
  const path = [where, ...issue.path.map(String)].filter((part) => part !== '').join('.');
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      path: path === '' ? key : `${path}.${key}`,
      message: 'is not a field of this call; leave it out',
    }));
  }
  return [
    { path, message: issue.message.endsWith('received undefined') ? 'is missing' : issue.message },
  ];
}
