import request from 'supertest';
import { demoPassword, demoPeople } from '../../server/services/demo/demo-data';
import { issuedKey } from '../../shared/keys';
import { signedIn, type Signed } from '../support/people';
import { startTestServer, type TestServer } from '../support/server';

/** An act and its event are one transaction: each is made to fail, and neither is there. */
let server: TestServer;
let developer: Signed;
let keyId: string;
beforeAll(async () => {
  server = await startTestServer();
  developer = await signedIn(server, 'developer@larkmoor.example');
  const issued = await developer.post('/v1/keys').send({ name: 'held', scopes: ['compute'] });
  keyId = issuedKey.parse(issued.body).id;
  // At commit, after all that a transaction does.
  await server.database.query(`
    CREATE FUNCTION refuse() RETURNS trigger LANGUAGE plpgsql AS
      $$ BEGIN RAISE EXCEPTION 'refused at commit'; END $$`);
});
afterAll(() => server.close());

const signIn = () =>
  request(server.url)
    .post('/v1/sessions')
    .set('Origin', server.url)
    .send({ email: demoPeople[2].email, password: demoPassword });

interface Row {
  readonly kind: string;
}
const events = (rows: Row[]) => rows.filter(({ kind }) => kind === 'event');
const others = (rows: Row[]) => rows.filter(({ kind }) => kind !== 'event');

/** Everything that acts change, and every event. */
const state = () =>
  server.database.query<Row[]>(`
    SELECT 'key' AS kind, to_jsonb(k) - 'last_used_at' AS row FROM api_keys k UNION ALL
    SELECT 'session', to_jsonb(s) FROM sessions s UNION ALL
    SELECT 'event', to_jsonb(e) FROM audit_events e ORDER BY 1, 2`);

const acts: [name: string, table: string, act: () => request.Test][] = [
  [
    'issuing a key',
    'api_keys',
    () => developer.post('/v1/keys').send({ name: 'new', scopes: ['compute'] }),
  ],
  ['revoking a key', 'api_keys', () => developer.post(`/v1/keys/${keyId}/revocation`)],
  ['signing in', 'sessions', signIn],
  ['signing out', 'sessions', () => developer.delete('/v1/sessions/current')],
];

async function failsWhole(table: string, act: () => request.Test): Promise<void> {
  await server.database.query(`
    CREATE CONSTRAINT TRIGGER refused AFTER INSERT OR UPDATE ON ${table}
    DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION refuse()`);
  try {
    const before = await state();
    expect((await act()).status).toBe(500);
    expect(await state()).toEqual(before);
  } finally {
    await server.database.query(`DROP TRIGGER refused ON ${table}`);
  }
}

test.each(acts)('%s does not happen where it cannot be recorded', async (_name, _table, act) => {
  await failsWhole('audit_events', act);
});

test.each(acts)('%s is not recorded where it does not happen', async (_name, table, act) => {
  await failsWhole(table, act);
});

test('unhindered, each of them changes one thing and leaves one event', async () => {
  for (const [name, , act] of acts) {
    const before = await state();
    expect([name, Math.floor((await act()).status / 100)]).toEqual([name, 2]);
    const after = await state();
    expect(events(after)).toHaveLength(events(before).length + 1);
    expect(others(after)).not.toEqual(others(before));
  }
});
