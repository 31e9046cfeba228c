import { spawn, spawnSync } from 'node:child_process';

/** A failure whose message is all the user needs to see. */
export class SetUpError extends Error {}

/** Runs a command to its end with its output shown; throws with what to do when it fails. */
export function run(command, args, options = {}) {
  const result = spawnSync(command, args, { stdio: 'inherit', ...options });
  if (result.error)
    throw new SetUpError(`${command} could not be started: ${result.error.message}`);
  if (result.status !== 0) {
    throw new SetUpError(`"${[command, ...args].join(' ')}" failed (exit ${result.status}).`);
  }
}

/** Runs a command quietly and returns its standard output; its standard error only on failure. */
export function output(command, args, options = {}) {
  const result = spawnSync(command, args, { encoding: 'utf8', ...options });
  if (result.error)
    throw new SetUpError(`${command} could not be started: ${result.error.message}`);
  if (result.status !== 0) {
    throw new SetUpError(`"${command} ${args[0] ?? ''}" failed: ${result.stderr.trim()}`);
  }
  return result.stdout;
}

export function isInstalled(command) {
  return spawnSync('sh', ['-c', `command -v ${command}`]).status === 0;
}

/** Starts a child and resolves with its exit code. */
export function runChild(command, args, options = {}) {
  const child = spawn(command, args, { stdio: 'inherit', ...options });
  const ended = new Promise((resolve) => {
    child.on('error', () => resolve(1));
    child.on('exit', (code, signal) => resolve(code ?? (signal === null ? 0 : 1)));
  });
  return { child, ended };
}

export function sleep(ms) {
  return new Promise((resolve) => setTimeout(resolve, ms));
}
