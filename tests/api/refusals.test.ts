import request from 'supertest';
import { faultsIn, phosphoric, postWithKey } from '../support/calls';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const system = phosphoric;
const send = (body: string | Buffer, type = 'application/json') =>
  postWithKey(server, '/v1/fractions').set('Content-Type', type).serialize(String).send(body);

const wrongBodies: [name: string, body: unknown, fault: string][] = [
  [
    'a number for a constant',
    { system: { ...system, pKa: ['2', 7.2] }, pH: '7' },
    '/system/pKa/1 decimal-must-be-string',
  ],
  ['a number for the pH', { system, pH: 7.4 }, '/pH decimal-must-be-string'],
  ['a number in a list of pH', { system, pH: ['7', 8] }, '/pH/1 decimal-must-be-string'],
  [
    'a number for a step',
    { system, pH: { from: '0', to: '1', step: 0.1 } },
    '/pH/step decimal-must-be-string',
  ],
  ['a decimal comma', { system, pH: '7,4' }, '/pH not-a-decimal'],
  ['a pH out of range', { system, pH: '41' }, '/pH out-of-range'],
  [
    'a constant out of range',
    { system: { ...system, pKa: ['-51'] }, pH: '7' },
    '/system/pKa/0 out-of-range',
  ],
  ['an unknown field', { system, pH: '7', digit: 5 }, '/digit unknown-field'],
  [
    'a condition that is none',
    { system, pH: '7', conditions: { ionicstrength: '0.1' } },
    '/conditions/ionicstrength unknown-field',
  ],
  [
    'a system both by id and in full',
    { system: { ...system, id: 'x' }, pH: '7' },
    '/system/id unknown-field',
  ],
  ['a field with a pointer to escape', { system, pH: '7', 'a/b~c': 1 }, '/a~1b~0c unknown-field'],
  ['no pH', { system }, '/pH missing'],
  ['no system', { pH: '7' }, '/system one-of'],
  ['both kinds of system', { system, systems: [system], pH: '7' }, '/systems one-of'],
  ['no constants', { system: { ...system, pKa: [] }, pH: '7' }, '/system/pKa out-of-range'],
  [
    '65 protons',
    { system: { ...system, pKa: Array(65).fill('7') }, pH: '7' },
    '/system/pKa out-of-range',
  ],
  ['101 systems', { systems: Array(101).fill(system), pH: '7' }, '/systems out-of-range'],
  ['no digits', { system, pH: '7', digits: 0 }, '/digits out-of-range'],
  ['61 digits', { system, pH: '7', digits: 61 }, '/digits out-of-range'],
  ['half a digit', { system, pH: '7', digits: 1.5 }, '/digits wrong-type'],
  [
    'a fractional charge',
    { system: { ...system, fullyProtonatedCharge: 0.5 }, pH: '7' },
    '/system/fullyProtonatedCharge wrong-type',
  ],
  [
    'a step of nothing',
    { system, pH: { from: '0', to: '14', step: '0' } },
    '/pH/step out-of-range',
  ],
  [
    'a step backwards',
    { system, pH: { from: '0', to: '14', step: '-1' } },
    '/pH/step out-of-range',
  ],
  ['a grid backwards', { system, pH: { from: '14', to: '0', step: '1' } }, '/pH/to out-of-range'],
  [
    'a grid too fine',
    { system, pH: { from: '0', to: '14', step: '1e-50' } },
    '/pH/step over-limit',
  ],
  ['no pH in the list', { system, pH: [] }, '/pH out-of-range'],
  [
    'a NUL in a name',
    { system: { ...system, name: 'a\u0000b' }, pH: '7' },
    '/system/name unfit-character',
  ],
  ['an empty name', { system: { ...system, name: '  ' }, pH: '7' }, '/system/name out-of-range'],
];

test.each(wrongBodies)('%s is a 400 that points at it', async (_name, body, fault) => {
  const { status, body: answer } = await send(JSON.stringify(body));
  expect(status).toBe(400);
  expect(faultsIn(answer)).toContain(fault);
});

test('a name that poisons prototypes is only an unknown field', async () => {
  const { body } = await send(
    `{"pH":"7","system":{"fullyProtonatedCharge":0,"pKa":["7"]},"__proto__":{"digits":3}}`,
  );
  expect(faultsIn(body)).toEqual(['/__proto__ unknown-field']);
});

const wrongBytes: [
  name: string,
  body: string | Buffer,
  type: string | undefined,
  status: number,
][] = [
  ['half a value', '{"system":', undefined, 400],
  ['nothing', '', undefined, 400],
  ['a bare word', 'NaN', undefined, 400],
  ['a string', '"x"', undefined, 400],
  ['null', 'null', undefined, 400],
  ['a list', '[]', undefined, 400],
  ['bytes that are no UTF-8', Buffer.from([0x22, 0xff, 0xfe, 0x22]), undefined, 400],
  ['a form', 'pH=7', 'application/x-www-form-urlencoded', 415],
  ['UTF-16', Buffer.from('{}', 'utf16le'), 'application/json; charset=utf-16', 415],
  ['no type', '{}', '', 415],
  ['a megabyte and more', `{"pH":"${'7'.repeat(1_000_001)}"}`, undefined, 413],
];

test.each(wrongBytes)('%s is refused in words', async (_name, body, type, status) => {
  const answer = await send(body, type);
  expect(answer.status).toBe(status);
  expect(answer.headers['content-type']).toBe('application/problem+json; charset=utf-8');
  expect(answer.body.requestId).toBe(answer.headers['x-request-id']);
});

test.each(['gzip', 'br', 'deflate', 'x-other'])(
  'a body with Content-Encoding %s is refused in words',
  async (encoding) => {
    const { status, body } = await postWithKey(server, '/v1/fractions')
      .set({ 'Content-Type': 'application/json', 'Content-Encoding': encoding })
      .serialize(String)
      .send('{}');
    expect([status, body.detail]).toEqual([415, 'Send the body without Content-Encoding.']);
  },
);

test('a name that comes twice is refused, not the last one taken', async () => {
  const { status, body } = await send('{"system":{"pKa":["7"],"pKa":["3"]},"pH":"7"}');
  expect([status, ...faultsIn(body)]).toEqual([400, '/system/pKa duplicate-field']);
});

test('a refusal does not throw a large body back', async () => {
  const { text } = await send(`{"${'k'.repeat(900_000)}":1}`);
  expect(text.length).toBeLessThan(2_000);
  const name = 'k'.repeat(400_000);
  expect((await send(`{"${name}":1,"${name}":2}`)).text.length).toBeLessThan(2_000);
});

test('deep nesting is refused, not followed', async () => {
  const { status } = await send('['.repeat(400_000) + ']'.repeat(400_000));
  expect(status).toBe(400);
});

test('a problem names a page that opens and says what to do', async () => {
  const { body } = await send('{');
  expect(body.type).toBe(`${server.url}/problems/malformed-json`);
  const page = await request(server.url).get(new URL(body.type).pathname);
  expect(page.text).toContain(body.title);
  expect((await request(server.url).get('/problems/constructor')).status).toBe(404);
});

test('an unknown address is a 404, whatever is asked of it', async () => {
  for (const path of ['/v1/nothing', '/v1/fractions/', '/v1/Fractions', '/%E0%A4%A', '/v1/%00']) {
    const answer = await request(server.url).get(path);
    expect([path, answer.status, answer.body.title]).toEqual([
      path,
      404,
      'There is nothing at this address',
    ]);
  }
});

test('another method is a 405 that names those there are', async () => {
  const answer = await request(server.url).put('/v1/fractions').send({});
  expect([answer.status, answer.headers.allow]).toEqual([405, 'POST, OPTIONS']);
  expect((await request(server.url).delete('/v1/limits')).headers.allow).toBe('GET, HEAD, OPTIONS');
  expect((await request(server.url).options('/v1/limits')).status).toBe(204);
  expect((await request(server.url).head('/v1/limits')).status).toBe(200);
});

test('an answer in a form we do not have is a 406', async () => {
  const answer = await postWithKey(server, '/v1/fractions')
    .set('Accept', 'application/xml')
    .send({ system, pH: '7' });
  expect(answer.status).toBe(406);
});

test.each(['0x10', '1e1', '+5', '5.0', '', ' 5', 'true'])(
  'digits=%s is no whole number in a query',
  async (digits) => {
    const path = `/v1/systems/tris/fractions?pH=7&digits=${encodeURIComponent(digits)}`;
    const { status, body } = await request(server.url)
      .get(path)
      .set('Authorization', `Bearer ${server.key}`);
    expect([status, ...faultsIn(body)]).toEqual([400, '?digits wrong-type']);
  },
);

test('a query parameter that nobody reads is a 400', async () => {
  const answer = await postWithKey(server, '/v1/fractions?digits=3').send({ system, pH: '7' });
  expect(answer.status).toBe(400);
});
