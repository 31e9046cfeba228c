import { People1764500000001 } from './0001People.ts';

/** Every migration, oldest first. */
export const migrations = [People1764500000001];
