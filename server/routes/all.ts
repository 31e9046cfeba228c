import type { AppDeps } from '../appDeps.ts';
import type { SessionStore } from '../auth/SessionStore.ts';
import type { ApiRoute } from '../http/defineRoute.ts';
import { analysisRoutes } from './analyses.ts';
import { configurationRoutes } from './configurations.ts';
import { eventRoutes } from './events.ts';
import { fixtureRoutes } from './fixtures.ts';
import { frictionTestRoutes } from './frictionTests.ts';
import { logRoutes } from './logs.ts';
import { sessionRoutes } from './session.ts';
import { trialRoutes } from './trials.ts';

/** Every route there is. */
export function allRoutes(deps: AppDeps, store: SessionStore): ApiRoute[] {
  return [
    ...sessionRoutes(deps, store),
    ...fixtureRoutes,
    ...configurationRoutes,
    ...frictionTestRoutes,
    ...logRoutes,
    ...trialRoutes,
    ...analysisRoutes,
    ...eventRoutes,
  ];
}
