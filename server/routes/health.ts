import { Router } from 'express';
import type { AppDeps } from '../appDeps.ts';
import { migrations } from '../migrations/all.ts';

/** ms after which a database that does not answer counts as away. */
const patience = 2000;

/** `/healthz`: the process is up. `/readyz`: the database answers and is migrated. */
export function healthRouter(deps: AppDeps): Router {
  const router = Router();
  router.get('/healthz', (_request, response) => {
    response.json({ status: 'ok' });
  });
  router.get('/readyz', async (_request, response) => {
    const trouble = deps.stopping.now ? 'stopping' : await databaseTrouble(deps);
    if (trouble === null) response.json({ status: 'ok' });
    else response.status(503).json({ status: 'unavailable', detail: trouble });
  });
  return router;
}

async function databaseTrouble(deps: AppDeps): Promise<string | null> {
  try {
    const rows = await Promise.race([
      deps.dataSource.query<{ name: string }[]>('SELECT name FROM migrations'),
      new Promise<never>((_resolve, reject) => {
        setTimeout(() => reject(new Error('no answer')), patience).unref();
      }),
    ]);
    const done = new Set(rows.map((row) => row.name));
    const missing = migrations.filter((migration) => !done.has(migration.name));
    return missing.length === 0 ? null : 'the database is not migrated';
  } catch {
    return 'the database does not answer';
  }
}
