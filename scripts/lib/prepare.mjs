import { run } from './run.mjs';
import { fingerprint, onceFor } from './stamp.mjs';

const built = ['shared', 'server', 'src', 'index.html', 'vite.config.ts', 'tsconfig.json'];

/** `npm ci`, unless node_modules was installed from this very lock file. */
export function ensureNodeModules() {
  onceFor('node_modules/.tautline-lock', fingerprint(['package-lock.json']), () => {
    console.log('Installing the packages of package-lock.json ...');
    run('npm', ['ci', '--no-audit', '--no-fund']);
  });
}

/** The production build, unless it was made from these very sources. */
export function ensureBuild() {
  const sources = fingerprint([...built, 'package-lock.json']);
  onceFor('dist/.tautline-sources', sources, () => {
    console.log('Building ...');
    run('npm', ['run', '--silent', 'build']);
  });
}
