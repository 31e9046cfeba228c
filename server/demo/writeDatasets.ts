import { mkdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { messyLog } from './messyLog.ts';
import { demoScenario } from './scenario.ts';

/**
 * `npm run demo:datasets`: writes the demo's logs and the messy one to datasets/, for trying the
 * upload by hand. The same seeds give the same files.
 */
const folder = path.resolve(import.meta.dirname, '../../datasets');

await mkdir(folder, { recursive: true });
const logs = demoScenario().flatMap((demo) => demo.logs);
for (const { fileName, text } of logs) await writeFile(path.join(folder, fileName), text);
const messy = messyLog();
await writeFile(path.join(folder, messy.fileName), messy.bytes);
console.log(`${logs.length + 1} logs written to datasets/`);
