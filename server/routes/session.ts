import type { Request } from 'express';
import { rateLimit } from 'express-rate-limit';
import { sessionSchema, signInSchema } from '../../shared/schemas/session.ts';
import type { AppDeps } from '../appDeps.ts';
import { newToken } from '../auth/csrf.ts';
import { sessionCookieName } from '../auth/sessionMiddleware.ts';
import { FailureThrottle } from '../auth/FailureThrottle.ts';
import { isTooLong } from '../auth/passwordRules.ts';
import { createPassport } from '../auth/signInStrategy.ts';
import { type SessionStore } from '../auth/SessionStore.ts';
import type { User } from '../entities/User.ts';
import { defineRoute, type ApiRoute } from '../http/defineRoute.ts';
import { ProblemError, tooMany } from '../http/problem.ts';
import { requestIdOf } from '../http/requestIdOf.ts';
import { toSessionUser } from '../presenters/toSessionUser.ts';
import { recordEvent } from '../services/recordEvent.ts';

const failuresPerMinute = 10;

/** Signing in, signing out, and who am I. */
export function sessionRoutes(deps: AppDeps, store: SessionStore): ApiRoute[] {
  const passport = createPassport(deps);
  const throttle = new FailureThrottle(failuresPerMinute, 60_000, deps.clock);

  async function authenticate(request: Request, email: string): Promise<User> {
    const key = email.trim().toLowerCase();
    const wait = throttle.retryAfter(key);
    if (wait > 0) throw tooMany(`Too many failed attempts. Try again in ${wait} s.`, wait);
    const user = await new Promise<User | false>((resolve, reject) => {
      const done = (error: Error | null, found: User | false) =>
        error ? reject(error) : resolve(found);
      const attempt = passport.authenticate('local', { session: false }, done) as (
        request: Request,
        response: unknown,
        next: (error: unknown) => void,
      ) => void;
      attempt(request, request.res, reject);
    });
    if (user === false) {
      throttle.fail(key);
      await recordEvent(deps.dataSource.manager, {
        actor: null,
        action: 'sign-in refused',
        objectType: 'session',
        objectId: null,
        fixtureId: null,
        outcome: 'refused',
        summary: 'Wrong e-mail address or password',
        requestId: requestIdOf(request),
      });
      throw new ProblemError(401, 'Not signed in', 'The e-mail address or the password is wrong.');
    }
    throttle.clear(key);
    return user;
  }

  return [
    defineRoute({
      method: 'post',
      path: '/api/session',
      access: 'anyone',
      csrfExempt: true,
      summary: 'Sign in',
      body: signInSchema,
      answers: { 200: sessionSchema },
      before: [addressLimit()],
      async handle({ body, request }) {
        if (isTooLong(body.password)) {
          throw new ProblemError(
            401,
            'Not signed in',
            'The e-mail address or the password is wrong.',
          );
        }
        const user = await authenticate(request, body.email);
        await regenerate(request);
        await store.open(request.sessionID, user.id);
        request.session.userId = user.id;
        request.session.csrfToken = newToken();
        await recordEvent(deps.dataSource.manager, {
          actor: user,
          action: 'signed in',
          objectType: 'session',
          objectId: user.id,
          fixtureId: null,
          summary: `${user.name} signed in`,
          requestId: requestIdOf(request),
        });
        return {
          status: 200,
          body: { user: toSessionUser(user), csrfToken: request.session.csrfToken },
        };
      },
    }),
    defineRoute({
      method: 'get',
      path: '/api/session',
      access: 'anyone',
      summary: 'Who am I',
      answers: { 200: sessionSchema },
      handle({ user, request }) {
        // A visitor's token protects nothing; it is there so that every client can be written alike.
        const csrfToken = request.session.csrfToken ?? newToken();
        return Promise.resolve({ status: 200, body: { user, csrfToken } });
      },
    }),
    defineRoute({
      method: 'delete',
      path: '/api/session',
      access: 'anyone',
      summary: 'Sign out',
      answers: { 204: null },
      async handle({ user, request, response }) {
        await new Promise<void>((resolve, reject) => {
          request.session.destroy((error: Error | null) => (error ? reject(error) : resolve()));
        });
        if (user !== null) {
          response.clearCookie(sessionCookieName(deps.env), { path: '/' });
          await recordEvent(deps.dataSource.manager, {
            actor: user,
            action: 'signed out',
            objectType: 'session',
            objectId: user.id,
            fixtureId: null,
            summary: `${user.name} signed out`,
            requestId: requestIdOf(request),
          });
        }
        return { status: 204 };
      },
    }),
  ];
}

/** A wider limit per address, on failures only: one account's limit cannot see a spray over many. */
function addressLimit() {
  return rateLimit({
    windowMs: 15 * 60_000,
    limit: 200,
    skipSuccessfulRequests: true,
    standardHeaders: false,
    legacyHeaders: false,
    handler: () => {
      throw tooMany('Too many failed attempts from this address. Try again in 15 minutes.', 900);
    },
  });
}

function regenerate(request: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    request.session.regenerate((error: Error | null) => (error ? reject(error) : resolve()));
  });
}
