import supertest from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestServer, signIn, testPassword, type TestServer } from '../helpers/server.ts';

let server: TestServer;

beforeAll(async () => {
  server = await createTestServer();
});

afterAll(() => server.close());

describe('signing in', () => {
  it('answers with the person, their roles and a token, and sets one cookie', async () => {
    await server.as('analyst');
    const answer = await supertest(server.app)
      .post('/api/session')
      .send({ email: ' Analyst@TEST.example ', password: testPassword })
      .expect(200);
    expect(answer.body).toMatchObject({ user: { name: 'analyst', roles: ['analyst'] } });
    const cookies = answer.get('Set-Cookie') ?? [];
    expect(cookies).toHaveLength(1);
    expect(cookies[0]).toMatch(/^tautline=.*; Path=\/; HttpOnly; SameSite=Lax$/);
  });

  it('sets no cookie for a visitor, a failed try or a forged cookie', async () => {
    const visitor = await supertest(server.app).get('/api/session').expect(200);
    expect(visitor.body).toMatchObject({ user: null });
    expect(visitor.get('Set-Cookie')).toBeUndefined();
    const failed = await supertest(server.app)
      .post('/api/session')
      .send({ email: 'nobody@test.example', password: 'wrong password here' })
      .expect(401);
    expect(failed.get('Set-Cookie')).toBeUndefined();
    const forged = await supertest(server.app)
      .get('/api/fixtures')
      .set('Cookie', 'tautline=s%3Aforged.signature')
      .expect(401);
    expect(forged.get('Set-Cookie')).toBeUndefined();
  });

  it('takes credentials from a JSON body only', async () => {
    await supertest(server.app)
      .post(`/api/session?email=analyst@test.example&password=${encodeURIComponent(testPassword)}`)
      .send({})
      .expect(422);
    await supertest(server.app)
      .post('/api/session')
      .type('form')
      .send({ email: 'analyst@test.example', password: testPassword })
      .expect(415);
  });

  it('gives a new session identity, and the one before is dead', async () => {
    const first = await server.as('engineer');
    const before = await first.agent.get('/api/session');
    expect((before.body as { user: unknown }).user).not.toBeNull();
    const second = await first.agent
      .post('/api/session')
      .send({ email: 'engineer@test.example', password: testPassword })
      .expect(200);
    expect(second.get('Set-Cookie')).toHaveLength(1);
    await first.send('post', '/api/fixtures', {}).expect(403);
  });

  it('slows down failed tries from the eleventh on, whatever address they claim', async () => {
    const email = 'manager@test.example';
    await server.as('manager');
    for (let i = 1; i <= 10; i += 1) {
      await supertest(server.app)
        .post('/api/session')
        .set('X-Forwarded-For', `10.0.0.${i}`)
        .send({ email, password: `wrong password ${i}` })
        .expect(401);
    }
    const refused = await supertest(server.app)
      .post('/api/session')
      .set('X-Forwarded-For', '10.0.0.99')
      .send({ email, password: testPassword })
      .expect(429);
    expect(Number(refused.get('Retry-After'))).toBeGreaterThan(0);
  });

  it('refuses a password beyond 72 bytes instead of cutting it', async () => {
    await supertest(server.app)
      .post('/api/session')
      .send({ email: 'analyst@test.example', password: testPassword.padEnd(80, 'x') })
      .expect(401);
  });
});

describe('signing out', () => {
  it('is final, also for a request in flight', async () => {
    const client = await server.as('analyst');
    for (let round = 0; round < 20; round += 1) {
      const { agent, csrfToken } = await signIn(server.app, 'analyst@test.example');
      const [, out] = await Promise.all([
        agent.get('/api/fixtures'),
        agent.delete('/api/session').set('X-CSRF-Token', csrfToken),
      ]);
      expect(out.status).toBe(204);
      await agent.get('/api/fixtures').expect(401);
    }
    await client.get('/api/fixtures').expect(200);
  });

  it('needs the token', async () => {
    const client = await server.as('analyst');
    await client.agent.delete('/api/session').expect(403);
    await client.get('/api/fixtures').expect(200);
  });
});

describe('a session', () => {
  it('ends after an hour without use and after twelve hours in any case', async () => {
    let now = Date.now();
    const timed = await createTestServer({ clock: () => new Date(now) });
    try {
      const idle = await timed.as('analyst');
      now += 59 * 60_000;
      await idle.get('/api/fixtures').expect(200);
      now += 61 * 60_000;
      await idle.get('/api/fixtures').expect(401);
      const busy = await timed.as('analyst');
      for (let minutes = 0; minutes < 12 * 60; minutes += 30) {
        await busy.get('/api/fixtures').expect(200);
        now += 30 * 60_000;
      }
      now += 60_000;
      await busy.get('/api/fixtures').expect(401);
    } finally {
      await timed.close();
    }
  });

  it('loses a role or the whole account on the very next request', async () => {
    const client = await server.as('engineer', 'analyst');
    const email = 'engineer-analyst@test.example';
    server.database.sql(`UPDATE user SET roles = 'manager' WHERE email = '${email}'`);
    await client.send('post', '/api/fixtures', {}).expect(403);
    server.database.sql(`UPDATE user SET status = 'disabled' WHERE email = '${email}'`);
    await client.get('/api/fixtures').expect(401);
  });
});
