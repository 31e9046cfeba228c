import { afterAll, beforeAll, expect, it } from 'vitest';
import { z } from 'zod';
import { analyse } from '../../shared/analyse.ts';
import {
  analysisRequestSchema,
  analysisResultSchema,
  type Boundary,
  type StoredAnalysis,
} from '../../shared/schemas/analysis.ts';
import type { Trial } from '../../shared/schemas/trial.ts';
import { defaultOptions, snapshot } from '../../server/services/currentBoundary.ts';
import { toAnalysisRequest } from '../../server/services/toAnalysisRequest.ts';
import { createTestServer, type Client, type TestServer } from '../helpers/server.ts';
import { enterExample, exampleLog } from '../helpers/examples.ts';

let server: TestServer;
let analyst: Client;
let id: number;
let at: string;

beforeAll(async () => {
  server = await createTestServer();
  analyst = await server.as('analyst');
  id = await enterExample(analyst);
  at = `/api/fixtures/${id}`;
  await analyst.upload(`${at}/logs`, exampleLog()).expect(201);
});

afterAll(() => server.close());

const bodyOf = <T>(answer: { body: unknown }): T => answer.body as T;
const boundary = async () => bodyOf<Boundary>(await analyst.get(`${at}/boundary`).expect(200));
const trial = { configuration: 'A', inertia: 8.1e-4, acceleration: 14.5, outcome: 'held' };

it('answers POST /api/analysis with what the core gives for the same body', async () => {
  const trials = [12, 13, 14, 15, 16, 17].map((acceleration, i) => ({
    ...trial,
    acceleration,
    outcome: i % 2 === 0 ? 'held' : 'slipped',
  }));
  const request = {
    trials,
    torquePerMu: 0.04,
    friction: { kinetic: { mean: 0.31, sd: 0.014, n: 8 }, static: { mean: 0.38, sd: 0.02, n: 8 } },
  };
  const answer = await analyst.send('post', '/api/analysis', request).expect(200);
  expect(answer.body).toEqual(
    JSON.parse(JSON.stringify(analyse(analysisRequestSchema.parse(request)))),
  );
  expect(analysisResultSchema.safeParse(answer.body).success).toBe(true);
});

it('names the field of what it cannot analyse', async () => {
  const cases: [string, object][] = [
    ['trials', { trials: [] }],
    ['trials.0.acceleration', { trials: [{ ...trial, acceleration: -1 }] }],
    ['trials.0.inertia', { trials: [{ ...trial, inertia: 0 }] }],
    ['trials.0.outcome', { trials: [{ ...trial, outcome: 'fine' }] }],
    ['trials.1.inertia', { trials: [trial, { ...trial, inertia: 9e-4 }] }],
    ['margin', { trials: [trial], margin: 1 }],
    ['target', { trials: [trial], target: 0.9 }],
    ['confidence', { trials: [trial], confidence: 0.4 }],
    ['tolerance', { trials: [trial], tolerance: 0 }],
    ['estimator', { trials: [trial], estimator: 'bayes' }],
    ['friction.kinetic.n', { trials: [trial], friction: { kinetic: { mean: 0.3, sd: 0, n: 0 } } }],
  ];
  for (const [path, body] of cases) {
    const answer = await analyst.send('post', '/api/analysis', body).expect(422);
    const { errors } = bodyOf<{ errors: { path: string }[] }>(answer);
    expect(
      errors.map((error) => error.path),
      path,
    ).toContain(path);
  }
});

it('takes twenty thousand trials and refuses one more', async () => {
  const many = Array.from({ length: 20_000 }, (_, i) => ({
    ...trial,
    acceleration: 10 + (i % 40) / 4,
    outcome: (i * 7919) % 40 < i % 40 ? 'slipped' : 'held',
  }));
  const answer = await analyst.send('post', '/api/analysis', { trials: many }).expect(200);
  expect(answer.body).toMatchObject({ counts: { trials: 20_000, levels: 40 } });
  const over = await analyst
    .send('post', '/api/analysis', { trials: [...many, trial] })
    .expect(422);
  expect(over.body).toMatchObject({ errors: [{ path: 'trials' }] });
});

it('keeps an analysis that equals the stateless one of the same data, and never changes it', async () => {
  const saved = bodyOf<StoredAnalysis>(
    await analyst.send('post', `${at}/analyses`, { note: 'first' }).expect(201),
  );
  const { request } = toAnalysisRequest(await snapshot(server.deps, id), defaultOptions);
  const stateless = bodyOf<{ notes: string[] }>(
    await analyst.send('post', '/api/analysis', request ?? {}).expect(200),
  );
  expect(saved).toMatchObject({
    ...stateless,
    notes: expect.arrayContaining(stateless.notes) as unknown,
  });
  const [first] = bodyOf<{ items: Trial[] }>(await analyst.get(`${at}/trials`)).items;
  await analyst
    .send('patch', `/api/trials/${first?.id}`, { version: 1, excluded: true, reason: 'not seated' })
    .expect(200);
  expect((await analyst.get(`/api/analyses/${saved.id}`).expect(200)).body).toEqual(saved);
  const list = await analyst.get(`${at}/analyses`).expect(200);
  expect(list.body).toMatchObject({ items: [{ id: saved.id, current: false }] });
  await analyst
    .send('patch', `/api/trials/${first?.id}`, {
      version: 2,
      excluded: false,
      reason: 'it was seated',
    })
    .expect(200);
});

it('gives the same digest for the same data, another after an exclusion, the first after restoring', async () => {
  const before = await boundary();
  expect((await boundary()).digest).toBe(before.digest);
  const [, second] = bodyOf<{ items: Trial[] }>(await analyst.get(`${at}/trials`)).items;
  if (second === undefined) throw new Error('the example has trials');
  const change = (version: number, excluded: boolean) =>
    analyst.send('patch', `/api/trials/${second.id}`, { version, excluded, reason: 'a test' });
  await change(1, true).expect(200);
  const without = await boundary();
  expect(without.digest).not.toBe(before.digest);
  expect(without).toMatchObject({ excluded: 1, result: { counts: { trials: 23 } } });
  await change(1, true).expect(409);
  await change(2, false).expect(200);
  expect((await boundary()).digest).toBe(before.digest);
});

it('needs a reason to exclude a trial', async () => {
  for (const reason of ['', '  ', 'x']) {
    const body = { version: 1, excluded: true, reason };
    const answer = await analyst.send('patch', '/api/trials/3', body).expect(422);
    expect(answer.body).toMatchObject({ errors: [{ path: 'reason' }] });
  }
});

it('says what to do while there is nothing to analyse', async () => {
  const empty = await enterExample(analyst, 'EX-2');
  const answer = bodyOf<Boundary>(await analyst.get(`/api/fixtures/${empty}/boundary`).expect(200));
  expect(answer.result).toBeNull();
  expect(answer.reason).toMatch(/upload a log/);
  const refused = await analyst.send('post', `/api/fixtures/${empty}/analyses`, {}).expect(422);
  expect(refused.body).toMatchObject({ errors: [{ path: 'trials' }] });
});

it('answers every GET in the shape it declares', async () => {
  for (const route of server.routes.filter(({ method }) => method === 'get')) {
    const schema = route.answers[200];
    const path = route.path.replace(':id', '1');
    const answer = await analyst.get(path).expect(200);
    if (!schema) continue;
    const parsed = schema.safeParse(answer.body);
    expect(parsed.success ? '' : `${path}: ${z.prettifyError(parsed.error)}`).toBe('');
  }
});

it('keeps numbers bit for bit from the log to the answer', async () => {
  const fresh = await enterExample(analyst, 'EX-3');
  const numbers = ['97.30000000000001', '0.1', '123.45678901234567', '1e-3', '99.99999999999999'];
  const rows = numbers.map((number) => `20,${number},held`).join('\n');
  await analyst
    .upload(`/api/fixtures/${fresh}/logs`, `position,acceleration [rad/s²],outcome\n${rows}\n`)
    .expect(201);
  const list = bodyOf<{ items: Trial[] }>(await analyst.get(`/api/fixtures/${fresh}/trials`));
  expect(list.items.map(({ acceleration }) => acceleration)).toEqual(numbers.map(Number));
});
