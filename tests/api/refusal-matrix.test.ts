import request from 'supertest';
import { scopes, scopesOfRole, type Role } from '../../shared/scopes';
import { operations } from '../../server/routes';
import { demoKey } from '../../server/services/demo/demo-data';
import { makeKey } from '../../server/services/keys/key-format';
import { signedIn, type Signed } from '../support/people';
import { startTestServer, type TestServer } from '../support/server';

/** Who may call what, over every operation there is: a new operation is in it by being declared. */
let server: TestServer;
let people: Record<Role, Signed>;
let stranger: Signed;
const keys: Record<string, string> = {};

beforeAll(async () => {
  server = await startTestServer();
  people = {
    admin: await signedIn(server, 'admin@larkmoor.example'),
    developer: await signedIn(server, 'developer@larkmoor.example'),
    scientist: await signedIn(server, 'scientist@larkmoor.example'),
  };
  stranger = await signedIn(server, 'admin@tarnstreet.example');
  const issue = () =>
    server.services.keyConsole.issue(demoKey.issuer, {
      name: 'matrix',
      scopes: ['compute'],
      expiresInDays: 1,
    });
  const [expired, revoked] = [await issue(), await issue()];
  await server.database.query('UPDATE api_keys SET expires_at = now() WHERE id = $1', [expired.id]);
  await server.database.query('UPDATE api_keys SET revoked_at = now() WHERE id = $1', [revoked.id]);
  const mistyped = server.key.slice(0, -1) + (server.key.endsWith('a') ? 'b' : 'a');
  Object.assign(keys, {
    malformed: 'stepwell_x',
    'wrong checksum': mistyped,
    unknown: makeKey().key,
    expired: expired.key,
    revoked: revoked.key,
  });
});
afterAll(() => server.close());

type Operation = (typeof operations)[number];
const nobody = () => request(server.url);
const uuid = '00000000-0000-4000-8000-000000000000';

/** Status of a call that is right in nothing but who makes it. */
const statusOf = async (
  caller: { [method in Operation['method']]: (path: string) => request.Test },
  { method, path }: Operation,
  headers: Record<string, string> = {},
) => (await caller[method](path.replace(/\{\w+\}/g, uuid)).set(headers)).status;

const bearer = (key = '') => ({ Authorization: `Bearer ${key}` });
const cases = operations.map((operation) => [operation.operationId, operation] as const);
const has = (part: 'scope' | 'roles', { access }: Operation) =>
  typeof access === 'object' && part in access;
const scoped = cases.filter(([, operation]) => has('scope', operation));
const personal = cases.filter(([, operation]) => has('roles', operation));
const ownPages = cases.filter(([, { access }]) => access === 'own-pages');
const open = cases.filter(([, { access }]) => access === 'public');

test('every operation is in one row of the matrix', () => {
  expect(scoped.length + personal.length + ownPages.length + open.length).toBe(operations.length);
});

test.each(open)('%s asks nobody who they are', async (_name, operation) => {
  expect([401, 403]).not.toContain(await statusOf(nobody(), operation));
});

test.each(ownPages)('%s refuses whoever is not on our own pages', async (_name, operation) => {
  expect(await statusOf(nobody(), operation)).toBe(403);
  expect(await statusOf(nobody(), operation, { Origin: 'http://evil.example' })).toBe(403);
});

describe.each(scoped)('%s', (_name, operation) => {
  const { access } = operation;
  const scope = typeof access === 'object' && 'scope' in access ? access.scope : scopes[0];

  test('refuses whoever sends no credential', async () => {
    expect(await statusOf(nobody(), operation)).toBe(401);
  });

  test.each(['malformed', 'wrong checksum', 'unknown', 'expired', 'revoked'])(
    'refuses a key that is %s',
    async (kind) => {
      expect(await statusOf(nobody(), operation, bearer(keys[kind]))).toBe(401);
    },
  );

  test('refuses a key with every scope but its own', async () => {
    const { key } = await server.services.keyConsole.issue(demoKey.issuer, {
      name: 'other scopes',
      scopes: scopes.filter((other) => other !== scope),
      expiresInDays: 1,
    });
    expect(await statusOf(nobody(), operation, bearer(key))).toBe(403);
  });

  test.each(['admin', 'developer', 'scientist'] as const)(
    'lets %s in as the role has it',
    async (role) => {
      const refused = !scopesOfRole[role].includes(scope);
      expect((await statusOf(people[role], operation)) === 403).toBe(refused);
    },
  );
});

describe.each(personal)('%s', (_name, operation) => {
  const { access } = operation;
  const allowed = typeof access === 'object' && 'roles' in access ? access.roles : [];

  test('refuses whoever is not signed in', async () => {
    expect(await statusOf(nobody(), operation)).toBe(401);
  });

  test('refuses a good key', async () => {
    expect(await statusOf(nobody(), operation, bearer(server.key))).toBe(401);
  });

  test('refuses forged cookies', async () => {
    const forged = { Cookie: 'stepwell_access=x.y.z', Origin: server.url };
    expect(await statusOf(nobody(), operation, forged)).toBe(401);
  });

  if (operation.operationId === 'signOut') return;

  test.each(['admin', 'developer', 'scientist'] as const)(
    'lets %s in as the role has it',
    async (role) => {
      const refused = !allowed.includes(role);
      expect((await statusOf(people[role], operation)) === 403).toBe(refused);
    },
  );

  test('shows another organization nothing of ours', async () => {
    const { id, publicId } = await server.services.keyConsole.issue(demoKey.issuer, {
      name: 'ours',
      scopes: ['compute'],
      expiresInDays: 1,
    });
    const path = operation.path.replace('{id}', id);
    const answer = await stranger[operation.method](path);
    expect(answer.text).not.toContain(publicId);
    if (operation.path.includes('{id}')) expect(answer.status).toBe(404);
  });
});
