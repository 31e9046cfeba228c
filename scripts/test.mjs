/**
 * `npm test`: set-up included, then every test. Ends with "N passed, N failed" alone on a line.
 * Further arguments go to vitest: `npm test -- --project shared`.
 */
import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { ensureDebianPackages } from './lib/debianPackages.mjs';
import { ensureBuild, ensureNodeModules } from './lib/prepare.mjs';
import { runChild, SetUpError } from './lib/run.mjs';

process.chdir(path.resolve(import.meta.dirname, '..'));
const report = '.cache/tests.json';

async function main() {
  ensureDebianPackages({ browser: true });
  ensureNodeModules();
  ensureBuild();
  mkdirSync(path.dirname(report), { recursive: true });
  rmSync(report, { force: true });
  const args = ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  const { ended } = runChild(
    process.execPath,
    ['node_modules/vitest/vitest.mjs', ...args, ...process.argv.slice(2)],
    { env: process.stdout.isTTY ? process.env : { ...process.env, NO_COLOR: '1' } },
  );
  const code = await ended;
  const { numPassedTests: passed, numFailedTests: failed } = JSON.parse(
    readFileSync(report, 'utf8'),
  );
  console.log(`\n${passed} passed, ${failed} failed`);
  // A file that could not even be loaded fails no test, but it fails the run.
  process.exitCode = code !== 0 || failed > 0 || passed === 0 ? 1 : 0;
}

main().catch((error) => {
  console.error(error instanceof SetUpError ? `\n${error.message}\n` : error);
  console.log('\n0 passed, 1 failed');
  process.exitCode = 1;
});
