import request from 'supertest';
import type { Scope } from '../../shared/scopes';
import type { Member } from '../../server/services/caller';
import { demoKey, demoPeople } from '../../server/services/demo/demo-data';
import { makeKey } from '../../server/services/keys/key-format';
import { phosphoric } from '../support/calls';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

interface Wanted {
  readonly scopes?: Scope[];
  readonly issuer?: Member;
}
const issue = ({ scopes = ['compute'], issuer = demoKey.issuer }: Wanted = {}) =>
  server.services.keyConsole.issue(issuer, { name: 'test', scopes, expiresInDays: 1 });

const call = (authorization?: string) => {
  const post = request(server.url).post('/v1/fractions');
  if (authorization !== undefined) void post.set('Authorization', authorization);
  return post.send({ system: phosphoric, pH: '7' });
};
const bearer = (key: string) => `Bearer ${key}`;
const seen = async (authorization?: string) => {
  const { status, headers, body } = await call(authorization);
  return [status, headers['www-authenticate'], body.type?.split('/').pop()];
};

const realm = 'Bearer realm="stepwell"';
const invalidToken = `${realm}, error="invalid_token"`;

test('a good key computes, and Bearer may be written in any case', async () => {
  expect((await call(bearer(server.key))).status).toBe(200);
  expect((await call(`bearer ${server.key}`)).status).toBe(200);
});

test('no credential, or one of another kind, is a bare challenge', async () => {
  expect(await seen()).toEqual([401, realm, 'credential-missing']);
  expect(await seen('Basic eDp5')).toEqual([401, realm, 'credential-missing']);
});

test('a credential that is no token is an invalid request', async () => {
  const invalidRequest = [400, `${realm}, error="invalid_request"`, 'invalid-request'];
  expect(await seen('Bearer')).toEqual(invalidRequest);
  expect(await seen(`Bearer ${server.key} ${server.key}`)).toEqual(invalidRequest);
  expect(await seen('Bearer "quoted"')).toEqual(invalidRequest);
});

test('a mistyped key is told from a wrong one, before any look-up', async () => {
  const { key } = server;
  const mistyped = key.slice(0, -1) + (key.endsWith('a') ? 'b' : 'a');
  expect(await seen(bearer(mistyped))).toEqual([401, invalidToken, 'credential-malformed']);
  expect(await seen(bearer('x'))).toEqual([401, invalidToken, 'credential-malformed']);
});

test('a well-formed key that nobody issued is invalid', async () => {
  expect(await seen(bearer(makeKey().key))).toEqual([401, invalidToken, 'credential-invalid']);
});

test('the public part of a good key with another secret is invalid, and is not told why', async () => {
  const [good, other] = [await issue(), await issue()];
  await server.database.query('UPDATE api_keys SET digest = $1 WHERE id = $2', [
    Buffer.alloc(32),
    good.id,
  ]);
  await server.database.query('UPDATE api_keys SET revoked_at = now() WHERE id = $1', [good.id]);
  const { body } = await call(bearer(good.key));
  expect(body.detail).toBe('No such key.');
  expect((await call(bearer(other.key))).status).toBe(200);
});

test('an expired key is invalid', async () => {
  const { key, id } = await issue();
  await server.database.query('UPDATE api_keys SET expires_at = now() WHERE id = $1', [id]);
  expect((await call(bearer(key))).body.detail).toBe('The key has expired.');
});

test('a revoked key is dead at its next call', async () => {
  const { key, id } = await issue();
  expect((await call(bearer(key))).status).toBe(200);
  await server.database.query('UPDATE api_keys SET revoked_at = now() WHERE id = $1', [id]);
  expect(await seen(bearer(key))).toEqual([401, invalidToken, 'credential-invalid']);
});

test('a key without the scope is forbidden and told which one it needs', async () => {
  const { key } = await issue({ scopes: ['systems:read', 'usage:read'] });
  expect(await seen(bearer(key))).toEqual([
    403,
    `${realm}, error="insufficient_scope", scope="compute"`,
    'scope-insufficient',
  ]);
});

test('a key is worth no more than its issuer’s present role, at each call', async () => {
  const admin = demoPeople[0];
  const issuer = { ...demoKey.issuer, personId: admin.id, role: admin.role };
  const { key } = await issue({ scopes: ['compute', 'usage:read'], issuer });
  const scopes = async () => {
    const found = await server.services.keys.authenticate(key);
    return found.ok ? [...found.caller.scopes] : found.reason;
  };
  const query = (statement: string) => server.database.query(statement, [admin.id]);
  expect(await scopes()).toEqual(['compute', 'usage:read']);
  await query(`UPDATE memberships SET role = 'scientist' WHERE person_id = $1`);
  expect(await scopes()).toEqual(['compute']);
  await query('DELETE FROM memberships WHERE person_id = $1');
  expect(await scopes()).toBe('issuer-left');
});

test('the use of a key is noted', async () => {
  const { key, id } = await issue();
  await call(bearer(key));
  const rows = await server.database.query<[{ last_used_at: Date }]>(
    'SELECT last_used_at FROM api_keys WHERE id = $1',
    [id],
  );
  expect(rows[0].last_used_at).toBeInstanceOf(Date);
});

test('the key itself is nowhere in the database', async () => {
  const { key } = await issue();
  const secret = key.slice(22);
  const rows = await server.database.query<object[]>('SELECT k::text AS row FROM api_keys k');
  expect(rows.length).toBeGreaterThan(0);
  expect(JSON.stringify(rows)).not.toContain(secret);
});

test('no log line holds a key, wherever a caller put it', async () => {
  const { key } = await issue();
  await call(bearer(key));
  await request(server.url).get(`/v1/${key}?key=${key}`).set('User-Agent', key);
  await request(server.url)
    .post('/v1/fractions')
    .set('Authorization', bearer(server.key))
    .send(`{"${key}`);
  expect(server.logs.length).toBeGreaterThan(2);
  expect(server.logs.join('')).not.toContain(key);
  expect(server.logs.join('')).toContain('/v1/stepwell_[struck]');
});
