import express, { type Request, type Response, type Router } from 'express';
import { z } from 'zod';
import { may } from '../../shared/access/permissions.ts';
import type { SessionUser } from '../../shared/schemas/session.ts';
import type { AppDeps } from '../appDeps.ts';
import { checkCsrfToken } from '../auth/csrf.ts';
import { currentUser } from '../auth/currentUser.ts';
import { recordEvent } from '../services/recordEvent.ts';
import type { ApiRoute, RouteReply, UploadedFile } from './defineRoute.ts';
import { parseIds, parseWith, queryOf, requireJson } from './parse.ts';
import { forbidden, malformed, notSignedIn, ProblemError } from './problem.ts';
import { receiveUpload } from './receiveUpload.ts';
import { requestIdOf } from './requestIdOf.ts';

/**
 * Mounts declared routes. The order is the same for each: who, token, permission, and only then
 * a byte of the body. A route that is not declared does not exist; a declared one is closed
 * unless its `access` opens it.
 */
export function registerRoutes(router: Router, routes: ApiRoute[], deps: AppDeps): void {
  for (const route of routes) {
    const readJson = express.json({
      limit: route.bodyLimit ?? '100kb',
      strict: true,
      inflate: false,
    });
    router[route.method](route.path, async (request: Request, response: Response) => {
      const user = await admit(route, request, deps);
      const params = parseIds(request);
      const query = parseWith(route.query ?? noQuery, queryOf(request));
      const { body, file } = await readBody(route, request, response, readJson);
      send(
        response,
        await route.handle({ user, params, query, body, file, request, response, deps }),
      );
    });
  }
  for (const [path, methods] of methodsByPath(routes)) {
    router.all(path, (_request, response) => {
      response.set('Allow', methods.join(', '));
      throw new ProblemError(
        405,
        'Method not allowed',
        `This address takes ${methods.join(', ')}.`,
      );
    });
  }
}

const noQuery = z.strictObject({});

/** @throws ProblemError 401 or 403; a refusal leaves one line in the event log */
async function admit(
  route: ApiRoute,
  request: Request,
  deps: AppDeps,
): Promise<SessionUser | null> {
  if (request.get('authorization') !== undefined) {
    throw notSignedIn();
  }
  const user = await currentUser(request, deps.dataSource);
  if (route.access === 'anyone') {
    if (user !== null && route.method !== 'get' && route.csrfExempt !== true)
      checkCsrfToken(request);
    return user;
  }
  if (user === null) throw notSignedIn();
  try {
    if (route.method !== 'get') checkCsrfToken(request);
    if (!may(user.roles, route.access)) {
      throw forbidden('Your roles do not allow this. An administrator can change them.');
    }
  } catch (error) {
    await recordRefusal(route, user, request, deps);
    throw error;
  }
  return user;
}

async function recordRefusal(
  route: ApiRoute,
  user: SessionUser,
  request: Request,
  deps: AppDeps,
): Promise<void> {
  const id = Number(request.params.id);
  await recordEvent(deps.dataSource.manager, {
    actor: user,
    action: 'refused',
    objectType: 'route',
    objectId: Number.isSafeInteger(id) && id > 0 && id < 4_294_967_295 ? id : null,
    fixtureId: null,
    outcome: 'refused',
    summary: `${route.method.toUpperCase()} ${route.path}: ${route.summary}`,
    requestId: requestIdOf(request),
  });
}

async function readBody(
  route: ApiRoute,
  request: Request,
  response: Response,
  readJson: express.RequestHandler,
): Promise<{ body: unknown; file: UploadedFile | null }> {
  if (route.upload !== undefined) {
    const { file, fields } = await receiveUpload(request, response, route.upload);
    return { body: route.body === undefined ? fields : parseWith(route.body, fields), file };
  }
  if (route.body === undefined) return { body: undefined, file: null };
  requireJson(request);
  await new Promise<void>((resolve, reject) => {
    void readJson(request, response, (error?: Error | string) =>
      error === undefined ? resolve() : reject(error instanceof Error ? error : new Error(error)),
    );
  });
  if (request.body === undefined) throw malformed('Send a JSON body.');
  return { body: parseWith(route.body, request.body), file: null };
}

function send(response: Response, reply: RouteReply): void {
  response.status(reply.status);
  if ('headers' in reply && reply.headers !== undefined) response.set(reply.headers);
  if ('bytes' in reply) response.send(Buffer.from(reply.bytes));
  else if ('body' in reply) response.json(reply.body);
  else response.end();
}

function methodsByPath(routes: ApiRoute[]): Map<string, string[]> {
  const methods = new Map<string, string[]>();
  for (const route of routes) {
    const known = methods.get(route.path) ?? [];
    methods.set(route.path, [...known, route.method.toUpperCase()]);
  }
  return methods;
}
