import { existsSync } from 'node:fs';
import { isInstalled, run, SetUpError } from './run.mjs';

const mariadb = { name: 'mariadb-server', present: () => mariadbd() !== null };
const chromium = { name: 'chromium', present: () => existsSync('/usr/bin/chromium') };

/** The server program, wherever Debian puts it; null when it is not installed. */
export function mariadbd() {
  return ['/usr/sbin/mariadbd', '/usr/bin/mariadbd'].find((file) => existsSync(file)) ?? null;
}

/**
 * Installs the Debian packages that are missing.
 *
 * @param options.browser - Chromium too, for the tests
 * @throws SetUpError with the exact command to run when this account may not install
 */
export function ensureDebianPackages({ browser = false } = {}) {
  const missing = (browser ? [mariadb, chromium] : [mariadb]).filter((wanted) => !wanted.present());
  if (missing.length === 0) return;
  const names = missing.map((wanted) => wanted.name);
  const byHand = `apt-get install -y --no-install-recommends ${names.join(' ')}`;
  if (!isInstalled('apt-get')) {
    throw new SetUpError(`Please install ${names.join(' and ')}; this is not a Debian system.`);
  }
  const sudo = process.getuid?.() === 0 ? [] : ['sudo', '-n'];
  if (sudo.length > 0 && !mayUseSudo()) {
    throw new SetUpError(
      `${names.join(' and ')} must be installed. Run this once:\n  sudo ${byHand}`,
    );
  }
  console.log(`Installing ${names.join(', ')} ...`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const [command, ...args] = [...sudo, 'apt-get'];
  run(command, [...args, 'update', '-qq'], { env });
  run(command, [...args, 'install', '-y', '-qq', '--no-install-recommends', ...names], { env });
}

function mayUseSudo() {
  try {
    run('sudo', ['-n', 'true'], { stdio: 'ignore' });
    return true;
  } catch {
    return false;
  }
}
