import { afterAll, beforeAll, expect, it } from 'vitest';
import { verdicts } from '../../shared/schemas/verdict.ts';
import { BoundaryCacheRow } from '../../server/entities/BoundaryCacheRow.ts';
import { seedDemo } from '../../server/demo/seed.ts';
import { createTestServer, signIn, type TestServer } from '../helpers/server.ts';

let server: TestServer;

beforeAll(async () => {
  server = await createTestServer();
  await seedDemo(server.deps);
});

afterAll(() => server.close());

const count = (table: string) => Number(server.database.sql(`SELECT COUNT(*) FROM ${table}`));

it('fills an empty database once: fixtures, trials, people', async () => {
  expect(count('fixture')).toBeGreaterThanOrEqual(8);
  expect(count('trial')).toBeGreaterThanOrEqual(600);
  expect(count('user')).toBe(4);
  const before = server.database.sql('CHECKSUM TABLE fixture, trial, user, event');
  await seedDemo(server.deps);
  expect(server.database.sql('CHECKSUM TABLE fixture, trial, user, event')).toBe(before);
});

it('shows every verdict at least once', async () => {
  const caches = await server.deps.dataSource.getRepository(BoundaryCacheRow).find();
  const seen = new Set(
    caches.flatMap(({ result }) => result?.configurations.map(({ verdict }) => verdict) ?? []),
  );
  expect([...verdicts].filter((verdict) => !seen.has(verdict))).toEqual([]);
});

it('lets each demo person in with the printed password', async () => {
  for (const role of ['engineer', 'analyst', 'manager', 'admin']) {
    const client = await signIn(server.app, `${role}@tautline.example`, 'hold-below-the-line');
    await client.get('/api/overview').expect(200);
  }
});
