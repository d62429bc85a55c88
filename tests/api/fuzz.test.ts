import fc from 'fast-check';
import request from 'supertest';
import { problem } from '../../shared/problem';
import { phosphoric, postWithKey } from '../support/calls';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const decimalish = fc.oneof(
  fc.integer({ min: -60, max: 80 }).map(String),
  fc.double().map(String),
  fc.constantFrom('1e-400', '-0', '1e400', '7.', '', 'NaN', '0.'.padEnd(82, '1'), '\u0000'),
);
const anything = fc.oneof(fc.jsonValue(), decimalish);
const system = fc.record(
  {
    name: fc.oneof(fc.string(), anything),
    fullyProtonatedCharge: fc.oneof(fc.integer({ min: -5, max: 5 }), anything),
    pKa: fc.oneof(fc.array(decimalish, { maxLength: 6 }), anything),
  },
  { requiredKeys: [] },
);
const byId = fc.record({
  id: fc.oneof(
    fc.constantFrom('tris', 'tris@1', 'tris@99', 'no-such', 'tris@', '__proto__', 'a\u0000'),
    fc.string(),
    anything,
  ),
});
const body = fc.record(
  {
    system: fc.oneof(fc.constant(phosphoric), system, byId, anything),
    systems: fc.oneof(fc.array(fc.oneof(system, byId), { maxLength: 3 }), anything),
    pH: fc.oneof(
      decimalish,
      fc.array(decimalish, { maxLength: 4 }),
      fc.record({ from: decimalish, to: decimalish, step: decimalish }),
      anything,
    ),
    digits: fc.oneof(fc.integer({ min: -1, max: 62 }), anything),
    dryRun: fc.oneof(fc.boolean(), anything),
  },
  { requiredKeys: ['pH'] },
);

/** Every answer is an answer or a problem about the call, never a failure of ours. */
async function isCivil(sent: string | Buffer): Promise<void> {
  const answer = await postWithKey(server, '/v1/fractions')
    .set('Content-Type', 'application/json')
    .serialize(String)
    .send(sent);
  expect([200, 400, 413, 415, 422, 429]).toContain(answer.status);
  if (answer.status !== 200) expect(problem.safeParse(answer.body).error).toBeUndefined();
  else expect(answer.text).not.toMatch(/NaN|Infinity/);
}

test('bodies made from the schema and beside it get an answer or a clear refusal', async () => {
  await fc.assert(
    fc.asyncProperty(body, (value) => isCivil(JSON.stringify(value))),
    { numRuns: 700 },
  );
}, 60_000);

const search = fc.record(
  {
    query: fc.oneof(
      fc.string(),
      fc.string({ unit: 'grapheme' }),
      fc.constantFrom('%', "'", '\\', '^'),
    ),
    limit: fc.oneof(fc.integer({ min: -1, max: 102 }).map(String), fc.string()),
    cursor: fc.oneof(
      fc.base64String(),
      fc.jsonValue().map((value) => Buffer.from(JSON.stringify(value)).toString('base64url')),
    ),
  },
  { requiredKeys: [] },
);

test('searches of any kind get a list or a clear refusal', async () => {
  await fc.assert(
    fc.asyncProperty(search, fc.string(), async (query, id) => {
      const open = request(server.url);
      const list = await open.get('/v1/public/systems').query(query);
      expect([200, 400, 429]).toContain(list.status);
      const one = await open.get(`/v1/public/systems/${encodeURIComponent(id)}`);
      expect([200, 404, 429]).toContain(one.status);
    }),
    { numRuns: 230 },
  );
}, 60_000);

test('bytes of any kind get a clear refusal', async () => {
  await fc.assert(
    fc.asyncProperty(fc.uint8Array({ maxLength: 200 }), (bytes) => isCivil(Buffer.from(bytes))),
    { numRuns: 300 },
  );
}, 60_000);
