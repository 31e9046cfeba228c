import { mkdtempSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import fc from 'fast-check';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import grants from '../../server/migrations/grants.json' with { type: 'json' };
import { passwordProblem } from '../../server/auth/passwordRules.ts';
import { commonPasswords } from '../../server/auth/commonPasswords.ts';
import { inTransaction } from '../../server/database/inTransaction.ts';
import { updateVersioned } from '../../server/database/updateVersioned.ts';
import { FixtureRow } from '../../server/entities/FixtureRow.ts';
import { instanceSecrets, startMariadb } from '../../scripts/lib/mariadb.mjs';
import { createTestServer, type Client, type TestServer } from '../helpers/server.ts';
import { enterExample } from '../helpers/examples.ts';

let server: TestServer;
let analyst: Client;

beforeAll(async () => {
  server = await createTestServer();
  analyst = await server.as('analyst', 'engineer', 'manager', 'administrator');
  await enterExample(analyst);
});

afterAll(() => server.close());

describe('input that makes no sense', () => {
  it('is never answered 5xx, and never with the inside of the server', async () => {
    const odd = fc.oneof(
      fc.constantFrom(null, -0, 2 ** 53, '', 'x'.repeat(10_000), [], {}, [[]], true, '1e3'),
      fc.jsonValue({ maxDepth: 3 }),
      fc.dictionary(
        fc.constantFrom(
          '__proto__',
          'constructor',
          'toString',
          'version',
          'trials',
          'name',
          'code',
          'bodies',
        ),
        fc.jsonValue({ maxDepth: 2 }),
      ),
    );
    const writes = server.routes.filter(
      ({ body, upload }) => body !== undefined && upload === undefined,
    );
    await fc.assert(
      fc.asyncProperty(fc.constantFrom(...writes), odd, async (route, body) => {
        const call = analyst.agent[route.method](route.path.replace(':id', '1'));
        const answer = await call
          .set('X-CSRF-Token', analyst.csrfToken)
          .set('Content-Type', 'application/json')
          .send(JSON.stringify(body));
        expect(answer.status, `${route.path} ${JSON.stringify(body).slice(0, 200)}`).toBeLessThan(
          500,
        );
        expect(answer.status).toBeGreaterThanOrEqual(400);
        expect(answer.type).toBe('application/problem+json');
        expect(answer.text).not.toMatch(/SELECT|INSERT|\bat .*\.ts|node_modules/);
      }),
      { numRuns: 250, seed: 20261201 },
    );
    expect(({} as Record<string, unknown>).x).toBeUndefined();
  });

  it('is refused by kind: not JSON 415, broken JSON 400, too much 413, too deep 4xx', async () => {
    const post = () => analyst.agent.post('/api/fixtures').set('X-CSRF-Token', analyst.csrfToken);
    await post().type('text/plain').send('{"code":"X"}').expect(415);
    await post().type('json').send('{"code":').expect(400);
    await post()
      .type('json')
      .send(JSON.stringify({ code: 'x'.repeat(200_000) }))
      .expect(413);
    const deep = await post()
      .type('json')
      .send('['.repeat(40_000) + ']'.repeat(40_000));
    expect([400, 413, 422]).toContain(deep.status);
    await post()
      .type('json')
      .set('Content-Encoding', 'gzip')
      .send(Buffer.from('1f8b', 'hex'))
      .expect(415);
  });

  it('in an address is 404, and an unknown page of the interface is a problem document', async () => {
    for (const path of ['/api/nope', '/api/fixtures/1/nope', '/api', '/api/%E0%A4%A']) {
      const answer = await analyst.get(path);
      expect([400, 404], path).toContain(answer.status);
      expect(answer.type).toBe('application/problem+json');
    }
  });
});

describe('the headers', () => {
  it('let scripts come from here only, and say nothing of what runs', async () => {
    const answer = await supertest(server.app).get('/api/session');
    const policy = answer.get('Content-Security-Policy') ?? '';
    for (const part of [
      "script-src 'self';",
      "object-src 'none'",
      "base-uri 'none'",
      "frame-ancestors 'none'",
    ]) {
      expect(`${policy};`).toContain(part);
    }
    expect(policy).not.toContain('upgrade-insecure-requests');
    expect(answer.get('Strict-Transport-Security')).toBeUndefined();
    expect(answer.get('X-Powered-By')).toBeUndefined();
    expect(answer.get('X-Content-Type-Options')).toBe('nosniff');
    expect(answer.get('Cache-Control')).toBe('no-store');
    expect(answer.get('Access-Control-Allow-Origin')).toBeUndefined();
  });
});

describe('the OpenAPI document', () => {
  it('lists every route with its answers', async () => {
    const answer = await supertest(server.app).get('/api/openapi.json').expect(200);
    const document = answer.body as {
      openapi: string;
      paths: Record<string, Record<string, unknown>>;
    };
    expect(document.openapi).toBe('3.1.0');
    for (const { method, path } of server.routes) {
      expect(
        document.paths[path.replace(':id', '{id}')]?.[method],
        `${method} ${path}`,
      ).toBeDefined();
    }
  });
});

describe('the event log', () => {
  it('cannot be changed by the application’s account', async () => {
    const statements = [
      "UPDATE event SET summary = 'x'",
      'DELETE FROM event',
      "REPLACE INTO event (id, at, action, object_type, outcome, summary) VALUES (1, '', '', '', 'done', '')",
      "INSERT INTO event (id, at, action, object_type, outcome, summary) VALUES (1, '', '', '', 'done', '') ON DUPLICATE KEY UPDATE summary = 'x'",
      'TRUNCATE event',
      'ALTER TABLE event DROP COLUMN summary',
      'DROP TRIGGER event_no_update',
      'DELETE FROM trial',
      'DELETE FROM analysis',
      'DELETE FROM fixture',
    ];
    for (const statement of statements) {
      await expect(server.deps.dataSource.query(statement), statement).rejects.toThrow(/denied/);
    }
  });

  it('cannot be changed even by an account that may change rows', () => {
    expect(() => server.database.sql("UPDATE event SET summary = 'x'")).toThrow(/append-only/);
    expect(() => server.database.sql('DELETE FROM event')).toThrow(/append-only/);
  });

  it('hangs on no table by a cascade', () => {
    const rules = server.database.sql(
      'SELECT DISTINCT DELETE_RULE FROM information_schema.REFERENTIAL_CONSTRAINTS WHERE CONSTRAINT_SCHEMA = DATABASE()',
    );
    expect(rules.trim()).toBe('RESTRICT');
  });

  it('belongs to an account that has just what grants.json says', () => {
    const rows = server.database.sql(
      "SELECT table_name, GROUP_CONCAT(privilege_type ORDER BY privilege_type) FROM information_schema.TABLE_PRIVILEGES WHERE table_schema = DATABASE() AND grantee LIKE '%tautline_app%' GROUP BY table_name",
    );
    const found = Object.fromEntries(
      rows
        .trim()
        .split('\n')
        .map((row): [string, string] => {
          const [table = '', rights = ''] = row.split('\t');
          return [table, rights];
        }),
    );
    const wanted = Object.fromEntries(
      Object.entries(grants).map(([table, rights]) => [table, rights.toSorted().join(',')]),
    );
    expect(found).toEqual(wanted);
  });
});

describe('a transaction', () => {
  it('loses no increment of twenty at once', async () => {
    const before = await server.deps.dataSource
      .getRepository(FixtureRow)
      .findOneByOrFail({ id: 1 });
    await Promise.all(
      Array.from({ length: 20 }, () =>
        inTransaction(server.deps.dataSource, (manager) =>
          manager.update(FixtureRow, { id: 1 }, { dataVersion: () => 'data_version + 1' }),
        ),
      ),
    );
    const after = await server.deps.dataSource.getRepository(FixtureRow).findOneByOrFail({ id: 1 });
    expect(after.dataVersion - before.dataVersion).toBe(20);
  });

  it('never takes a version back: of fifty writers of one version one gets through', async () => {
    const { version } = await server.deps.dataSource
      .getRepository(FixtureRow)
      .findOneByOrFail({ id: 1 });
    const results = await Promise.allSettled(
      Array.from({ length: 50 }, (_, i) =>
        inTransaction(server.deps.dataSource, (manager) =>
          updateVersioned<FixtureRow>(manager, FixtureRow, 1, version, { name: `writer ${i}` }),
        ),
      ),
    );
    expect(results.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    const row = await server.deps.dataSource.getRepository(FixtureRow).findOneByOrFail({ id: 1 });
    expect(row.version).toBe(version + 1);
  });

  it('leaves nothing open', () => {
    expect(server.database.sql('SELECT COUNT(*) FROM information_schema.INNODB_TRX').trim()).toBe(
      '0',
    );
  });
});

describe('a password', () => {
  const about = { name: 'Ada Bench', email: 'ada.bench@plant.example' };

  it.each([
    ['short', /12 characters/],
    ['passwordpassword', /everybody/],
    ['qwertyuiop123', /everybody/],
    ['aaaaaaaaaaaaaa', /everybody/],
    ['tautline2026!', /built from/],
    ['Bench-Bench-2026', /built from/],
    ['🦊'.repeat(19), /72 bytes/],
  ])('%s is refused', (password, reason) => {
    expect(passwordProblem(password, about)).toMatch(reason);
  });

  it.each(['nine calm turns of tape', '🦊'.repeat(18), '  spaces  and  more  '])(
    '%s is taken',
    (password) => {
      expect(passwordProblem(password, about)).toBeNull();
    },
  );

  it('is checked against three thousand or more that everybody tries', () => {
    expect(commonPasswords().size).toBeGreaterThanOrEqual(3000);
    for (const password of commonPasswords())
      expect(passwordProblem(password, about)).not.toBeNull();
  });
});

describe('without its database', () => {
  it('answers 503 at once, stays up, says that it is not ready, and needs no restart', async () => {
    const folder = mkdtempSync(path.join(os.tmpdir(), 'tautline-away-'));
    const mariadb = await startMariadb(folder, { durable: false });
    const { application, migration } = instanceSecrets(folder);
    const passwords = { application, migration };
    const lone = await createTestServer({}, { ...mariadb, passwords });
    try {
      await supertest(lone.app).get('/readyz').expect(200, { status: 'ok' });
      const client = await lone.as('engineer');
      await client.get('/api/fixtures').expect(200);
      await mariadb.stop();
      const start = Date.now();
      const away = await client.get('/api/fixtures');
      expect(away.status).toBe(503);
      expect(away.get('Retry-After')).toBeDefined();
      expect(away.text).not.toMatch(/ECONN|127\.0\.0\.1/);
      expect(Date.now() - start).toBeLessThan(3000);
      await supertest(lone.app).get('/healthz').expect(200, { status: 'ok' });
      await supertest(lone.app).get('/readyz').expect(503);
      const back = await startMariadb(folder, { durable: false });
      await client.get('/api/fixtures').expect(200);
      await back.stop();
    } finally {
      await Promise.all([lone.deps.work.close(), lone.deps.passwords.close()]);
      await lone.deps.dataSource.destroy();
      rmSync(folder, { recursive: true, force: true });
    }
  });
});
