import type { Role } from './roles.ts';

const everyone: readonly Role[] = ['engineer', 'analyst', 'manager', 'administrator'];
const bench: readonly Role[] = ['engineer', 'analyst'];

/**
 * Who may do what: the one table. The server enforces it on every route; the client hides with
 * it what would be refused.
 */
export const permissions = {
  read: everyone,
  editFixtures: bench,
  uploadLogs: bench,
  excludeTrials: bench,
  planTrials: bench,
  saveAnalyses: ['analyst'],
  draftSheets: ['analyst'],
  releaseSheets: ['manager'],
  closeWatchItems: ['analyst', 'manager'],
  managePeople: ['administrator'],
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof permissions;

/** Whether any of the held roles grants the permission. */
export function may(held: readonly Role[], permission: Permission): boolean {
  const granted: readonly Role[] = permissions[permission];
  return held.some((role) => granted.includes(role));
}
