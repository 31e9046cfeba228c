import { existsSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { Piscina } from 'piscina';
import { unavailable } from '../http/problem.ts';

export type WorkPool = {
  /** Runs a named task on a thread; 503 when the queue is full or the deadline passes. */
  run<Result>(task: string, input: unknown): Promise<Result>;
  close(): Promise<void>;
};

export type PoolOptions = {
  /** Worker file beside this one, without its ending. */
  file: 'analysisWorker' | 'passwordWorker';
  threads: number;
  queue: number;
  /** ms a task may take, waiting included. */
  deadline: number;
};

function workerFile(name: string): { filename: string; execArgv: string[] } {
  const source = fileURLToPath(new URL(`./${name}.ts`, import.meta.url));
  if (existsSync(source))
    return {
      filename: source,
      execArgv: ['--import', new URL('./registerTsx.mjs', import.meta.url).href],
    };
  return { filename: fileURLToPath(new URL(`./${name}.js`, import.meta.url)), execArgv: [] };
}

/** A bounded pool of worker threads. A thread that dies fails its task only; the pool heals. */
export function createPool(options: PoolOptions): WorkPool {
  const pool = new Piscina({
    ...workerFile(options.file),
    minThreads: 0,
    maxThreads: options.threads,
    maxQueue: options.queue,
    idleTimeout: 60_000,
    resourceLimits: { maxOldGenerationSizeMb: 512 },
  });
  // Without a listener an error between two tasks would end the process.
  pool.on('error', () => undefined);
  return {
    async run<Result>(task: string, input: unknown): Promise<Result> {
      try {
        return (await pool.run(input, {
          name: task,
          signal: AbortSignal.timeout(options.deadline),
        })) as Result;
      } catch (error) {
        if (isOverload(error)) throw unavailable('The server is busy. Try again in a moment.');
        throw error;
      }
    },
    close: () => pool.destroy(),
  };
}

function isOverload(error: unknown): boolean {
  if (!(error instanceof Error)) return false;
  return error.name === 'AbortError' || error.message === 'Task queue is at limit';
}
