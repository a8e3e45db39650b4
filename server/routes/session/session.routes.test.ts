import { afterAll, beforeAll, describe, expect, it } from 'vitest';

import type { Session } from '#shared/contracts/session';

import { addressOf, testPassword } from '../../testing/people.ts';
import { startTestServer, type TestServer } from '../../testing/startTestServer.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ signInLimit: { windowSeconds: 60, perAccount: 3, perAddress: 1000 } });
});
afterAll(() => server.close());

const credentials = { email: addressOf('engineer'), password: testPassword };

describe('session', () => {
  it('tells who is signed in, in a cookie that scripts and other sites can not use', async () => {
    const agent = server.nobody();
    const answer = await agent.post('/api/session').send({ ...credentials, email: ' ENGINEER@test.example ' });
    expect(answer.status).toBe(200);
    const session = answer.body as Session;
    expect(session.person).toMatchObject({ email: 'engineer@test.example', role: 'engineer', name: 'The engineer' });
    expect(session.office.name).toBe('Our office');
    const cookie = String(answer.headers['set-cookie']);
    expect(cookie).toMatch(/^groundward=/);
    expect(cookie).toContain('HttpOnly');
    expect(cookie).toContain('SameSite=Lax');
    expect(cookie).not.toContain('Secure');
    expect((await agent.get('/api/session')).body).toEqual(session);
  });

  it('refuses a wrong password and an unknown address in the same words', async () => {
    const wrong = await server
      .nobody()
      .post('/api/session')
      .send({ ...credentials, password: 'another' });
    const unknown = await server
      .nobody()
      .post('/api/session')
      .send({ ...credentials, email: 'x@test.example' });
    expect(wrong.status).toBe(401);
    expect(wrong.body).toMatchObject({ error: { code: 'wrong-credentials' } });
    expect(unknown.status).toBe(401);
    expect(unknown.body).toEqual(wrong.body);
  });

  it('ends at once for every copy of the cookie', async () => {
    const agent = server.nobody();
    const answer = await agent.post('/api/session').send(credentials);
    const cookie = String(answer.headers['set-cookie']).split(';')[0] ?? '';
    const copy = server.nobody();
    expect((await copy.get('/api/session').set('Cookie', cookie)).status).toBe(200);
    await agent.delete('/api/session').expect(204);
    expect((await copy.get('/api/session').set('Cookie', cookie)).status).toBe(401);
  });

  it('takes no cookie that was altered', async () => {
    const forged = 'groundward=eyJhbGciOiJub25lIn0.eyJzaWQiOiJ4In0.';
    const answer = await server.nobody().get('/api/session').set('Cookie', forged);
    expect(answer.status).toBe(401);
    expect(answer.body).toMatchObject({ error: { code: 'no-session' } });
  });

  it('follows a change of role at the next request', async () => {
    const agent = server.as('colleague');
    const { person } = (await agent.get('/api/session')).body as Session;
    await agent.post('/api/buildings').send({ name: 'Before', units: 'us' }).expect(201);
    await server.gate.write((store) => store.people.setRole(person.id, 'checker'));
    await agent.post('/api/buildings').send({ name: 'After', units: 'us' }).expect(403);
    await server.gate.write((store) => store.people.setRole(person.id, 'engineer'));
  });

  it('slows down guessing at one account and leaves the others alone', async () => {
    const guess = (key: 'checker' | 'admin') =>
      server
        .nobody()
        .post('/api/session')
        .send({ email: addressOf(key), password: 'a guess' });
    const statuses: number[] = [];
    for (let attempt = 0; attempt < 4; attempt += 1) statuses.push((await guess('checker')).status);
    expect(statuses).toEqual([401, 401, 401, 429]);
    const refused = await guess('checker');
    expect(refused.headers['retry-after']).toBe('60');
    expect(refused.body).toMatchObject({ error: { code: 'too-many-requests' } });
    expect((await guess('admin')).status).toBe(401);
  });

  it('asks for address and password', async () => {
    const answer = await server.nobody().post('/api/session').send({ email: 'x@test.example' });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({ error: { code: 'invalid', problems: [{ column: 'password' }] } });
  });
});

describe('behind TLS', () => {
  it('ties the cookie to the host and to encrypted connections', async () => {
    const secure = await startTestServer({ overTls: true });
    const answer = await secure.nobody().post('/api/session').set('X-Forwarded-Proto', 'https').send(credentials);
    const cookie = String(answer.headers['set-cookie']);
    expect(cookie).toMatch(/^__Host-groundward=/);
    expect(cookie).toContain('Secure');
    expect(answer.headers['strict-transport-security']).toBeDefined();
    await secure.close();
  });
});
