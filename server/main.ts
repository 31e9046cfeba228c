import { createServer } from 'node:http';
import path from 'node:path';
import type { RequestHandler } from 'express';
import { createApp } from './app.ts';
import { createDeps } from './createDeps.ts';
import { checkDatabase } from './database/checkDatabase.ts';
import { boundPool } from './database/boundPool.ts';
import { createDataSource } from './dataSource.ts';
import { seedDemo } from './demo/seed.ts';
import { readEnv } from './env.ts';
import { servePages } from './http/servePages.ts';
import { setTimeouts, stopOnSignal } from './http/serverLife.ts';

const sweepEvery = 15 * 60_000;

async function main(): Promise<void> {
  const env = readEnv(process.env);
  const dataSource = await createDataSource(env.database).initialize();
  boundPool(dataSource);
  await checkDatabase(dataSource, env.mode);
  const deps = createDeps(env, dataSource);
  if (env.demo) await seedDemo(deps);

  const server = createServer();
  const app = createApp(deps, await pages(server, env.hotReload));
  server.on('request', app.express);
  setTimeouts(server);
  const sweep = setInterval(() => {
    app.sessions.sweep().catch((error: unknown) => deps.log.warn({ err: error }, 'session sweep'));
  }, sweepEvery);
  stopOnSignal(server, deps, () => clearInterval(sweep));

  server.on('error', (error: NodeJS.ErrnoException) => {
    const taken = error.code === 'EADDRINUSE';
    console.error(taken ? `PORT: ${env.port} is in use. Set PORT to a free one.` : error.message);
    process.exit(1);
  });
  server.listen(env.port, env.host, () => {
    const address = server.address();
    const port = typeof address === 'object' && address !== null ? address.port : env.port;
    console.log(`Tautline listens on ${env.origin ?? `http://${env.host}:${port}`}`);
  });
}

/** Vite inside the same server while developing; the build otherwise. */
async function pages(
  server: ReturnType<typeof createServer>,
  hotReload: boolean,
): Promise<RequestHandler> {
  if (hotReload) {
    const { serveWithVite } = await import('./http/serveWithVite.ts');
    return serveWithVite(server);
  }
  return servePages(path.resolve('dist/client'));
}

main().catch((error: unknown) => {
  console.error(error instanceof Error ? error.message : error);
  process.exit(1);
});
