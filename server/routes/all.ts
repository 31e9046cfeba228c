import type { AppDeps } from '../appDeps.ts';
import type { SessionStore } from '../auth/SessionStore.ts';
import type { ApiRoute } from '../http/defineRoute.ts';
import { eventRoutes } from './events.ts';
import { sessionRoutes } from './session.ts';

/** Every route there is. */
export function allRoutes(deps: AppDeps, store: SessionStore): ApiRoute[] {
  return [...sessionRoutes(deps, store), ...eventRoutes];
}
