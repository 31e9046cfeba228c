import { People1764500000001 } from './0001People.ts';
import { Fixtures1764500000002 } from './0002Fixtures.ts';

/** Every migration, oldest first. */
export const migrations = [People1764500000001, Fixtures1764500000002];
