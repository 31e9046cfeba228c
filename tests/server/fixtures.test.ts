import { afterAll, beforeAll, expect, it } from 'vitest';
import type { Fixture } from '../../shared/schemas/fixture.ts';
import { createTestServer, type Client, type TestServer } from '../helpers/server.ts';
import {
  enterExample,
  exampleBuildUp,
  exampleFixture,
  exampleFrictionTest,
} from '../helpers/examples.ts';

let server: TestServer;
let engineer: Client;

beforeAll(async () => {
  server = await createTestServer();
  engineer = await server.as('engineer');
});

afterAll(() => server.close());

const bodyOf = <T>(answer: { body: unknown }): T => answer.body as T;

it('creates a fixture, gives it back, and finds it by code, line and verdict', async () => {
  const created = bodyOf<Fixture>(
    await engineer.send('post', '/api/fixtures', exampleFixture('FX-1')).expect(201),
  );
  expect(created).toMatchObject({ version: 1, ...exampleFixture('FX-1') });
  const got = await engineer.get(`/api/fixtures/${created.id}`).expect(200);
  expect(got.body).toEqual(created);
  for (const query of [
    'search=fx-1',
    'line=Line%201&search=FX',
    'verdict=not%20checked&search=FX-1',
  ]) {
    const list = await engineer.get(`/api/fixtures?${query}`).expect(200);
    expect(bodyOf<{ items: { code: string }[] }>(list).items.map(({ code }) => code)).toContain(
      'FX-1',
    );
  }
  const none = await engineer.get('/api/fixtures?search=%25').expect(200);
  expect(bodyOf<{ total: number }>(none).total).toBe(0);
});

it('sorts and pages on the server', async () => {
  for (const code of ['PG-3', 'PG-1', 'PG-2']) {
    await engineer.send('post', '/api/fixtures', exampleFixture(code)).expect(201);
  }
  const codes = async (query: string) => {
    const list = await engineer.get(`/api/fixtures?search=PG-&${query}`).expect(200);
    return bodyOf<{ items: { code: string }[] }>(list).items.map(({ code }) => code);
  };
  expect(await codes('sort=code')).toEqual(['PG-1', 'PG-2', 'PG-3']);
  expect(await codes('sort=-code&pageSize=2')).toEqual(['PG-3', 'PG-2']);
  expect(await codes('sort=-code&pageSize=2&page=2')).toEqual(['PG-1']);
});

it('names the code when it is taken', async () => {
  await engineer.send('post', '/api/fixtures', exampleFixture('TK-1')).expect(201);
  const answer = await engineer.send('post', '/api/fixtures', exampleFixture('tk-1')).expect(422);
  expect(answer.body).toMatchObject({ errors: [{ path: 'code' }] });
});

it('refuses fields that are not the caller’s to set, on every write', async () => {
  const id = await enterExample(engineer, 'OW-1');
  const at = `/api/fixtures/${id}`;
  const position = { label: 'x', positionMm: 5, measuredInertia: null };
  const writes: ['post' | 'patch' | 'put', string, object][] = [
    ['post', '/api/fixtures', exampleFixture('OW-2')],
    ['patch', at, { version: 1, name: 'x' }],
    ['put', `${at}/build-up`, exampleBuildUp(1)],
    ['post', `${at}/configurations`, position],
    ['patch', '/api/configurations/1', { version: 1, label: 'y' }],
    ['post', `${at}/friction-tests`, exampleFrictionTest('static')],
    ['patch', '/api/trials/1', { version: 1, excluded: true, reason: 'a reason' }],
    ['post', `${at}/analyses`, {}],
    [
      'post',
      '/api/analysis',
      { trials: [{ configuration: 'A', inertia: 1, acceleration: 1, outcome: 'held' }] },
    ],
  ];
  for (const [method, path, body] of writes) {
    const client = path.endsWith('analyses') ? await server.as('analyst') : engineer;
    for (const field of ['id', 'sha256', 'dataVersion', 'createdBy', 'state', 'accepted']) {
      const answer = await client.send(method, path, { ...body, [field]: 1 });
      expect(answer.status, `${method} ${path} with ${field}`).toBe(422);
      expect(JSON.stringify(answer.body)).toContain(field);
    }
  }
});

it('refuses a stale change with the present state, and lets one of two at once through', async () => {
  const { id } = bodyOf<Fixture>(
    await engineer.send('post', '/api/fixtures', exampleFixture('ST-1')).expect(201),
  );
  const change = (name: string) =>
    engineer.send('patch', `/api/fixtures/${id}`, { version: 1, name });
  const [a, b] = await Promise.all([change('first'), change('second')]);
  expect([a.status, b.status].toSorted()).toEqual([200, 409]);
  const late = a.status === 409 ? a : b;
  expect(late.body).toMatchObject({ current: { version: 2 } });
  const now = bodyOf<Fixture>(await engineer.get(`/api/fixtures/${id}`));
  expect(now.version).toBe(2);
});

it('keeps every revision of a build-up and computes I(x) from its bodies', async () => {
  const id = await enterExample(engineer, 'BU-1');
  const at = `/api/fixtures/${id}/build-up`;
  const first = bodyOf<{ polynomial: number[]; totalMass: number; fixtureVersion: number }>(
    await engineer.get(at).expect(200),
  );
  // ½·2·0.05² + 2·½·0.4·0.015² fixed, 2·0.4·x² on the slide.
  expect(first.polynomial[0]).toBeCloseTo(0.0025 + 0.00009, 15);
  expect(first.polynomial[1]).toBe(0);
  expect(first.polynomial[2]).toBeCloseTo(0.8, 15);
  expect(first.totalMass).toBeCloseTo(2.8, 12);
  await engineer.send('put', at, exampleBuildUp(1)).expect(409);
  const heavier = exampleBuildUp(first.fixtureVersion);
  const [body] = heavier.bodies;
  const next = { ...heavier, bodies: [{ ...body, mass: 3 }] };
  expect((await engineer.send('put', at, next).expect(200)).body).toMatchObject({ revision: 2 });
  expect((await engineer.get(`${at}?revision=1`).expect(200)).body).toMatchObject({
    totalMass: first.totalMass,
    current: false,
  });
  await engineer.get(`${at}?revision=3`).expect(404);
});

it('computes the coefficients, mean, s and n of a friction test', async () => {
  const id = await enterExample(engineer, 'FR-1');
  const tests = await engineer.get(`/api/fixtures/${id}/friction-tests`).expect(200);
  expect(tests.body).toMatchObject({ kinetic: { n: 5 }, static: { n: 5 } });
  const { kinetic } = bodyOf<{ kinetic: { mean: number; sd: number } }>(tests);
  // 0.29, 0.30, 0.31, 0.305, 0.295
  expect(kinetic.mean).toBeCloseTo(0.3, 12);
  expect(kinetic.sd).toBeCloseTo(Math.sqrt(2.5e-4 / 4), 12);
  const bad = { ...exampleFrictionTest('static'), face: 'no such face' };
  const answer = await engineer.send('post', `/api/fixtures/${id}/friction-tests`, bad).expect(422);
  expect(answer.body).toMatchObject({ errors: [{ path: 'face' }] });
});

it('answers 404 for what is not there, and for ids that are no ids', async () => {
  for (const id of ['999999', '0', '-1', '1e3', ' 1', '1.0', 'abc', '99999999999', "1'--"]) {
    const path = `/api/fixtures/${encodeURIComponent(id)}`;
    expect((await engineer.get(path)).status, id).toBe(404);
    expect((await engineer.get(`${path}/trials`)).status, id).toBe(404);
  }
  await engineer
    .send('patch', '/api/trials/999999', { version: 1, excluded: true, reason: 'gone' })
    .expect(404);
});

it('refuses hostile queries at once', async () => {
  const hostile = [
    'sort=(select%20sleep(2))',
    'sort=code;drop%20table%20fixture',
    'page=0',
    'page=1e3',
    'pageSize=201',
    'verdict=fine',
    'unknown=1',
    'page=1&page=2',
    'search[]=x&search[]=y',
  ];
  for (const query of hostile) {
    const start = Date.now();
    const answer = await engineer.get(`/api/fixtures?${query}`);
    expect(answer.status, query).toBe(422);
    expect(Date.now() - start).toBeLessThan(1500);
  }
});

it('writes who did what, from which value to which', async () => {
  const id = await enterExample(engineer, 'EV-1');
  const fixture = bodyOf<Fixture>(await engineer.get(`/api/fixtures/${id}`));
  await engineer
    .send('patch', `/api/fixtures/${id}`, { version: fixture.version, name: 'Renamed' })
    .expect(200);
  const events = await engineer
    .get(`/api/fixtures/${id}/events?action=fixture%20changed`)
    .expect(200);
  expect(events.body).toMatchObject({
    total: 1,
    items: [
      {
        actor: 'engineer',
        before: { name: fixture.name },
        after: { name: 'Renamed' },
        outcome: 'done',
      },
    ],
  });
});
