/** The fields that differ, before and after: what the event log keeps of a change. */
export function differences<T extends object>(
  before: T,
  after: T,
  ignored: (keyof T)[] = [],
): { before: Partial<T>; after: Partial<T> } {
  const old: Partial<T> = {};
  const now: Partial<T> = {};
  for (const key of Object.keys(after) as (keyof T)[]) {
    if (ignored.includes(key) || JSON.stringify(before[key]) === JSON.stringify(after[key]))
      continue;
    old[key] = before[key];
    now[key] = after[key];
  }
  return { before: old, after: now };
}
