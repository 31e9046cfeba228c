import { randomUUID } from 'node:crypto';
import express, { type Express, type RequestHandler } from 'express';
import { pinoHttp } from 'pino-http';
import type { AppDeps } from './appDeps.ts';
import { sessionMiddleware } from './auth/sessionMiddleware.ts';
import { SessionStore } from './auth/SessionStore.ts';
import { checkOrigin } from './http/checkOrigin.ts';
import type { ApiRoute } from './http/defineRoute.ts';
import { errorHandler } from './http/errorHandler.ts';
import { notFound } from './http/problem.ts';
import { registerRoutes } from './http/registerRoutes.ts';
import { securityHeaders } from './http/securityHeaders.ts';
import { createOpenApi } from './openApi.ts';
import { allRoutes } from './routes/all.ts';
import { healthRouter } from './routes/health.ts';

export type App = {
  express: Express;
  routes: ApiRoute[];
  sessions: SessionStore;
};

/**
 * The whole HTTP side.
 *
 * @param pages - serves the client: static files in production, Vite while developing
 */
export function createApp(deps: AppDeps, pages?: RequestHandler): App {
  const app = express();
  const sessions = new SessionStore(deps.dataSource, deps.clock);
  const routes = allRoutes(deps, sessions);

  app.disable('x-powered-by');
  app.set('trust proxy', deps.env.trustProxy.length > 0 ? deps.env.trustProxy : false);
  app.set('query parser', 'simple');
  app.use(requestLog(deps));
  app.use(securityHeaders(deps.env));
  // Neither touches the session store: they answer while the database is away.
  app.use(healthRouter(deps));
  app.use('/api', noStore, checkOrigin(deps.env));

  const openApi = JSON.stringify(createOpenApi(routes));
  app.get('/api/openapi.json', (_request, response) => {
    response.type('application/json').send(openApi);
  });

  const api = express.Router({ caseSensitive: true, strict: true });
  api.use('/api', sessionMiddleware(deps.env, sessions));
  registerRoutes(api, routes, deps);
  app.use(api);
  app.use('/api', () => {
    throw notFound('address');
  });
  if (pages !== undefined) app.use(pages);
  app.use(() => {
    throw notFound('page');
  });
  app.use(errorHandler(deps.log));
  return { express: app, routes, sessions };
}

const noStore: RequestHandler = (_request, response, next) => {
  response.set('Cache-Control', 'no-store');
  next();
};

function requestLog(deps: AppDeps): RequestHandler {
  return pinoHttp({
    logger: deps.log,
    genReqId: () => randomUUID(),
    // The address without its query: a password sent there by mistake must reach no log.
    serializers: {
      req: (request: { id: string; method: string; url: string }) => ({
        id: request.id,
        method: request.method,
        url: request.url.split('?')[0],
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
    customLogLevel: (_request, response) => (response.statusCode >= 500 ? 'error' : 'debug'),
  });
}
