/**
 * Starts Tautline, set-up included. Plain Node: it runs before anything is installed.
 *
 *   npm start                   the product with demo data
 *   npm run dev                 the same from the sources, with hot reload
 *   npm run start:production    no demo data; needs TAUTLINE_SESSION_SECRET
 */
import path from 'node:path';
import { accountsSql, databaseEnv, grantsSql, migrationEnv } from './lib/accounts.mjs';
import { ensureDebianPackages } from './lib/debianPackages.mjs';
import { instanceSecrets, startMariadb } from './lib/mariadb.mjs';
import { ensureBuild, ensureNodeModules } from './lib/prepare.mjs';
import { forgetServer, noteServer, stopLeftover } from './lib/leftover.mjs';
import { run, runChild, SetUpError, sleep } from './lib/run.mjs';

process.chdir(path.resolve(import.meta.dirname, '..'));

const production = process.argv.includes('--production');
const development = process.argv.includes('--dev');
const administrator = process.argv.indexOf('--create-administrator');
const dataFolder = path.resolve(process.env.TAUTLINE_DATA_DIR ?? '.data');
const port = process.env.PORT ?? '4173';
const database = 'tautline';

const tsx = ['--import', 'tsx'];
const program = (name) =>
  development ? [...tsx, `server/${name}.ts`] : [`dist/server/${name}.js`];

async function main() {
  if (production) refuseWithoutSecret();
  ensureDebianPackages();
  ensureNodeModules();
  if (!development) ensureBuild();

  await stopLeftover(dataFolder);
  const mariadb = await startMariadb(dataFolder);
  const stopFirst = { child: null };
  for (const signal of ['SIGINT', 'SIGTERM']) {
    // A terminal sends SIGINT to the server too; it ignores the second signal.
    process.on(signal, () => stopFirst.child?.kill('SIGTERM'));
  }
  try {
    process.exitCode = await serve(mariadb, stopFirst);
  } finally {
    await mariadb.stop();
  }
}

async function serve(mariadb, stopFirst) {
  const secrets = instanceSecrets(dataFolder);
  const env = {
    ...process.env,
    ...databaseEnv(mariadb.port, database, secrets),
    PORT: port,
    NODE_ENV: production ? 'production' : 'development',
    TAUTLINE_DEMO: production ? '0' : '1',
    TAUTLINE_DEV: development ? '1' : '0',
    TAUTLINE_LOG_LEVEL: process.env.TAUTLINE_LOG_LEVEL ?? (production ? 'info' : 'warn'),
    TAUTLINE_SESSION_SECRET: process.env.TAUTLINE_SESSION_SECRET ?? secrets.session,
  };
  mariadb.sql(accountsSql(database, secrets));
  run(process.execPath, program('migrate'), { env: { ...env, ...migrationEnv(secrets) } });
  mariadb.sql(grantsSql(database));

  if (administrator > 0) {
    const args = process.argv.slice(administrator + 1);
    run(process.execPath, [...program('createAdministrator'), ...args], { env });
    return 0;
  }
  const { child, ended } = runChild(process.execPath, program('main'), { env });
  stopFirst.child = child;
  noteServer(dataFolder, child.pid);
  void ready(ended).then((isReady) => {
    if (isReady) (production ? printFirstAdministrator : printSignIns)();
  });
  const code = await ended;
  forgetServer(dataFolder);
  return code;
}

/** Waits for the server to answer; false when it ends first. */
async function ready(ended) {
  let over = false;
  void ended.then(() => (over = true));
  while (!over) {
    const answer = await fetch(`http://127.0.0.1:${port}/readyz`).catch(() => null);
    if (answer?.ok) return !over;
    await sleep(100);
  }
  return false;
}

function printSignIns() {
  console.log(`
  Open http://127.0.0.1:${port}   (Ctrl-C stops everything)

  Demo sign-ins, all with the password hold-below-the-line:
    engineer@tautline.example   uploads trials
    analyst@tautline.example    judges the boundary
    manager@tautline.example    sees every fixture
    admin@tautline.example      looks after people
`);
}

function printFirstAdministrator() {
  console.log(`
  Tautline on port ${port}, without demo data.
  The first administrator (stop this first, the same environment):
    npm run create-administrator -- --email you@plant.example --name "Your Name"
`);
}

function refuseWithoutSecret() {
  const secrets = (process.env.TAUTLINE_SESSION_SECRET ?? '').split(',').filter((s) => s !== '');
  if (secrets.length === 0 || secrets.some((secret) => Buffer.byteLength(secret) < 32)) {
    throw new SetUpError(
      'TAUTLINE_SESSION_SECRET is missing or shorter than 32 bytes. Make one and keep it:\n' +
        "  export TAUTLINE_SESSION_SECRET=$(node -e \"console.log(require('crypto').randomBytes(32).toString('base64url'))\")",
    );
  }
}

main().catch((error) => {
  console.error(error instanceof SetUpError ? `\n${error.message}\n` : error);
  process.exitCode = 1;
});
