import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { sleep } from './run.mjs';

const fileOf = (folder) => path.join(folder, 'server.pid');

/** Notes which server works on this folder. */
export function noteServer(folder, pid) {
  writeFileSync(fileOf(folder), String(pid), { mode: 0o600 });
}

export function forgetServer(folder) {
  rmSync(fileOf(folder), { force: true });
}

/** Ends a server that a killed starter left behind on this folder; anything else is let be. */
export async function stopLeftover(folder) {
  if (!existsSync(fileOf(folder))) return;
  const pid = Number(readFileSync(fileOf(folder), 'utf8'));
  if (isServer(pid)) {
    console.log('Stopping the server that an earlier start left behind ...');
    process.kill(pid, 'SIGTERM');
    while (isServer(pid)) await sleep(50);
  }
  forgetServer(folder);
}

/** Whether the pid is a server of ours: the number may have been given to something else. */
function isServer(pid) {
  try {
    return /server\/main\.(js|ts)/.test(readFileSync(`/proc/${pid}/cmdline`, 'utf8'));
  } catch {
    return false;
  }
}
