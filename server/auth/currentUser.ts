import type { Request } from 'express';
import type { DataSource } from 'typeorm';
import type { SessionUser } from '../../shared/schemas/session.ts';
import { User } from '../entities/User.ts';
import { toSessionUser } from '../presenters/toSessionUser.ts';

/** The signed-in person, read from the database on every request: a role taken away acts at once. */
export async function currentUser(
  request: Request,
  dataSource: DataSource,
): Promise<SessionUser | null> {
  const id = request.session?.userId;
  if (id === undefined) return null;
  const user = await dataSource.getRepository(User).findOneBy({ id, status: 'active' });
  return user === null ? null : toSessionUser(user);
}
