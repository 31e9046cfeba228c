import type { SessionUser } from '../../shared/schemas/session.ts';
import type { User } from '../entities/User.ts';

export function toSessionUser(user: User): SessionUser {
  return { id: user.id, name: user.name, email: user.email, roles: user.roles };
}
