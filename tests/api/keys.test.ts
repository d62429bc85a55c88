import request from 'supertest';
import { issuedKey, keyList } from '../../shared/keys';
import { faultsIn, phosphoric } from '../support/calls';
import { signedIn, type Signed } from '../support/people';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
let admin: Signed;
let developer: Signed;
let scientist: Signed;
let stranger: Signed;
beforeAll(async () => {
  server = await startTestServer();
  admin = await signedIn(server, 'admin@larkmoor.example');
  developer = await signedIn(server, 'developer@larkmoor.example');
  scientist = await signedIn(server, 'scientist@larkmoor.example');
  stranger = await signedIn(server, 'admin@tarnstreet.example');
});
afterAll(() => server.close());

const wanted = { name: 'lims-nightly', scopes: ['compute'] };
const issue = async (person: Signed, change: object = {}) =>
  issuedKey.parse((await person.post('/v1/keys').send({ ...wanted, ...change })).body);
const compute = (key: string) =>
  request(server.url)
    .post('/v1/fractions')
    .set('Authorization', `Bearer ${key}`)
    .send({ system: phosphoric, pH: '7' });
const idsOf = async (person: Signed) =>
  keyList.parse((await person.get('/v1/keys')).body).items.map(({ id }) => id);

test('an issued key computes; revoked, its next call is refused', async () => {
  const { key, id } = await issue(admin);
  expect((await compute(key)).status).toBe(200);
  const revoked = await admin.post(`/v1/keys/${id}/revocation`);
  expect([revoked.status, revoked.body.state]).toEqual([200, 'revoked']);
  expect((await compute(key)).status).toBe(401);
});

test('revoking twice keeps the first moment', async () => {
  const { id } = await issue(admin);
  const first = await admin.post(`/v1/keys/${id}/revocation`);
  const second = await admin.post(`/v1/keys/${id}/revocation`);
  expect(second.body).toEqual(first.body);
});

test('a key lives ninety days unless told otherwise, and a year at most', async () => {
  const days = ({ expiresAt }: { expiresAt: string }) =>
    Math.round((Date.parse(expiresAt) - Date.now()) / 86_400_000);
  expect(days(await issue(developer))).toBe(90);
  expect(days(await issue(developer, { expiresInDays: 365 }))).toBe(365);
  const longer = await developer.post('/v1/keys').send({ ...wanted, expiresInDays: 366 });
  expect(faultsIn(longer.body)).toEqual(['/expiresInDays out-of-range']);
});

test('the answer that shows a key is stored by nobody, and its address tells the rest', async () => {
  const answer = await developer.post('/v1/keys').send(wanted);
  expect(answer.headers['cache-control']).toBe('no-store');
  const known = await developer.get(String(answer.headers.location));
  expect(known.body).toMatchObject({ publicId: answer.body.publicId, state: 'active' });
  expect(known.text).not.toContain(answer.body.key);
});

test('a developer sees own keys, an admin all, another organization none', async () => {
  const [own, other] = [await issue(developer), await issue(admin)];
  expect(await idsOf(developer)).toContain(own.id);
  expect(await idsOf(developer)).not.toContain(other.id);
  expect(await idsOf(admin)).toEqual(expect.arrayContaining([own.id, other.id]));
  expect(await idsOf(stranger)).toEqual([]);
  for (const [person, id] of [
    [developer, other.id],
    [stranger, own.id],
  ] as const) {
    expect((await person.get(`/v1/keys/${id}`)).status).toBe(404);
    expect((await person.post(`/v1/keys/${id}/revocation`)).status).toBe(404);
  }
  expect((await compute(own.key)).status).toBe(200);
});

test('a scientist has no keys and is told so', async () => {
  const { id } = await issue(admin);
  const answers = [
    await scientist.get('/v1/keys'),
    await scientist.post('/v1/keys').send(wanted),
    await scientist.get(`/v1/keys/${id}`),
    await scientist.post(`/v1/keys/${id}/revocation`),
  ];
  for (const { status, body } of answers) {
    expect([status, body.detail]).toEqual([403, 'This is for whoever is admin or developer here.']);
  }
});

test('a key cannot keep keys', async () => {
  const call = request(server.url).get('/v1/keys').set('Authorization', `Bearer ${server.key}`);
  const { status, body } = await call;
  expect([status, body.type.split('/').pop()]).toEqual([401, 'sign-in-needed']);
});

test('pages follow each other without gap or repetition while keys are issued', async () => {
  const issued = [];
  for (let i = 0; i < 6; i += 1) issued.push((await issue(stranger, { name: `key ${i}` })).id);
  const seen: string[] = [];
  let path: string | undefined = '/v1/keys?limit=3';
  while (path) {
    const page = await stranger.get(path);
    seen.push(...keyList.parse(page.body).items.map(({ id }) => id));
    await issue(stranger, { name: 'in between' });
    path = /<(.*)>; rel="next"/.exec(page.headers.link ?? '')?.[1];
  }
  expect(seen).toEqual(issued.reverse());
});

test.each([
  ['/v1/keys?limit=0', '?limit out-of-range'],
  ['/v1/keys?limit=101', '?limit out-of-range'],
  ['/v1/keys?limit=x', '?limit wrong-type'],
  ['/v1/keys?cursor=x', '?cursor not-a-cursor'],
  ['/v1/keys?page=2', '?page unknown-field'],
])('%s is a 400 that names the parameter', async (path, fault) => {
  const { status, body } = await admin.get(path);
  expect([status, ...faultsIn(body)]).toEqual([400, fault]);
});

test.each([
  [{ name: '' }, '/name out-of-range'],
  [{ name: 'x'.repeat(81) }, '/name out-of-range'],
  [{ scopes: [] }, '/scopes out-of-range'],
  [{ scopes: ['everything'] }, '/scopes/0 invalid-value'],
  [{ scopes: ['compute', 'compute'] }, '/scopes repeated'],
  [{ networks: ['10.0.0.0/8'] }, '/networks unknown-field'],
])('a key with %j is refused', async (change, fault) => {
  const { status, body } = await admin.post('/v1/keys').send({ ...wanted, ...change });
  expect([status, ...faultsIn(body)]).toEqual([400, fault]);
});

test('an id that is none is not found', async () => {
  expect((await admin.get('/v1/keys/x')).status).toBe(404);
  expect((await admin.post('/v1/keys/%00/revocation')).status).toBe(404);
});
