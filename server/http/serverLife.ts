import type { Server } from 'node:http';
import type { AppDeps } from '../appDeps.ts';

const graceMs = 10_000;

/** Limits on slow clients; keep-alive stays above a proxy's. */
export function setTimeouts(server: Server): void {
  server.headersTimeout = 15_000;
  server.requestTimeout = 180_000;
  server.keepAliveTimeout = 75_000;
  server.maxConnections = 500;
}

/**
 * On SIGTERM or SIGINT: not ready, no new connections, requests in flight may finish within ten
 * seconds, then pools and database close. Exit 0, or 1 when the time ran out.
 */
export function stopOnSignal(server: Server, deps: AppDeps, also: () => void): void {
  const stop = () => {
    if (deps.stopping.now) return;
    deps.stopping.now = true;
    also();
    setTimeout(() => process.exit(1), graceMs).unref();
    server.close(() => {
      Promise.all([deps.work.close(), deps.passwords.close(), deps.dataSource.destroy()])
        .then(() => process.exit(0))
        .catch(() => process.exit(1));
    });
    server.closeIdleConnections();
  };
  process.on('SIGTERM', stop);
  process.on('SIGINT', stop);
}
