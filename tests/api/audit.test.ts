import { randomUUID } from 'node:crypto';
import fc from 'fast-check';
import { auditList } from '../../shared/audit';
import { issuedKey } from '../../shared/keys';
import { demoOrganizations, demoPeople } from '../../server/services/demo/demo-data';
import { eventsOf } from '../support/audit';
import { faultsIn } from '../support/calls';
import { signedIn, type Signed } from '../support/people';
import { startTestServer, type TestServer } from '../support/server';

/** How events are read. */
let server: TestServer;
let admin: Signed;
let developer: Signed;
let stranger: Signed;
beforeAll(async () => {
  server = await startTestServer();
  admin = await signedIn(server, 'admin@larkmoor.example');
  developer = await signedIn(server, 'developer@larkmoor.example');
  stranger = await signedIn(server, 'admin@tarnstreet.example');
});
afterAll(() => server.close());

const [larkmoor, tarn] = demoOrganizations;
const [adminRow, developerRow] = demoPeople;

const issue = async (person: Signed, name = 'lims') => {
  const answer = await person.post('/v1/keys').send({ name, scopes: ['compute'] });
  return issuedKey.parse(answer.body);
};
const nextOf = (link: string | undefined) => /<(.*)>; rel="next"/.exec(link ?? '')?.[1];

/** An event of long ago, as only the owner of the table can write one. */
const addAt = (at: string, organizationId: string | null = larkmoor.id, keyId?: string) =>
  server.database.query(
    `INSERT INTO audit_events (id, organization_id, key_id, act, subject_kind, details, at)
     VALUES ($1, $2, $3, 'key.revoked', 'key', '{}', $4)`,
    [randomUUID(), organizationId, keyId ?? null, at],
  );

test.each(['developer@larkmoor.example', 'scientist@larkmoor.example'])(
  '%s may not read them',
  async (email) => {
    const person = await signedIn(server, email);
    const { status, body } = await person.get('/v1/audit-events');
    expect([status, body.detail]).toEqual([403, 'This is for whoever is admin here.']);
  },
);

test('the newest stand first', async () => {
  const [first, second] = [await issue(admin), await issue(developer)];
  const subjects = (await eventsOf(admin, { limit: '2' })).map(({ subject }) => subject.id);
  expect(subjects).toEqual([second.id, first.id]);
});

describe('those of another organization, or of none,', () => {
  test('are never seen, whatever is asked for', async () => {
    const { id } = await issue(admin);
    await addAt('2019-05-01T00:00:00Z', null);
    const [newest] = await eventsOf(admin);
    expect(newest?.subject.id).toBe(id);
    const asked: Record<string, string>[] = [
      { subject: id },
      { actor: adminRow.id },
      { to: newest?.at ?? '' },
      {},
    ];
    for (const query of asked) {
      for (const event of await eventsOf(stranger, { ...query, limit: '1000' })) {
        const [row] = await server.database.query<[{ organization_id: string }]>(
          'SELECT organization_id FROM audit_events WHERE id = $1',
          [event.id],
        );
        expect(row.organization_id).toBe(tarn.id);
      }
    }
    expect(await eventsOf(stranger, { subject: id })).toEqual([]);
    expect(await eventsOf(admin, { to: '2019-06-01T00:00:00Z' })).toEqual([]);
  });

  test('are not reached by a cursor from there either', async () => {
    for (let i = 0; i < 3; i += 1) await issue(admin);
    const page = await admin.get('/v1/audit-events?limit=1');
    const beyond = await stranger.get(nextOf(page.headers.link) ?? '').expect(200);
    const ours = new Set((await eventsOf(admin, { limit: '1000' })).map(({ id }) => id));
    for (const { id } of auditList.parse(beyond.body).items) expect(ours).not.toContain(id);
  });
});

describe('pages', () => {
  /** Every page of an address, while events are added in between. */
  async function pagesFrom(path: string, accept: string) {
    const pages = [];
    for (let next: string | undefined = path; next;) {
      const answer = await admin.get(next).set('Accept', accept).expect(200);
      pages.push(answer);
      next = nextOf(answer.headers.link);
      await issue(admin, 'in between');
    }
    return pages;
  }

  test('follow each other without gap or repetition while acts go on', async () => {
    const before = await eventsOf(admin, { limit: '1000' });
    const pages = await pagesFrom('/v1/audit-events?limit=3', 'application/json');
    const seen = pages.flatMap(({ body }) => auditList.parse(body).items);
    expect(seen).toEqual(before);
    expect(pages.length).toBe(Math.ceil(before.length / 3));
  });

  test('keep what was asked for, and tell events of one moment apart', async () => {
    const moment = '2020-02-29T12:00:00.123Z';
    const keyId = randomUUID();
    for (let i = 0; i < 5; i += 1) await addAt(moment, larkmoor.id, keyId);
    await addAt(moment);
    const asked = new URLSearchParams({
      act: 'key.revoked',
      actor: keyId,
      from: moment,
      to: '2020-02-29T13:00:00+00:00',
      limit: '2',
    });
    const pages = await pagesFrom(`/v1/audit-events?${asked}`, 'application/json');
    const seen = pages.flatMap(({ body }) => auditList.parse(body).items);
    expect(pages).toHaveLength(3);
    expect(new Set(seen.map(({ id }) => id)).size).toBe(5);
    for (const event of seen) expect(event.key).toEqual({ id: keyId, publicId: null });
  });

  test('as files have the same rows, each with its header', async () => {
    const before = await eventsOf(admin, { limit: '1000', act: 'session.opened' });
    const pages = await pagesFrom('/v1/audit-events?act=session.opened&limit=2', 'text/csv');
    const rows = pages.flatMap(({ text }) => text.trimEnd().split('\r\n').slice(1));
    expect(rows.map((row) => row.split(',').at(-1))).toEqual(before.map(({ id }) => id));
    for (const { headers, text } of pages) {
      expect(headers['content-type']).toBe('text/csv; charset=utf-8; header=present');
      expect(text).toMatch(/^at,act,person_id,/);
    }
  });
});

test('an act, a person, a thing can each be asked for', async () => {
  const { id } = await issue(developer);
  await admin.post(`/v1/keys/${id}/revocation`).expect(200);
  const actsIn = async (query: Record<string, string>) =>
    (await eventsOf(admin, { subject: id, ...query })).map(({ act }) => act);
  expect(await actsIn({})).toEqual(['key.revoked', 'key.issued']);
  expect(await actsIn({ act: 'key.issued' })).toEqual(['key.issued']);
  expect(await actsIn({ actor: adminRow.id })).toEqual(['key.revoked']);
  expect(await actsIn({ actor: developerRow.id })).toEqual(['key.issued']);
  expect(await actsIn({ actor: developerRow.id, act: 'key.revoked' })).toEqual([]);
});

test('a span begins with its first moment and ends before its last, in any offset', async () => {
  const days = ['2021-03-01', '2021-03-02', '2021-03-03'].map((day) => `${day}T00:00:00.000Z`);
  for (const day of days) await addAt(day);
  const within = async (from: string, to: string) =>
    (await eventsOf(admin, { from, to })).map(({ at }) => at);
  expect(await within('2021-03-01T00:00:00Z', '2021-03-03T00:00:00Z')).toEqual([days[1], days[0]]);
  expect(await within('2021-03-02T02:00:00+02:00', '2021-03-02T00:00:00.001Z')).toEqual([days[1]]);
  expect(await within('2021-03-02T00:00:00.001Z', '2021-03-02T23:59:59Z')).toEqual([]);
  expect(await within('0000-01-01T00:00:00+23:59', '2021-03-02T00:00:00Z')).toContain(days[0]);
  expect(await within('2021-03-03T00:00:00Z', '9999-12-31T23:59:59-23:59')).toContain(days[2]);
  expect(await within('2021-03-03T00:00:00Z', '2021-03-01T00:00:00Z')).toEqual([]);
});

test.each([
  ['limit=0', '?limit out-of-range'],
  ['limit=1001', '?limit out-of-range'],
  ['limit=x', '?limit wrong-type'],
  ['cursor=x', '?cursor not-a-cursor'],
  ['act=key.stolen', '?act invalid-value'],
  ['act=key.issued&act=key.revoked', '?act invalid-value'],
  ['actor=me', '?actor invalid-value'],
  ['subject=%00', '?subject unfit-character'],
  ['subject=', '?subject out-of-range'],
  ['from=yesterday', '?from invalid-value'],
  ['from=2026-02-30T00:00:00Z', '?from invalid-value'],
  ['to=2026-12-01T00:00:00', '?to invalid-value'],
  ['organization=x', '?organization unknown-field'],
])('%s is a 400 that names the parameter', async (query, fault) => {
  const { status, body } = await admin.get(`/v1/audit-events?${query}`);
  expect([status, ...faultsIn(body)]).toEqual([400, fault]);
});

test('a name that is a formula is text in the file, and itself in JSON', async () => {
  const formula = '=HYPERLINK("http://evil.example";"Open")';
  await server.database.query('UPDATE people SET name = $1 WHERE id = $2', [
    formula,
    developerRow.id,
  ]);
  const { id } = await issue(developer, '@SUM(A1), "x"');
  const [event] = await eventsOf(admin, { subject: id });
  expect(event?.person?.name).toBe(formula);
  const { text } = await admin.get(`/v1/audit-events?subject=${id}`).set('Accept', 'text/csv');
  expect(text).toContain(`,"'=HYPERLINK(""http://evil.example"";""Open"")",`);
  expect(text).toContain('""name"":""@SUM(A1), \\""x\\""""');
  expect(text).not.toMatch(/(^|,)"?[=+@-]/m);
});

test('an answer is kept by nobody between', async () => {
  const { headers } = await admin.get('/v1/audit-events');
  expect(headers['cache-control']).toBe('no-store');
});

const moment = fc
  .date({ min: new Date('0000-01-01T00:00:00Z'), max: new Date('9999-12-31T23:59:59Z') })
  .filter((date) => !Number.isNaN(date.getTime()))
  .map((date) => date.toISOString());
const cursor = fc
  .tuple(fc.oneof(moment, fc.string()), fc.oneof(fc.uuid(), fc.string()))
  .map((place) => Buffer.from(JSON.stringify(place)).toString('base64url'));
const asked = fc.record(
  {
    act: fc.oneof(fc.constantFrom('key.issued', 'session.opened'), fc.string()),
    actor: fc.oneof(fc.uuid(), fc.string()),
    subject: fc.string({ unit: 'grapheme' }),
    from: fc.oneof(moment, fc.string()),
    to: fc.oneof(moment, fc.string()),
    cursor: fc.oneof(cursor, fc.base64String()),
  },
  { requiredKeys: [] },
);

test('questions of any kind get a list or a clear refusal', async () => {
  // So that no answer is only that there were too many calls.
  await server.database.query('DELETE FROM rate_windows');
  await fc.assert(
    fc.asyncProperty(asked, async (query) => {
      const { status } = await admin.get('/v1/audit-events').query(query);
      expect([200, 400]).toContain(status);
    }),
    { numRuns: 100 },
  );
});
