import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import type { TestProject } from 'vitest/node';
import { instanceSecrets, startMariadb } from '../../scripts/lib/mariadb.mjs';

export type TestMariadb = {
  port: number;
  socket: string;
  passwords: { application: string; migration: string };
};

declare module 'vitest' {
  interface ProvidedContext {
    mariadb: TestMariadb;
  }
}

/** One MariaDB for all server tests, in a folder of its own that goes when they are done. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'tautline-test-'));
  const { port, socket, stop } = await startMariadb(folder, { durable: false });
  const { application, migration } = instanceSecrets(folder);
  project.provide('mariadb', { port, socket, passwords: { application, migration } });
  return async () => {
    await stop();
    rmSync(folder, { recursive: true, force: true });
  };
}
