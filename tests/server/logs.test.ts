import { createHash } from 'node:crypto';
import { once } from 'node:events';
import net from 'node:net';
import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestServer, testPassword, type Client, type TestServer } from '../helpers/server.ts';
import { enterExample, exampleLog } from '../helpers/examples.ts';

let server: TestServer;
let engineer: Client;
let next = 0;

beforeAll(async () => {
  server = await createTestServer();
  engineer = await server.as('engineer');
});

afterAll(() => server.close());

async function freshFixture(): Promise<string> {
  next += 1;
  return `/api/fixtures/${await enterExample(engineer, `LG-${next}`)}/logs`;
}

const count = (table: string) => Number(server.database.sql(`SELECT COUNT(*) FROM ${table}`));
type Answer = {
  log: {
    id: number | null;
    sha256: string;
    accepted: number;
    refused: number;
    duplicateOf?: number;
  };
  problems: { row: number; column: string | null; value: string | null; reason: string }[];
  mapping: { units: object };
  changes: string[];
  newConfigurations: { label: string }[];
};
const bodyOf = (answer: { body: unknown }) => answer.body as Answer;

it('previews without storing anything', async () => {
  const logs = await freshFixture();
  const before = server.database.sql(
    'CHECKSUM TABLE trial_log, trial, configuration, event, fixture',
  );
  const answer = bodyOf(await engineer.upload(`${logs}?dryRun=true`, exampleLog()).expect(200));
  expect(answer.log).toMatchObject({ id: null, accepted: 24, refused: 0 });
  expect(
    server.database.sql('CHECKSUM TABLE trial_log, trial, configuration, event, fixture'),
  ).toBe(before);
});

it('stores trials, raw bytes and event, and recognises the same bytes under another name', async () => {
  const logs = await freshFixture();
  const text = exampleLog();
  const stored = bodyOf(await engineer.upload(logs, text, 'monday.csv').expect(201));
  expect(stored.log.sha256).toBe(createHash('sha256').update(text).digest('hex'));
  expect(stored.log.duplicateOf).toBeUndefined();
  expect(stored.changes.join(' ')).toMatch(/60 mm is judged for the first time/);
  const again = bodyOf(await engineer.upload(logs, text, 'tuesday.csv').expect(200));
  expect(again.log).toMatchObject({ id: stored.log.id, duplicateOf: stored.log.id, accepted: 24 });
  const raw = await engineer.get(`/api/logs/${stored.log.id}/raw`).expect(200);
  expect(raw.text).toBe(text);
  expect(raw.get('Content-Disposition')).toBe("attachment; filename*=UTF-8''monday.csv");
  expect(raw.get('Content-Security-Policy')).toBe('sandbox');
  const trials = await engineer.get(`${logs.replace('logs', 'trials')}?pageSize=200`).expect(200);
  expect(trials.body).toMatchObject({ total: 24 });
});

it('makes one log of twelve equal uploads at once', async () => {
  const logs = await freshFixture();
  const [before, text] = [count('trial'), exampleLog(6)];
  const answers = await Promise.all(Array.from({ length: 12 }, () => engineer.upload(logs, text)));
  const statuses = answers.map(({ status }) => status).toSorted();
  expect(statuses).toEqual([...Array<number>(11).fill(200), 201]);
  expect(new Set(answers.map((answer) => bodyOf(answer).log.id)).size).toBe(1);
  expect(count('trial') - before).toBe(18);
});

it('names row, column, value and remedy of what it refuses, and stores the rest', async () => {
  const logs = await freshFixture();
  const text = [
    'position [mm];acceleration [rad/s²];outcome',
    '20;100;held',
    '20;-5;held',
    '20;0x10;held',
    '33;100;held',
    '20;100;perhaps',
    '20;1e400;held',
    '60;80;slipped',
  ].join('\n');
  const answer = bodyOf(await engineer.upload(logs, text).expect(201));
  expect(answer.log).toMatchObject({ accepted: 2, refused: 5 });
  expect(answer.problems.map(({ row }) => row)).toEqual([3, 4, 5, 6, 7]);
  for (const { column, value, reason } of answer.problems) {
    expect(column).not.toBeNull();
    expect(value).not.toBeNull();
    expect(reason.length).toBeGreaterThan(20);
  }
});

it('refuses a log of which no row can be stored, and stores nothing', async () => {
  const logs = await freshFixture();
  const before = [count('trial_log'), count('trial')];
  const answer = await engineer
    .upload(logs, 'position,acceleration,outcome\n20,abc,held\n')
    .expect(422);
  expect(JSON.stringify(answer.body)).toContain('row 2');
  await engineer.upload(logs, '').expect(422);
  expect([count('trial_log'), count('trial')]).toEqual(before);
});

it('adds the positions a log proposes when asked to', async () => {
  const logs = await freshFixture();
  const text = exampleLog().replaceAll('\n60,', '\n75,');
  expect(bodyOf(await engineer.upload(logs, text).expect(201)).log.refused).toBe(8);
  const other = `${text}\n`;
  const answer = bodyOf(
    await engineer.upload(logs, other, 'b.csv', { addConfigurations: true }).expect(201),
  );
  expect(answer.newConfigurations).toHaveLength(1);
  const list = await engineer.get(logs.replace('logs', 'configurations')).expect(200);
  expect((list.body as { items: unknown[] }).items).toHaveLength(4);
});

it('stores all or nothing when the database fails in the middle of the trials', async () => {
  const logs = await freshFixture();
  const [before, events] = [[count('trial_log'), count('trial'), count('fixture')], count('event')];
  const id = logs.split('/')[3];
  server.database.sql(
    `ALTER TABLE trial ADD CONSTRAINT fault CHECK (log_row <> 20 OR fixture_id <> ${id})`,
  );
  try {
    const answer = await engineer.upload(logs, exampleLog());
    expect(answer.status).toBe(500);
    expect(answer.text).not.toMatch(/fault|INSERT|CONSTRAINT/);
    expect([count('trial_log'), count('trial'), count('fixture')]).toEqual(before);
    expect(count('event')).toBe(events);
  } finally {
    server.database.sql('ALTER TABLE trial DROP CONSTRAINT fault');
  }
  await engineer.upload(logs, exampleLog()).expect(201);
});

describe('hostile uploads', () => {
  it('are refused by name of what is wrong', async () => {
    const logs = await freshFixture();
    const post = () => engineer.agent.post(logs).set('X-CSRF-Token', engineer.csrfToken);
    await post().send({ file: 'x' }).expect(415);
    await post().field('mapping', '{}').expect(422);
    await post().attach('wrong', Buffer.from('x'), 'x.csv').expect(400);
    await post()
      .attach('file', Buffer.from('x'), 'a.csv')
      .attach('file', Buffer.from('x'), 'b.csv')
      .expect(413);
    await post()
      .attach('file', Buffer.from('x'), 'a.csv')
      .field('mapping', 'x'.repeat(20_000))
      .expect(413);
    await post().attach('file', Buffer.from('x'), 'a.csv').field('mapping', 'not json').expect(422);
    await post()
      .attach('file', Buffer.from('x'), 'a.csv')
      .field('mapping', '{"nope":1}')
      .expect(422);
    await post()
      .attach('file', Buffer.alloc(16 * 1024 * 1024 + 1, 'a'), 'a.csv')
      .expect(413);
    await post().set('Content-Type', 'multipart/form-data').send('no boundary').expect(400);
    await post()
      .set('Content-Type', 'multipart/form-data; boundary=x')
      .send('--x\r\nContent-Disp')
      .expect(400);
  });

  it('that are not text are refused as such', async () => {
    const logs = await freshFixture();
    for (const bytes of [[0x50, 0x4b, 3, 4], [0x1f, 0x8b, 8, 0], [...Buffer.from('%PDF-1.7')]]) {
      const answer = await engineer.upload(logs, Buffer.from([...bytes, ...Buffer.alloc(60, 7)]));
      expect(answer.status).toBe(415);
    }
  });

  it('cannot put paths or control marks into the file’s name', async () => {
    const logs = await freshFixture();
    const names = [
      '../../etc/passwd.csv',
      'a\u202Egpj.csv',
      `${'x'.repeat(5000)}.csv`,
      'Prüf №3.csv',
    ];
    for (const [i, name] of names.entries()) {
      await engineer.upload(logs, `${exampleLog()}${'\n'.repeat(i)}`, name).expect(201);
    }
    const list = await engineer.get(logs).expect(200);
    const stored = (list.body as { items: { fileName: string }[] }).items.map(
      ({ fileName }) => fileName,
    );
    expect(stored).toContain('passwd.csv');
    expect(stored).toContain('agpj.csv');
    expect(stored).toContain('Prüf №3.csv');
    expect(Math.max(...stored.map((name) => name.length))).toBeLessThanOrEqual(200);
  });

  it('that end early leave nothing behind and the server alive', async () => {
    const logs = await freshFixture();
    const before = count('trial_log');
    const listening = server.app.listen(0, '127.0.0.1');
    await once(listening, 'listening');
    try {
      const { port } = listening.address() as net.AddressInfo;
      const signedIn = await supertest(server.app)
        .post('/api/session')
        .send({ email: 'engineer@test.example', password: testPassword })
        .expect(200);
      const cookie = signedIn.get('Set-Cookie')?.[0]?.split(';')[0] ?? '';
      const { csrfToken } = signedIn.body as { csrfToken: string };
      for (let round = 0; round < 20; round += 1) {
        await abortedUpload(port, logs, cookie, csrfToken);
      }
      expect(count('trial_log')).toBe(before);
      await engineer.upload(logs, exampleLog()).expect(201);
    } finally {
      listening.close();
    }
  });
});

/** Sends half a multipart body and hangs up. */
function abortedUpload(port: number, path: string, cookie: string, token: string): Promise<void> {
  return new Promise((resolve) => {
    const socket = net.connect(port, '127.0.0.1', () => {
      socket.write(
        `POST ${path} HTTP/1.1\r\nHost: x\r\nCookie: ${cookie}\r\nX-CSRF-Token: ${token}\r\n` +
          'Content-Type: multipart/form-data; boundary=x\r\nContent-Length: 100000\r\n\r\n' +
          '--x\r\nContent-Disposition: form-data; name="file"; filename="a.csv"\r\n\r\nposition,acc',
      );
      setTimeout(() => socket.destroy(), 15);
    });
    socket.on('close', () => resolve());
    socket.on('error', () => resolve());
  });
}
