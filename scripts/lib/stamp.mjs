import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';

/** SHA-256 over the names and contents of files and folders. */
export function fingerprint(roots) {
  const hash = createHash('sha256');
  for (const file of roots.flatMap(filesBelow)) {
    hash.update(file).update('\0').update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex');
}

/** Does the work unless the stamp says that it was done for this very fingerprint. */
export function onceFor(stampFile, value, work) {
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === value) return false;
  work();
  mkdirSync(path.dirname(stampFile), { recursive: true });
  writeFileSync(stampFile, value);
  return true;
}

function filesBelow(root) {
  if (!existsSync(root)) return [];
  if (statSync(root).isFile()) return [root];
  return readdirSync(root, { withFileTypes: true })
    .toSorted((a, b) => (a.name < b.name ? -1 : 1))
    .flatMap((entry) => filesBelow(path.join(root, entry.name)));
}
