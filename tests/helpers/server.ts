import type { Express } from 'express';
import supertest from 'supertest';
import type { Role } from '../../shared/access/roles.ts';
import type { AppDeps } from '../../server/appDeps.ts';
import { createApp } from '../../server/app.ts';
import { createDeps } from '../../server/createDeps.ts';
import { readEnv } from '../../server/env.ts';
import type { ApiRoute } from '../../server/http/defineRoute.ts';
import { createUser } from '../../server/services/createUser.ts';
import { boundPool } from '../../server/database/boundPool.ts';
import { createTestDatabase, type TestDatabase } from './database.ts';
import type { TestMariadb } from './databaseSetup.ts';

export const testPassword = 'nine calm turns of tape';

/** A signed-in client: the agent keeps the cookie, `send` adds the CSRF token. */
export type Client = {
  agent: ReturnType<typeof supertest.agent>;
  csrfToken: string;
  get: (path: string) => supertest.Test;
  send: (
    method: 'post' | 'put' | 'patch' | 'delete',
    path: string,
    body?: object,
  ) => supertest.Test;
  upload: (path: string, text: string | Buffer, name?: string, mapping?: object) => supertest.Test;
};

export type TestServer = {
  app: Express;
  routes: ApiRoute[];
  deps: AppDeps;
  database: TestDatabase;
  /** Signs in as somebody who holds just these roles. */
  as: (...roles: Role[]) => Promise<Client>;
  close: () => Promise<void>;
};

/** The application over a database of its own. `change` puts other parts in. */
export async function createTestServer(
  change: Partial<AppDeps> = {},
  mariadb?: TestMariadb,
): Promise<TestServer> {
  const database = await createTestDatabase(mariadb);
  const env = readEnv({
    NODE_ENV: 'test',
    TAUTLINE_DB_PORT: String(database.settings.port),
    TAUTLINE_DB_USER: database.settings.user,
    TAUTLINE_DB_PASSWORD: database.settings.password,
    TAUTLINE_SESSION_SECRET: 'a-test-is-allowed-to-know-its-key-others-are-not',
    TAUTLINE_BCRYPT_COST: '4',
    TAUTLINE_LOG_LEVEL: 'silent',
  });
  boundPool(database.dataSource);
  const deps: AppDeps = { ...createDeps(env, database.dataSource), ...change };
  const { express: app, routes } = createApp(deps);
  const known = new Map<string, Promise<unknown>>();
  return {
    app,
    routes,
    deps,
    database,
    async as(...roles) {
      const name = roles.join('-') || 'nobody';
      const email = `${name}@test.example`;
      const person = { email, name, roles, password: testPassword };
      if (!known.has(email)) known.set(email, createUser(deps, person));
      await known.get(email);
      return signIn(app, email);
    },
    async close() {
      await Promise.all([deps.work.close(), deps.passwords.close()]);
      await database.close();
    },
  };
}

export async function signIn(
  app: Express,
  email: string,
  password = testPassword,
): Promise<Client> {
  const agent = supertest.agent(app);
  const answer = await agent.post('/api/session').send({ email, password });
  if (answer.status !== 200) throw new Error(`sign-in answered ${answer.status}: ${answer.text}`);
  const { csrfToken } = answer.body as { csrfToken: string };
  return {
    agent,
    csrfToken,
    get: (path) => agent.get(path),
    send: (method, path, body) => {
      const call = agent[method](path).set('X-CSRF-Token', csrfToken);
      return body === undefined ? call : call.send(body);
    },
    upload: (path, text, name = 'log.csv', mapping) => {
      const call = agent.post(path).set('X-CSRF-Token', csrfToken);
      if (mapping !== undefined) void call.field('mapping', JSON.stringify(mapping));
      return call.attach('file', Buffer.from(text), name);
    },
  };
}
