import { readFile, readdir } from 'node:fs/promises';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { messyLog } from '../../../server/demo/messyLog.ts';
import { demoScenario } from '../../../server/demo/scenario.ts';

const folder = path.resolve(import.meta.dirname, '../../../datasets');

describe('datasets/', () => {
  it('holds the logs of the demo as they are generated (else: npm run demo:datasets)', async () => {
    for (const { fileName, text } of demoScenario().flatMap(({ logs }) => logs)) {
      expect(await readFile(path.join(folder, fileName), 'utf8'), fileName).toBe(text);
    }
    const { fileName, bytes } = messyLog();
    expect(Uint8Array.from(await readFile(path.join(folder, fileName)))).toEqual(bytes);
  });

  it('holds no log that the demo does not know', async () => {
    const known = new Set([
      messyLog().fileName,
      ...demoScenario().flatMap(({ logs }) => logs.map(({ fileName }) => fileName)),
    ]);
    const strays = (await readdir(folder)).filter(
      (name) => /_\d{4}-\d{2}-\d{2}\.csv$/.test(name) && !known.has(name),
    );
    expect(strays).toEqual([]);
  });
});
