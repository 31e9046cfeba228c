import type { Logger } from 'pino';
import type { DataSource } from 'typeorm';
import type { Env } from './env.ts';
import type { WorkPool } from './workers/createPool.ts';

/** What the application is made of; tests put their own in. */
export type AppDeps = {
  env: Env;
  dataSource: DataSource;
  log: Logger;
  /** Present time; the database's own clock dates the events. */
  clock: () => Date;
  /** Analyses and log reading. */
  work: WorkPool;
  /** Password hashing: its own two threads, so that it never waits for an analysis. */
  passwords: WorkPool;
  /** Set by the stop signal: `/readyz` answers 503 from then on. */
  stopping: { now: boolean };
};
