import { createDocument } from 'zod-openapi';
import { z } from 'zod';
import { problemSchema } from '../shared/schemas/problem.ts';
import type { ApiRoute } from './http/defineRoute.ts';

/** The OpenAPI 3.1 document, made from the very routes and schemas that answer requests. */
export function createOpenApi(routes: ApiRoute[]): unknown {
  const paths: Record<string, Record<string, unknown>> = {};
  for (const route of routes) {
    const path = route.path.replace(/:(\w+)/g, '{$1}');
    paths[path] = { ...paths[path], [route.method]: operationOf(route) };
  }
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Tautline',
      version: '1',
      description:
        'Acceleration limits of friction-held rotary fixtures. SI units unless a name says otherwise.',
    },
    components: {
      securitySchemes: {
        session: {
          type: 'apiKey',
          in: 'cookie',
          name: 'tautline',
          description: 'Unsafe calls also need the X-CSRF-Token header.',
        },
      },
    },
    paths: paths,
  });
}

function operationOf(route: ApiRoute) {
  const ids = [...route.path.matchAll(/:(\w+)/g)].map((match) => match[1] ?? '');
  return {
    summary: route.summary,
    operationId: operationId(route),
    tags: [route.path.split('/')[2] ?? 'api'],
    security: route.access === 'anyone' ? [] : [{ session: [] }],
    'x-access': route.access,
    requestParams: {
      ...(ids.length > 0
        ? { path: z.object(Object.fromEntries(ids.map((id) => [id, idInPath]))) }
        : {}),
      ...(route.query ? { query: route.query } : {}),
      ...(route.method === 'get' || route.csrfExempt ? {} : { header: csrfHeader }),
    },
    ...(bodyOf(route) ? { requestBody: bodyOf(route) } : {}),
    responses: {
      ...Object.fromEntries(
        Object.entries(route.answers).map(([status, schema]) => [status, answerOf(schema)]),
      ),
      default: {
        description: 'A problem document (RFC 9457)',
        content: { 'application/problem+json': { schema: problemSchema } },
      },
    },
  };
}

const idInPath = z.number().int().positive();
const csrfHeader = z.object({ 'X-CSRF-Token': z.string() });

function answerOf(schema: z.ZodType | null) {
  if (schema === null) return { description: 'Done' };
  return { description: 'Done', content: { 'application/json': { schema } } };
}

function bodyOf(route: ApiRoute) {
  if (route.upload !== undefined) {
    const fields = Object.fromEntries(
      route.upload.fields.map((name) => [name, z.string().optional().describe('JSON text')]),
    );
    const file = z.string().meta({ format: 'binary' });
    return { content: { 'multipart/form-data': { schema: z.object({ file, ...fields }) } } };
  }
  if (route.body === undefined) return undefined;
  return { content: { 'application/json': { schema: route.body } } };
}

function operationId(route: ApiRoute): string {
  const words = route.path
    .replace('/api/', '')
    .split(/[/:.-]+/)
    .filter((word) => word !== '');
  return [route.method, ...words]
    .map((w, i) => (i === 0 ? w : w[0]?.toUpperCase() + w.slice(1)))
    .join('');
}
