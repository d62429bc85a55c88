import { randomUUID } from 'node:crypto';
import type { DataSource } from 'typeorm';
import { createDataSource } from '../../server/database/data-source';
import { migrate } from '../../server/database/migrate';
import { recordAct } from '../../server/services/audit/record-act';
import { createTestDatabase, type TestDatabase } from '../support/database';

/** What the running server's role can do to events, and what their owner can do by accident. */
let place: TestDatabase;
let owner: DataSource;
let running: DataSource;
const organizationId = randomUUID();
beforeAll(async () => {
  place = await createTestDatabase();
  owner = await createDataSource(place.url).initialize();
  running = await createDataSource(place.appUrl).initialize();
  await migrate(owner, place.appRole);
  // A later start grants afresh; the events must stay as closed as they were.
  await migrate(owner, place.appRole);
  await recordAct(
    running.manager,
    { organizationId },
    {
      act: 'key.revoked',
      subjectId: randomUUID(),
      details: { publicId: 'axdkhovjww3s', name: 'x' },
    },
  );
});
afterAll(async () => {
  await Promise.all([running.destroy(), owner.destroy()]);
  await place.drop();
});

const events = () => running.query<object[]>('SELECT * FROM audit_events');

const changes = [
  `UPDATE audit_events SET act = 'key.issued'`,
  `UPDATE audit_events SET at = now() WHERE false`,
  'DELETE FROM audit_events',
  'DELETE FROM audit_events WHERE false',
  'TRUNCATE audit_events',
  `INSERT INTO audit_events SELECT * FROM audit_events
   ON CONFLICT (id) DO UPDATE SET act = 'key.issued'`,
];

test('the running role adds events and reads them', async () => {
  expect(await events()).toMatchObject([{ organization_id: organizationId, act: 'key.revoked' }]);
});

/** Insufficient privilege, by PostgreSQL's list of codes. */
const refused = { code: '42501' };

test.each(changes)('the running role has no right to: %s', async (statement) => {
  await expect(running.query(statement)).rejects.toMatchObject({
    ...refused,
    message: expect.stringMatching(/permission denied/),
  });
  expect(await events()).toHaveLength(1);
});

test.each([
  'SELECT * FROM audit_events FOR UPDATE',
  'ALTER TABLE audit_events DISABLE TRIGGER audit_events_append_only',
  'DROP TRIGGER audit_events_append_only ON audit_events',
  'DROP TABLE audit_events',
  'DROP FUNCTION refuse_change_of_audit_events CASCADE',
  'ALTER TABLE audit_events RENAME TO events',
  'CREATE RULE gone AS ON INSERT TO audit_events DO INSTEAD NOTHING',
  `SET session_replication_role = 'replica'`,
])('nor to go round that: %s', async (statement) => {
  await expect(running.query(statement)).rejects.toMatchObject(refused);
});

test.each(changes)('even the owner is stopped at: %s', async (statement) => {
  await expect(owner.query(statement)).rejects.toMatchObject({
    ...refused,
    message: 'audit_events is only added to',
  });
  expect(await events()).toHaveLength(1);
});
