import passport from 'passport';
import { Strategy } from 'passport-local';
import type { AppDeps } from '../appDeps.ts';
import { User } from '../entities/User.ts';
import { isTooLong } from './passwordRules.ts';

/** A well-formed hash of nothing: an unknown address costs as much time as a wrong password. */
const nobodysHash = new Map<number, string>();

async function decoyHash(deps: AppDeps): Promise<string> {
  const cost = deps.env.bcryptCost;
  const known = nobodysHash.get(cost);
  if (known !== undefined) return known;
  const made = await deps.passwords.run<string>('hash', { password: 'nobody at all', cost });
  nobodysHash.set(cost, made);
  return made;
}

/** The person with this address and password, or null. Takes the same time either way. */
export async function verifyPassword(
  deps: AppDeps,
  email: string,
  password: string,
): Promise<User | null> {
  const user = await deps.dataSource
    .getRepository(User)
    .findOneBy({ email: email.trim().toLowerCase() });
  const hash = user?.passwordHash ?? (await decoyHash(deps));
  const matches = await deps.passwords.run<boolean>('compare', { password, hash });
  if (!matches || user === null || user.status !== 'active' || isTooLong(password)) return null;
  await refreshHash(deps, user, password);
  return user;
}

/** A hash of an older, lower cost is made anew while the password is at hand. */
async function refreshHash(deps: AppDeps, user: User, password: string): Promise<void> {
  const cost = Number(user.passwordHash.split('$')[2]);
  if (cost >= deps.env.bcryptCost) return;
  const passwordHash = await deps.passwords.run<string>('hash', {
    password,
    cost: deps.env.bcryptCost,
  });
  await deps.dataSource.getRepository(User).update({ id: user.id }, { passwordHash });
}

/** Registers the one way in: e-mail and password, from a JSON body only. */
export function createPassport(deps: AppDeps): passport.Authenticator {
  const instance = new passport.Passport();
  instance.use(
    new Strategy({ usernameField: 'email', passwordField: 'password' }, (email, password, done) => {
      verifyPassword(deps, email, password).then(
        (user) => done(null, user ?? false),
        (error: unknown) => done(error),
      );
    }),
  );
  return instance;
}
