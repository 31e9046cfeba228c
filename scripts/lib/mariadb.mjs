import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import {
  existsSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  statfsSync,
  writeFileSync,
} from 'node:fs';
import net from 'node:net';
import os from 'node:os';
import path from 'node:path';
import { mariadbd } from './debianPackages.mjs';
import { output, SetUpError, sleep } from './run.mjs';

const strictMode =
  'STRICT_TRANS_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ZERO_DATE,NO_ZERO_IN_DATE,NO_ENGINE_SUBSTITUTION';
/** Acknowledged commits need not survive a crash of a database that lives for one test run. */
const fast = ['--innodb-flush-log-at-trx-commit=0', '--skip-innodb-doublewrite'];
const leastFreeBytes = 500 * 1024 * 1024;
const asRoot = () => (process.getuid?.() === 0 ? ['--user=root'] : []);

/**
 * A private MariaDB on loopback with its data below `folder`. A server that a killed starter left
 * behind is adopted, not fought: a second one on the same data would wait 30 s and fail.
 *
 * @param options.durable - false only for tests
 * @returns {Promise<{port: number, pid: number, socket: string, sql: (text: string) => string, stop: () => Promise<void>}>}
 */
export async function startMariadb(folder, { durable = true } = {}) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const free = statfsSync(folder);
  if (free.bavail * free.bsize < leastFreeBytes) {
    throw new SetUpError(`Less than 500 MB are free below ${folder}: make room first.`);
  }
  const files = {
    data: path.join(folder, 'mariadb'),
    pid: path.join(folder, 'mariadb.pid'),
    state: path.join(folder, 'mariadb.json'),
    log: path.join(folder, 'mariadb.log'),
  };
  const left = await adopt(files);
  if (left !== null) return left;
  if (!existsSync(path.join(files.data, 'mysql'))) createDataFolder(files.data);

  // Socket paths end at 107 characters; the project's own path may be longer.
  const socket = path.join(mkdtempSync(path.join(os.tmpdir(), 'tl-')), 's');
  const port = await portFor(files.state);
  const child = spawn(
    mariadbd(),
    [
      '--no-defaults',
      ...asRoot(),
      `--datadir=${path.resolve(files.data)}`,
      `--socket=${socket}`,
      `--pid-file=${path.resolve(files.pid)}`,
      '--bind-address=127.0.0.1',
      `--port=${port}`,
      '--skip-name-resolve',
      '--character-set-server=utf8mb4',
      '--collation-server=utf8mb4_unicode_ci',
      '--default-time-zone=+00:00',
      `--sql-mode=${strictMode}`,
      '--innodb-snapshot-isolation=ON',
      '--innodb-lock-wait-timeout=5',
      '--max-statement-time=120',
      '--max-allowed-packet=64M',
      '--innodb-buffer-pool-size=256M',
      `--log-error=${path.resolve(files.log)}`,
      ...(durable ? ['--innodb-flush-log-at-trx-commit=1'] : fast),
    ],
    { detached: true, stdio: 'ignore' },
  );
  child.unref();
  writeFileSync(files.state, JSON.stringify({ pid: child.pid, port, socket }), { mode: 0o600 });
  return ready({ pid: child.pid, port, socket }, files.log);
}

/** The port of last time where it is still free: a server that waits for its database finds it again. */
async function portFor(stateFile) {
  if (!existsSync(stateFile)) return freePort();
  const { port } = JSON.parse(readFileSync(stateFile, 'utf8'));
  return freePort(port).catch(() => freePort());
}

/** A server of ours that still runs on this data, from the state file; null when there is none. */
async function adopt(files) {
  if (!existsSync(files.state)) return null;
  const state = JSON.parse(readFileSync(files.state, 'utf8'));
  if (!isMariadb(state.pid)) return null;
  return ready(state, files.log);
}

/** Whether the pid is a running MariaDB: the number may have been given to something else. */
function isMariadb(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes('mariadbd');
  } catch {
    return false;
  }
}

async function ready({ pid, port, socket }, log) {
  const sql = (text) => sqlOver(socket, text);
  for (let tries = 0; ; tries += 1) {
    try {
      sql('SELECT 1');
      break;
    } catch {
      if (!isMariadb(pid) || tries > 600) {
        throw new SetUpError(`MariaDB did not start; its log is ${log}.`);
      }
      await sleep(25);
    }
  }
  return { port, pid, socket, sql, stop: () => stop(pid) };
}

/** Runs statements as the database's root, who can come in by this socket only. */
export function sqlOver(socket, text) {
  return output('mariadb', ['--no-defaults', `--socket=${socket}`, '-N', '-B'], { input: text });
}

/** SIGTERM, then wait: InnoDB writes out what is in memory. */
async function stop(pid) {
  if (!isMariadb(pid)) return;
  process.kill(pid, 'SIGTERM');
  while (isMariadb(pid)) await sleep(25);
}

function createDataFolder(folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  output('mariadb-install-db', [
    '--no-defaults',
    ...asRoot(),
    `--datadir=${path.resolve(folder)}`,
    '--auth-root-authentication-method=socket',
    `--auth-root-socket-user=${os.userInfo().username}`,
    '--skip-test-db',
    '--skip-name-resolve',
  ]);
}

/**
 * A port that nobody listens on right now.
 *
 * @param {number} wanted - 0 = any
 * @returns {Promise<number>}
 */
export function freePort(wanted = 0) {
  return new Promise((resolve, reject) => {
    const probe = net.createServer();
    probe.on('error', reject);
    probe.listen(wanted, '127.0.0.1', () => {
      const { port } = probe.address();
      probe.close(() => resolve(port));
    });
  });
}

/**
 * Secrets of an instance, made once and kept in its data folder, readable by its owner only.
 *
 * @returns {{session: string, application: string, migration: string}}
 */
export function instanceSecrets(folder) {
  const file = path.join(folder, 'secrets.json');
  if (!existsSync(file)) {
    const secret = () => randomBytes(32).toString('base64url');
    const made = { session: secret(), application: secret(), migration: secret() };
    writeFileSync(file, JSON.stringify(made), { mode: 0o600 });
  }
  return JSON.parse(readFileSync(file, 'utf8'));
}
