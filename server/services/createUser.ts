import type { AppDeps } from '../appDeps.ts';
import type { Role } from '../../shared/access/roles.ts';
import { passwordProblem } from '../auth/passwordRules.ts';
import { User } from '../entities/User.ts';
import { errorNumber, inTransaction } from '../database/inTransaction.ts';
import { invalid } from '../http/problem.ts';
import { recordEvent, type Actor } from './recordEvent.ts';

export type NewUser = { email: string; name: string; roles: Role[]; password: string };

const duplicateKey = 1062;

/**
 * Adds a person who can sign in.
 *
 * @throws ProblemError 422 that names the field: address taken, or password refused
 */
export async function createUser(
  deps: Pick<AppDeps, 'dataSource' | 'passwords' | 'env'>,
  person: NewUser,
  actor: Actor | null = null,
): Promise<Actor> {
  const problem = passwordProblem(person.password, person);
  if (problem !== null) throw invalid([{ path: 'password', message: problem }]);
  const email = person.email.trim().toLowerCase();
  const passwordHash = await deps.passwords.run<string>('hash', {
    password: person.password,
    cost: deps.env.bcryptCost,
  });
  return inTransaction(deps.dataSource, async (manager) => {
    const { name, roles } = person;
    const id = await manager
      .insert(User, {
        email,
        name,
        roles,
        status: 'active',
        passwordHash,
        version: 1,
        createdAt: new Date(),
      })
      .then((result) => Number(result.identifiers[0]?.id))
      .catch((error: unknown) => {
        if (errorNumber(error) !== duplicateKey) throw error;
        throw invalid([{ path: 'email', message: 'is taken by another account' }]);
      });
    await recordEvent(manager, {
      actor,
      action: 'person added',
      objectType: 'user',
      objectId: id,
      fixtureId: null,
      summary: `${name} was added as ${roles.join(', ')}`,
      after: { email, name, roles },
    });
    return { id, name };
  });
}
