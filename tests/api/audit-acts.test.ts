import request, { type Response } from 'supertest';
import { demoOrganizations, demoPassword, demoPeople } from '../../server/services/demo/demo-data';
import { issuedKey } from '../../shared/keys';
import { actsOn, eventsOf } from '../support/audit';
import { signedIn, type Signed } from '../support/people';
import { startTestServer, type TestServer } from '../support/server';

/** Which acts leave an event, and what it says. */
let server: TestServer;
let admin: Signed;
let developer: Signed;
beforeAll(async () => {
  server = await startTestServer();
  admin = await signedIn(server, 'admin@larkmoor.example');
  developer = await signedIn(server, 'developer@larkmoor.example');
});
afterAll(() => server.close());

const [larkmoor, tarn] = demoOrganizations;
const [, developerRow, scientistRow, strangerRow] = demoPeople;
const uuid = expect.stringMatching(/^[0-9a-f-]{36}$/);

const wanted = { name: 'lims-nightly', scopes: ['compute'] };
const signIn = (email: string, password: string = demoPassword) =>
  request(server.url).post('/v1/sessions').set('Origin', server.url).send({ email, password });
const cookiesOf = (answer: Response) =>
  (answer.get('Set-Cookie') ?? []).map((cookie) => cookie.split(';')[0]).join('; ');
const refresh = (cookies: string) =>
  request(server.url)
    .post('/v1/sessions/current/refresh')
    .set({ Origin: server.url, Cookie: cookies });
const latestSession = async (personId: string) => {
  const rows = await server.database.query<[{ id: string }]>(
    'SELECT id FROM sessions WHERE person_id = $1 ORDER BY created_at DESC, id LIMIT 1',
    [personId],
  );
  return rows[0].id;
};

test('an issued key is told with who, where from, in which call and on what', async () => {
  const answer = await developer.post('/v1/keys').send(wanted).expect(201);
  const { id, key, publicId, expiresAt } = issuedKey.parse(answer.body);
  const events = await eventsOf(admin, { subject: id });
  expect(events).toEqual([
    {
      id: uuid,
      at: expect.stringMatching(/^20\d\d-\d\d-\d\dT[\d:.]+Z$/),
      act: 'key.issued',
      person: { id: developerRow.id, name: developerRow.name },
      key: null,
      session: await latestSession(developerRow.id),
      subject: { kind: 'key', id },
      address: '127.0.0.1',
      requestId: answer.headers['x-request-id'],
      details: { ...wanted, publicId, expiresAt },
    },
  ]);
  expect(JSON.stringify(events)).not.toContain(key.slice(22));
});

test('a key is revoked once, however many revoke it at once', async () => {
  const { id } = issuedKey.parse((await developer.post('/v1/keys').send(wanted)).body);
  const revoke = (person: Signed) => person.post(`/v1/keys/${id}/revocation`);
  const answers = await Promise.all([admin, developer, admin, developer].map(revoke));
  await revoke(admin);
  expect(answers.map(({ status }) => status)).toEqual([200, 200, 200, 200]);
  expect(new Set(answers.map(({ body }) => body.revokedAt)).size).toBe(1);
  expect(await actsOn(server, id)).toEqual(['key.issued', 'key.revoked']);
});

test('a call that is refused leaves no event of an act', async () => {
  const before = await eventsOf(admin);
  await developer.post('/v1/keys').send({ ...wanted, scopes: ['everything'] });
  await developer.post('/v1/keys/00000000-0000-4000-8000-000000000000/revocation');
  await request(server.url).post('/v1/keys').send(wanted);
  expect(await eventsOf(admin)).toEqual(before);
});

test('a session is opened once and ended once', async () => {
  const answer = await signIn(developerRow.email);
  const session = await latestSession(developerRow.id);
  const out = () =>
    request(server.url)
      .delete('/v1/sessions/current')
      .set({ Origin: server.url, Cookie: cookiesOf(answer) });
  await out().expect(204);
  await out().expect(401);
  const events = await eventsOf(admin, { subject: session });
  expect(events.map(({ act, details }) => [act, details])).toEqual([
    ['session.ended', { reason: 'signed-out' }],
    ['session.opened', {}],
  ]);
  for (const event of events) {
    expect(event).toMatchObject({ session, person: { id: developerRow.id } });
  }
  expect(events[1]?.requestId).toBe(answer.headers['x-request-id']);
});

test('renewing a session is no act', async () => {
  const answer = await signIn(developerRow.email);
  await refresh(cookiesOf(answer)).expect(200);
  expect(await actsOn(server, await latestSession(developerRow.id))).toEqual(['session.opened']);
});

test('a token of the past ends the session, by nobody knows whom', async () => {
  const first = cookiesOf(await signIn(developerRow.email));
  const session = await latestSession(developerRow.id);
  const second = cookiesOf(await refresh(first).expect(200));
  await refresh(second).expect(200);
  await refresh(first).expect(401);
  await refresh(first).expect(401);
  const [event, ...older] = await eventsOf(admin, { subject: session });
  expect(event).toMatchObject({
    act: 'session.reused',
    person: null,
    session,
    details: { personId: developerRow.id },
  });
  expect(older.map(({ act }) => act)).toEqual(['session.opened']);
});

test('a refused sign-in of somebody known is told to the admins of where it would have led', async () => {
  const password = 'three steps up the wrong hill';
  const answer = await signIn(scientistRow.email, password).expect(401);
  const [event] = await eventsOf(admin, { act: 'session.refused', subject: scientistRow.id });
  expect(event).toMatchObject({
    person: null,
    session: null,
    subject: { kind: 'person', id: scientistRow.id },
    requestId: answer.headers['x-request-id'],
    details: { reason: 'wrong-password' },
  });
});

test('of somebody unknown it is recorded without a word of what was typed', async () => {
  const typed = 'my-password-in-the-wrong-field@larkmoor.example';
  const answer = await signIn(typed).expect(401);
  const rows = await server.database.query<object[]>(
    'SELECT * FROM audit_events WHERE request_id = $1',
    [answer.headers['x-request-id']],
  );
  expect(rows).toHaveLength(1);
  expect(rows[0]).toMatchObject({
    act: 'session.refused',
    organization_id: null,
    subject_id: null,
    address: '127.0.0.1',
    details: { reason: 'unknown-person' },
  });
  expect(JSON.stringify(rows)).not.toContain('wrong-field');
});

test('guessing at one person from one address leaves ten events, however fast it is', async () => {
  const guesses = Array.from({ length: 15 }, () => signIn(strangerRow.email, 'wrong'));
  await Promise.all(guesses);
  await signIn(strangerRow.email, 'wrong').expect(429);
  expect(await actsOn(server, strangerRow.id)).toEqual(Array(10).fill('session.refused'));
});

describe('whoever belongs to two organizations', () => {
  let cookies: string;
  let session: string;
  beforeAll(async () => {
    await server.database.query(`INSERT INTO memberships VALUES ($1, $2, 'admin')`, [
      scientistRow.id,
      tarn.id,
    ]);
    cookies = cookiesOf(await signIn(scientistRow.email));
    session = await latestSession(scientistRow.id);
  });
  const call = (method: 'get' | 'put', path: string) =>
    request(server.url)[method](path).set({ Origin: server.url, Cookie: cookies });
  const choose = (organizationId: string) =>
    call('put', '/v1/sessions/current/organization').send({ organizationId });

  test('leaves an event in the one that is chosen, and none where that is the present one', async () => {
    await choose(larkmoor.id).expect(200);
    await choose(tarn.id).expect(200);
    await choose(tarn.id).expect(200);
    const { body } = await call('get', '/v1/audit-events').query({ actor: scientistRow.id });
    expect(body.items).toMatchObject([
      {
        act: 'organization.chosen',
        session,
        subject: { kind: 'organization', id: tarn.id },
        details: { name: tarn.name },
      },
    ]);
    const here = await eventsOf(admin, { actor: scientistRow.id });
    expect(here.map(({ act }) => act)).toEqual(['session.opened']);
  });

  test('and is thrown out of one leaves the end of the session there', async () => {
    await server.database.query(
      'DELETE FROM memberships WHERE person_id = $1 AND organization_id = $2',
      [scientistRow.id, tarn.id],
    );
    await refresh(cookies).expect(401);
    expect(await actsOn(server, session)).toEqual(['session.opened', 'session.ended']);
    const rows = await server.database.query<object[]>(
      `SELECT organization_id, details FROM audit_events WHERE act = 'session.ended'
       AND subject_id = $1`,
      [session],
    );
    expect(rows).toEqual([{ organization_id: tarn.id, details: { reason: 'left-organization' } }]);
  });
});

test('no event holds a key, a password or a token', async () => {
  const { body } = await developer.post('/v1/keys').send(wanted);
  const cookies = cookiesOf(await signIn(developerRow.email));
  const rows = await server.database.query<object[]>('SELECT e::text FROM audit_events e');
  const all = JSON.stringify(rows);
  expect(all).toContain(body.publicId);
  expect(all).not.toContain(body.key.slice(22));
  expect(all).not.toContain(demoPassword);
  for (const cookie of cookies.split('; ')) {
    expect(all).not.toContain(cookie.slice(cookie.indexOf('=') + 1));
  }
  expect(all).not.toMatch(/stepwell_[a-z2-7]{12}_/);
});
