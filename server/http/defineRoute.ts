import type { Request, RequestHandler, Response } from 'express';
import type { z } from 'zod';
import type { Permission } from '../../shared/access/permissions.ts';
import type { SessionUser } from '../../shared/schemas/session.ts';
import type { AppDeps } from '../appDeps.ts';

export type UploadedFile = { name: string; bytes: Uint8Array };

/** What a handler is given: everything already parsed and allowed. */
export type RouteContext<User, Query, Body, Params extends string> = {
  user: User;
  params: Record<Params, number>;
  query: Query;
  body: Body;
  /** Only on routes that declare `upload`. */
  file: UploadedFile | null;
  request: Request;
  response: Response;
  deps: AppDeps;
};

export type RouteReply =
  | { status: number; body: unknown; headers?: Record<string, string> }
  | { status: number; bytes: Uint8Array; headers: Record<string, string> }
  | { status: 204 };

/** A route as registered: the Express route, the permission check and the API document in one. */
export type ApiRoute = {
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** Path with ids as `:id`; every path parameter is a whole number. */
  path: string;
  access: 'anyone' | Permission;
  summary: string;
  query?: z.ZodType;
  body?: z.ZodType;
  /** Largest JSON body, bytes; 100 kB where it says nothing. */
  bodyLimit?: number;
  /** Multipart upload of one `file` and the named text fields, parsed into `body`. */
  upload?: { maxBytes: number; fields: string[] };
  answers: Record<number, z.ZodType | null>;
  /** True for the one unsafe call that needs no CSRF token: signing in. */
  csrfExempt?: boolean;
  before?: RequestHandler[];
  // eslint-disable-next-line @typescript-eslint/no-explicit-any -- each route is checked where it is defined; the list is not generic
  handle(context: RouteContext<any, any, any, string>): Promise<RouteReply>;
};

type IdsOf<Path extends string> = Path extends `${string}:${infer Name}/${infer Rest}`
  ? Name | IdsOf<`/${Rest}`>
  : Path extends `${string}:${infer Name}`
    ? Name
    : never;

type OutputOf<S> = S extends z.ZodType ? z.output<S> : undefined;

/** Declares a route with its handler's types following from its schemas. */
export function defineRoute<
  const Path extends string,
  Access extends 'anyone' | Permission,
  Query extends z.ZodType | undefined = undefined,
  Body extends z.ZodType | undefined = undefined,
>(
  route: Omit<ApiRoute, 'path' | 'access' | 'query' | 'body' | 'handle'> & {
    path: Path;
    access: Access;
    query?: Query;
    body?: Body;
    handle(
      context: RouteContext<
        Access extends 'anyone' ? SessionUser | null : SessionUser,
        OutputOf<Query>,
        OutputOf<Body>,
        IdsOf<Path>
      >,
    ): Promise<RouteReply>;
  },
): ApiRoute {
  return route;
}
