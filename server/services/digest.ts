import { createHash } from 'node:crypto';

/** SHA-256 over canonical JSON: object keys sorted, so that equal content has one digest. */
export function digestOf(value: unknown): string {
  return createHash('sha256').update(JSON.stringify(value, sortKeys)).digest('hex');
}

function sortKeys(_key: string, value: unknown): unknown {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return value;
  return Object.fromEntries(Object.entries(value).toSorted(([a], [b]) => (a < b ? -1 : 1)));
}
