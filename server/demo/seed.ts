import type { Role } from '../../shared/access/roles.ts';
import type { AppDeps } from '../appDeps.ts';
import { User } from '../entities/User.ts';
import { createUser } from '../services/createUser.ts';
import type { Actor } from '../services/recordEvent.ts';

const password = 'hold-below-the-line';

/** Invented people, one a role; they exist only where demo data were seeded. */
const people: { email: string; name: string; role: Role }[] = [
  { email: 'engineer@tautline.example', name: 'Demo engineer', role: 'engineer' },
  { email: 'analyst@tautline.example', name: 'Demo analyst', role: 'analyst' },
  { email: 'manager@tautline.example', name: 'Demo manager', role: 'manager' },
  { email: 'admin@tautline.example', name: 'Demo administrator', role: 'administrator' },
];

/** Fills an empty database with the demo scenario, through the services that people use. */
export async function seedDemo(deps: AppDeps): Promise<void> {
  if ((await deps.dataSource.getRepository(User).count()) > 0) return;
  const actors = new Map<Role, Actor>();
  for (const { email, name, role } of people) {
    actors.set(role, await createUser(deps, { email, name, roles: [role], password }));
  }
}
