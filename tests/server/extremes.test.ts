import { afterAll, beforeAll, expect, it } from 'vitest';
import { createTestServer, type Client, type TestServer } from '../helpers/server.ts';
import {
  enterExample,
  exampleBuildUp,
  exampleFixture,
  exampleFrictionTest,
  exampleLog,
} from '../helpers/examples.ts';

let server: TestServer;
let engineer: Client;
let id: number;

beforeAll(async () => {
  server = await createTestServer();
  engineer = await server.as('engineer', 'analyst');
  id = await enterExample(engineer);
  await engineer.upload(`/api/fixtures/${id}/logs`, exampleLog()).expect(201);
});

afterAll(() => server.close());

const extremes = [5e-324, 1e-308, 1e-13, 1e-12, 1e-6, 1e6, 1e12, 1e308, -1, 0];

/** Every number of a body replaced by the value, one at a time. */
function* mutations(body: object, value: number): Generator<{ place: string; body: object }> {
  const text = JSON.stringify(body);
  for (const match of text.matchAll(/(?<=[:[,])-?\d+(?:\.\d+)?(?=[,}\]])/g)) {
    const mutated =
      text.slice(0, match.index) + String(value) + text.slice(match.index + match[0].length);
    yield {
      place: text.slice(Math.max(0, match.index - 24), match.index),
      body: JSON.parse(mutated) as object,
    };
  }
}

/** What everybody reads; one fixture's odd numbers must not take it away. */
async function expectReadable(fixture: number, what: string): Promise<void> {
  const at = `/api/fixtures/${fixture}`;
  for (const path of [
    at,
    `${at}/boundary`,
    `${at}/friction-tests`,
    `${at}/configurations`,
    '/api/fixtures',
    '/api/overview',
  ]) {
    expect((await engineer.get(path)).status, `${path} after ${what}`).toBe(200);
  }
}

it('answers every read after any fixture that it accepted, however odd its numbers', async () => {
  let made = 0;
  for (const value of extremes) {
    for (const { place, body } of mutations(exampleFixture(), value)) {
      const code = `OD-${(made += 1)}`;
      const answer = await engineer.send('post', '/api/fixtures', { ...body, code });
      expect([201, 422], `${place}${value}`).toContain(answer.status);
      if (answer.status !== 201) continue;
      await expectReadable((answer.body as { id: number }).id, `${place}${value}`);
    }
  }
});

it('answers every read after any change of a fixture that has trials', async () => {
  const at = `/api/fixtures/${id}`;
  const version = async () => ((await engineer.get(at)).body as { version: number }).version;
  for (const value of extremes) {
    const fields = exampleFixture();
    for (const { place, body } of mutations(fields, value)) {
      const answer = await engineer.send('patch', at, { ...body, version: await version() });
      expect([200, 422], `${place}${value}`).toContain(answer.status);
      if (answer.status === 200) await expectReadable(id, `${place}${value}`);
    }
    await engineer
      .send('patch', at, { ...fields, code: 'EX-1', version: await version() })
      .expect(200);
    const content = exampleBuildUp(1);
    for (const { place, body } of mutations(content, value)) {
      const next = { ...body, version: await version() };
      const answer = await engineer.send('put', `${at}/build-up`, next);
      expect([200, 422], `${place}${value}`).toContain(answer.status);
      if (answer.status === 200) await expectReadable(id, `build-up ${place}${value}`);
    }
    await engineer.send('put', `${at}/build-up`, exampleBuildUp(await version())).expect(200);
    const measured = {
      label: `odd ${value}`,
      positionMm: 10,
      measuredInertia: { value, relativeUncertainty: 0.01, method: 'x' },
    };
    const added = await engineer.send('post', `${at}/configurations`, measured);
    expect([201, 422]).toContain(added.status);
    await expectReadable(id, `measured inertia ${value}`);
  }
});

it('answers every read after any friction test that it accepted', async () => {
  const at = `/api/fixtures/${id}/friction-tests`;
  for (const value of extremes) {
    for (const { place, body } of mutations(exampleFrictionTest('kinetic'), value)) {
      const answer = await engineer.send('post', at, body);
      expect([201, 422], `${place}${value}`).toContain(answer.status);
      if (answer.status !== 201) continue;
      await expectReadable(id, `${place}${value}`);
      const test = answer.body as { id: number };
      const exclude = { version: 1, excluded: true, reason: 'an odd reading' };
      await engineer.send('patch', `/api/friction-tests/${test.id}`, exclude).expect(200);
    }
  }
});

it('answers every read after a log of odd accelerations, and analyses odd bodies or refuses them', async () => {
  for (const value of extremes) {
    const log = `position,acceleration [rad/s²],outcome\n20,${value},held\n60,${value},slipped\n`;
    const answer = await engineer.upload(`/api/fixtures/${id}/logs`, log, `${value}.csv`);
    expect([201, 422], `log of ${value}`).toContain(answer.status);
    await expectReadable(id, `a log of ${value}`);
    const trials = [10, 11, 12, 13].map((acceleration, i) => ({
      ...{ configuration: 'A', inertia: 0.01, acceleration },
      outcome: i % 2 === 0 ? 'held' : 'slipped',
    }));
    const friction = { kinetic: { mean: 0.3, sd: 0.01, n: 5 } };
    const request = {
      trials,
      friction,
      torquePerMu: 1.5,
      drive: { maxAcceleration: 90, resolution: 0.1 },
    };
    for (const { place, body } of mutations(request, value)) {
      const analysed = await engineer.send('post', '/api/analysis', body);
      expect([200, 422], `${place}${value}`).toContain(analysed.status);
    }
  }
});
