import { pino } from 'pino';
import type { DataSource } from 'typeorm';
import type { AppDeps } from './appDeps.ts';
import type { Env } from './env.ts';
import { createPool } from './workers/createPool.ts';

const redact = ['req.headers.cookie', 'req.headers.authorization', 'req.headers["x-csrf-token"]'];

/** The parts of the application around an open database. */
export function createDeps(env: Env, dataSource: DataSource): AppDeps {
  return {
    env,
    dataSource,
    log: pino({ level: env.logLevel, redact }),
    clock: () => new Date(),
    work: createPool({ file: 'analysisWorker', threads: 2, queue: 40, deadline: 60_000 }),
    passwords: createPool({ file: 'passwordWorker', threads: 2, queue: 40, deadline: 20_000 }),
    stopping: { now: false },
  };
}
