import request from 'supertest';
import { SessionService } from '../../server/services/sessions/session-service';
import { AccessTokens } from '../../server/services/sessions/access-token';
import { RefreshTokens } from '../../server/services/sessions/refresh-token';
import { SignInThrottle } from '../../server/services/sessions/sign-in-throttle';
import { hashPassword, passwordIs } from '../../server/services/sessions/passwords';
import { demoOrganizations, demoPassword, demoPeople } from '../../server/services/demo/demo-data';
import { signedIn } from '../support/people';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const [larkmoor, tarn] = demoOrganizations;
const developer = demoPeople[1];
const signIn = (email: string, password: string) =>
  request(server.url).post('/v1/sessions').set('Origin', server.url).send({ email, password });

test('signing in tells who and where, and sets two cookies out of reach of scripts', async () => {
  const answer = await signIn('Developer@Larkmoor.example', demoPassword);
  expect(answer.status).toBe(201);
  expect(answer.body).toEqual({
    account: { id: developer.id, email: developer.email, name: developer.name },
    organization: { id: larkmoor.id, name: larkmoor.name },
    organizations: [{ ...larkmoor, role: 'developer' }],
    role: 'developer',
  });
  const cookies = answer.get('Set-Cookie') ?? [];
  expect(cookies).toHaveLength(2);
  for (const cookie of cookies) expect(cookie).toMatch(/HttpOnly; SameSite=Strict$/);
});

test('a wrong password and an unknown person get the same answer', async () => {
  const wrong = await signIn(developer.email, 'three steps up');
  const unknown = await signIn('nobody@larkmoor.example', demoPassword);
  const essence = ({ status, body }: typeof wrong) => ({ status, ...body, requestId: '' });
  expect(wrong.status).toBe(401);
  expect(essence(wrong)).toEqual(essence(unknown));
});

test('a person with no password cannot sign in with any', async () => {
  expect(await passwordIs('nobody has this password', null)).toBe(false);
  expect(await passwordIs('x', await hashPassword('x'))).toBe(true);
});

test('after ten failures the eleventh attempt is not even tried, right or wrong', async () => {
  const email = 'admin@tarnstreet.example';
  for (let i = 0; i < 10; i += 1) expect((await signIn(email, 'wrong')).status).toBe(401);
  expect((await signIn(email, demoPassword)).status).toBe(429);
  expect((await signIn(developer.email, demoPassword)).status).toBe(201);
}, 30_000);

describe('requests that rest on cookies', () => {
  const from = (headers: Record<string, string>) =>
    request(server.url)
      .post('/v1/sessions')
      .set(headers)
      .send({ email: developer.email, password: demoPassword });

  test('must come from our own pages, sign-in included', async () => {
    expect((await from({})).status).toBe(403);
    expect((await from({ Origin: 'http://evil.example' })).status).toBe(403);
    expect((await from({ Origin: 'null' })).status).toBe(403);
    expect((await from({ 'Sec-Fetch-Site': 'cross-site' })).status).toBe(403);
    expect((await from({ 'Sec-Fetch-Site': 'same-site' })).status).toBe(403);
    const both = { Origin: 'http://evil.example', 'Sec-Fetch-Site': 'same-origin' };
    expect((await from(both)).status).toBe(403);
    expect((await from({ 'Sec-Fetch-Site': 'same-origin' })).status).toBe(201);
  });

  test('are refused from elsewhere also with a good session', async () => {
    const agent = await signedIn(server, developer.email);
    const key = { name: 'stolen', scopes: ['compute'] };
    const answer = await agent.post('/v1/keys').set('Origin', 'http://evil.example').send(key);
    expect([answer.status, answer.body.type]).toEqual([
      403,
      `${server.url}/problems/origin-refused`,
    ]);
  });
});

test('a session computes as its role allows, and a key beside it is what counts', async () => {
  const agent = await signedIn(server, 'scientist@larkmoor.example');
  const body = { system: { fullyProtonatedCharge: 0, pKa: ['7'] }, pH: '7' };
  expect((await agent.post('/v1/fractions').send(body)).status).toBe(200);
  const withBadKey = agent
    .post('/v1/fractions')
    .set('Authorization', 'Bearer stepwell_x')
    .send(body);
  expect((await withBadKey).status).toBe(401);
});

test('signing out kills the session, also for a copy of its cookies', async () => {
  const answer = await signIn(developer.email, demoPassword);
  const cookies = (answer.get('Set-Cookie') ?? []).map((cookie) => cookie.split(';')[0]).join('; ');
  const withCopy = () => request(server.url).get('/v1/account').set('Cookie', cookies);
  expect((await withCopy()).status).toBe(200);
  await request(server.url)
    .delete('/v1/sessions/current')
    .set({ Origin: server.url, Cookie: cookies })
    .expect(204);
  expect((await withCopy()).status).toBe(401);
  const refresh = request(server.url).post('/v1/sessions/current/refresh');
  expect((await refresh.set({ Origin: server.url, Cookie: cookies })).status).toBe(401);
});

test('a person who left an organization is signed out of it at the next call', async () => {
  const agent = await signedIn(server, 'admin@larkmoor.example');
  expect((await agent.get('/v1/account')).status).toBe(200);
  await server.database.query('DELETE FROM memberships WHERE person_id = $1', [demoPeople[0].id]);
  expect((await agent.get('/v1/account')).status).toBe(401);
});

test('a person of several organizations works in one at a time, by choice', async () => {
  await server.database.query(`INSERT INTO memberships VALUES ($1, $2, 'scientist')`, [
    developer.id,
    tarn.id,
  ]);
  const agent = await signedIn(server, developer.email);
  const choose = (organizationId: string) =>
    agent.put('/v1/sessions/current/organization').send({ organizationId });
  expect((await choose(tarn.id)).body).toMatchObject({ organization: tarn, role: 'scientist' });
  expect((await agent.get('/v1/account')).body.role).toBe('scientist');
  expect((await agent.get('/v1/keys')).status).toBe(403);
  expect((await choose('00000000-0000-4000-8000-000000000000')).status).toBe(404);
  expect((await choose(larkmoor.id)).body.role).toBe('developer');
});

describe('tokens', () => {
  let now = new Date('2026-12-01T12:00:00Z');
  const after = (seconds: number) => {
    now = new Date(now.getTime() + seconds * 1_000);
  };
  const sessions = () =>
    new SessionService({
      database: server.database,
      tokens: new AccessTokens(Buffer.alloc(32, 1), 'http://stepwell.test'),
      refreshTokens: new RefreshTokens(Buffer.alloc(32, 1)),
      throttle: new SignInThrottle(server.database),
      now: () => now,
    });
  const open = () =>
    sessions().signIn({ email: developer.email, password: demoPassword, address: '127.0.0.1' });

  test('are replaced at each refresh', async () => {
    const first = await open();
    const second = await sessions().refresh(first.refresh);
    expect(second.refresh).not.toBe(first.refresh);
    await expect(sessions().refresh(second.refresh ?? '')).resolves.toBeDefined();
  });

  test('made up for a session whose id is known end nothing', async () => {
    const { refresh } = await open();
    const [id = '', random = '', code = ''] = refresh.split('.');
    const stranger = new RefreshTokens(Buffer.alloc(32, 2)).of(id);
    const madeUp = [`${id}.${random}`, `${id}.x.${code}`, `${id}.${random}.x`, `${refresh}.x`];
    for (const token of [stranger, id, '', ...madeUp]) {
      await expect(sessions().refresh(token)).rejects.toMatchObject({ code: 'sign-in-needed' });
    }
    await expect(sessions().refresh(refresh)).resolves.toBeDefined();
  });

  test('raced within ten seconds stay good', async () => {
    const first = await open();
    const second = await sessions().refresh(first.refresh);
    after(9);
    const raced = await sessions().refresh(first.refresh);
    expect(raced.refresh).toBeUndefined();
    expect(await sessions().callerOf(raced.access)).toBeDefined();
    await expect(sessions().refresh(second.refresh ?? '')).resolves.toBeDefined();
  });

  test('used again later end the whole session: they were stolen', async () => {
    const first = await open();
    const second = await sessions().refresh(first.refresh);
    after(11);
    await expect(sessions().refresh(first.refresh)).rejects.toMatchObject({
      code: 'sign-in-needed',
    });
    await expect(sessions().refresh(second.refresh ?? '')).rejects.toMatchObject({
      code: 'sign-in-needed',
    });
    expect(await sessions().callerOf(second.access)).toBeUndefined();
  });

  test('however old, used again end the session', async () => {
    const first = await open();
    const second = await sessions().refresh(first.refresh);
    const third = await sessions().refresh(second.refresh ?? '');
    after(1);
    const again = sessions().refresh(first.refresh);
    await expect(again).rejects.toMatchObject({ code: 'sign-in-needed' });
    expect(await sessions().callerOf(third.access)).toBeUndefined();
  });

  test('die with their session after fourteen days', async () => {
    const { refresh } = await open();
    after(14 * 86_400 + 1);
    await expect(sessions().refresh(refresh)).rejects.toMatchObject({ code: 'sign-in-needed' });
  });

  test('of another secret, issuer or algorithm are nobody’s', async () => {
    const { access } = await open();
    const other = (fill: number, issuer: string) =>
      new AccessTokens(Buffer.alloc(32, fill), issuer);
    expect(other(1, 'http://stepwell.test').read(access)).toBeDefined();
    expect(other(2, 'http://stepwell.test').read(access)).toBeUndefined();
    expect(other(1, 'http://other.test').read(access)).toBeUndefined();
    const [, claims] = access.split('.');
    const none = Buffer.from('{"alg":"none","typ":"JWT"}').toString('base64url');
    expect(other(1, 'http://stepwell.test').read(`${none}.${claims}.`)).toBeUndefined();
  });
});
