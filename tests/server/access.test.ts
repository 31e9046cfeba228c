import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { roles, type Role } from '../../shared/access/roles.ts';
import type { ApiRoute } from '../../server/http/defineRoute.ts';
import { createTestServer, type Client, type TestServer } from '../helpers/server.ts';
import { enterExample, exampleLog } from '../helpers/examples.ts';
import { expectedAccess } from './expectedAccess.ts';

let server: TestServer;
let closed: ApiRoute[];

const nameOf = ({ method, path }: ApiRoute) => `${method.toUpperCase()} ${path}`;
const pathOf = ({ path }: ApiRoute) => path.replace(':id', '1');
const pairs = roles.flatMap((a, i) => roles.slice(i + 1).map((b): Role[] => [a, b]));
const people: Role[][] = [...roles.map((role): Role[] => [role]), ...pairs];

beforeAll(async () => {
  server = await createTestServer();
  const engineer = await server.as('engineer');
  const id = await enterExample(engineer);
  await engineer.upload(`/api/fixtures/${id}/logs`, exampleLog()).expect(201);
  closed = server.routes.filter((route) => route.access !== 'anyone');
});

afterAll(() => server.close());

function call(client: Client, route: ApiRoute) {
  const { agent, csrfToken } = client;
  return agent[route.method](pathOf(route)).set('X-CSRF-Token', csrfToken);
}

/** Everything but sessions and the event log, as one fingerprint. */
function stateOf(): string {
  const tables =
    'user, fixture, build_up, configuration, friction_test, trial_log, trial, analysis';
  return server.database.sql(`CHECKSUM TABLE ${tables}`);
}

it('has every route in the table, and no other', () => {
  expect(server.routes.map(nameOf).toSorted()).toEqual(Object.keys(expectedAccess).toSorted());
});

it('answers a visitor 401 everywhere but at the session', async () => {
  for (const route of closed) {
    const answer = await supertest(server.app)[route.method](pathOf(route));
    expect(answer.status, nameOf(route)).toBe(401);
  }
});

describe.each(people.map((held) => ({ held })))('with the roles $held', ({ held }) => {
  it('opens what the table says; a refusal changes nothing and leaves one event', async () => {
    const client = await server.as(...held);
    for (const route of closed) {
      const allowed = expectedAccess[nameOf(route)];
      const may = allowed === 'anyone' || held.some((role) => allowed?.includes(role));
      if (may) {
        // An empty body is refused as not valid, never as not allowed.
        if (route.method !== 'get') {
          const answer = await call(client, route);
          expect([400, 415, 422], nameOf(route)).toContain(answer.status);
        } else {
          const answer = await call(client, route);
          expect([200, 404], nameOf(route)).toContain(answer.status);
        }
        continue;
      }
      const before = stateOf();
      const refusals = Number(
        server.database.sql("SELECT COUNT(*) FROM event WHERE outcome = 'refused'"),
      );
      const answer = await call(client, route);
      expect(answer.status, nameOf(route)).toBe(403);
      expect(answer.type).toBe('application/problem+json');
      expect(stateOf()).toBe(before);
      const now = Number(
        server.database.sql("SELECT COUNT(*) FROM event WHERE outcome = 'refused'"),
      );
      expect(now - refusals, nameOf(route)).toBe(1);
    }
  });
});

it('refuses every unsafe call without the token, with a wrong one and with another session’s', async () => {
  const client = await server.as('analyst');
  const other = await server.as('engineer', 'analyst');
  const before = stateOf();
  for (const route of server.routes.filter(
    ({ method, csrfExempt }) => method !== 'get' && !csrfExempt,
  )) {
    for (const token of [undefined, 'x'.repeat(43), other.csrfToken]) {
      const unsafe = client.agent[route.method](pathOf(route));
      const answer = await (token === undefined ? unsafe : unsafe.set('X-CSRF-Token', token));
      expect(answer.status, `${nameOf(route)} with ${token}`).toBe(403);
    }
  }
  expect(stateOf()).toBe(before);
});

it('refuses calls that another origin or another site sent, signing in included', async () => {
  const client = await server.as('analyst');
  await client.send('post', '/api/fixtures', {}).set('Origin', 'https://evil.test').expect(403);
  await client.send('post', '/api/fixtures', {}).set('Sec-Fetch-Site', 'cross-site').expect(403);
  await supertest(server.app)
    .post('/api/session')
    .set('Origin', 'https://evil.test')
    .send({ email: 'a@test.example', password: 'whatever it is' })
    .expect(403);
});

it('takes no bearer token yet, and no token in the address', async () => {
  const call = supertest(server.app).post('/api/fixtures/1/logs?access_token=tl_x');
  await call.set('Authorization', 'Bearer tl_0000').expect(401);
});

it('answers another method 405 and names those there are', async () => {
  const client = await server.as('manager');
  const answer = await client.send('delete', '/api/fixtures/1').expect(405);
  expect(answer.get('Allow')).toBe('GET, PATCH');
});

it('refuses a manager’s upload before its bytes are read', async () => {
  const client = await server.as('manager');
  const big = Buffer.alloc(16 * 1024 * 1024, 'a');
  const answer = await client.upload('/api/fixtures/1/logs', big).catch((error: unknown) => error);
  // The connection may be closed while the client still sends; an answer, if it came, is 403.
  if (answer instanceof Error) expect(String(answer)).toMatch(/EPIPE|ECONNRESET|aborted/);
  else expect(answer).toMatchObject({ status: 403 });
  expect(server.database.sql('SELECT COUNT(*) FROM trial_log').trim()).toBe('1');
});
