import { spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import type { TestProject } from 'vitest/node';
import { freePort } from '../../scripts/lib/mariadb.mjs';

declare module 'vitest' {
  interface ProvidedContext {
    productUrl: string;
  }
}

const patience = 120_000;

/** The product itself, as `npm start` runs it, with demo data in a folder of its own. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'tautline-product-'));
  const port: number = await freePort();
  const child = spawn(process.execPath, ['scripts/start.mjs'], {
    env: {
      ...process.env,
      PORT: String(port),
      TAUTLINE_DATA_DIR: folder,
      NODE_ENV: undefined,
      VITEST: undefined,
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let said = '';
  const ended = new Promise<void>((resolve) => child.once('exit', () => resolve()));
  await new Promise<void>((resolve, reject) => {
    const timer = setTimeout(
      () => reject(new Error(`the product did not start:\n${said}`)),
      patience,
    );
    const listen = (chunk: Buffer) => {
      said += chunk.toString();
      if (said.includes('Tautline listens on')) {
        clearTimeout(timer);
        resolve();
      }
    };
    child.stdout.on('data', listen);
    child.stderr.on('data', listen);
    child.once('exit', () => reject(new Error(`the product ended:\n${said}`)));
  });
  project.provide('productUrl', `http://127.0.0.1:${port}`);
  return async () => {
    child.kill('SIGTERM');
    await ended;
    rmSync(folder, { recursive: true, force: true });
  };
}
