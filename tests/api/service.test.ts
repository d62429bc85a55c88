import { spawnSync } from 'node:child_process';
import path from 'node:path';
import request from 'supertest';
import { problemTypes } from '../../shared/problem';
import { limitsInForce } from '../../shared/limits-answer';
import { phosphoric, postWithKey } from '../support/calls';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const get = (path: string) => request(server.url).get(path);

test('alive and ready are told apart', async () => {
  expect((await get('/livez')).body).toEqual({ status: 'ok' });
  expect((await get('/readyz')).body).toEqual({ status: 'ok' });
});

test('while the database is away the process lives, is not ready, calls are a 503; then all is well again', async () => {
  const away = await startTestServer();
  const hand = away.database.createQueryRunner();
  const [{ name }] = (await hand.query('SELECT current_database() AS name')) as [{ name: string }];
  const statuses = async () => {
    const call = postWithKey(away, '/v1/fractions').send({ system: phosphoric, pH: '7' });
    const [livez, readyz, fractions] = await Promise.all([
      request(away.url).get('/livez'),
      request(away.url).get('/readyz'),
      call,
    ]);
    return [livez.status, readyz.status, fractions.status];
  };
  try {
    await hand.query(`ALTER DATABASE ${name} CONNECTION LIMIT 0`);
    await hand.query(
      `SELECT pg_terminate_backend(pid) FROM pg_stat_activity
       WHERE datname = current_database() AND pid <> pg_backend_pid()`,
    );
    expect(await statuses()).toEqual([200, 503, 503]);
    await hand.query(`ALTER DATABASE ${name} CONNECTION LIMIT -1`);
    expect(await statuses()).toEqual([200, 200, 200]);
  } finally {
    await hand.release();
    await away.close();
  }
});

test('the limits published are those in force', async () => {
  const answer = await get('/v1/limits');
  expect(answer.body).toEqual(limitsInForce);
});

test.each(Object.keys(problemTypes))('/problems/%s opens', async (name) => {
  const answer = await get(`/problems/${name}`);
  expect(answer.status).toBe(200);
  expect(answer.text).toContain(`<h1>${problemTypes[name as keyof typeof problemTypes][1]}</h1>`);
});

test('answers carry strict headers', async () => {
  const { headers } = await get('/v1/limits');
  expect(headers).toMatchObject({
    'content-security-policy':
      "default-src 'self';style-src 'self' 'sha256-47DEQpj8HBSa+/TImW+5JCeuQeRkm5NMpJWZG3hSuFU=';" +
      "img-src 'self' data: blob:;object-src 'none';base-uri 'none';form-action 'self';frame-ancestors 'none'",
    'cross-origin-opener-policy': 'same-origin',
    'cross-origin-resource-policy': 'same-origin',
    'referrer-policy': 'no-referrer',
    'x-content-type-options': 'nosniff',
    'x-frame-options': 'DENY',
  });
  expect(headers['x-powered-by']).toBeUndefined();
  expect(headers['access-control-allow-origin']).toBeUndefined();
});

test('only the API description may style itself', async () => {
  const docs = await get('/docs/');
  expect(docs.text).toContain('<title>Stepwell API</title>');
  expect(docs.headers['content-security-policy']).toContain("style-src 'self' 'unsafe-inline'");
  expect(docs.headers['content-security-policy']).not.toContain('script-src');
  expect((await get('/problems')).headers['content-security-policy']).not.toContain(
    'unsafe-inline',
  );
});

test('a computed answer is not stored by anybody between', async () => {
  const answer = await postWithKey(server, '/v1/fractions').send({ system: phosphoric, pH: '7' });
  expect(answer.headers['cache-control']).toBe('no-store');
  expect(answer.headers.vary).toMatch(/Accept\b/);
});

test('each call has an id of its own, which its log line carries', async () => {
  const [one, two] = await Promise.all([get('/v1/limits'), get('/v1/limits')]);
  const id = String(one.headers['x-request-id']);
  expect(id).not.toBe(two.headers['x-request-id']);
  const line = server.logs
    .map((text) => JSON.parse(text))
    .find(({ requestId }) => requestId === id);
  expect(line).toMatchObject({
    level: 'info',
    req: { method: 'GET', path: '/v1/limits' },
    res: { status: 200 },
  });
  expect(line.req.headers).toBeUndefined();
});

test('two processes share the count of calls', async () => {
  const other = await server.startAnother();
  const body = { system: phosphoric, pH: '7', digits: 1 };
  const post = (url: string) => request(url).post('/v1/public/fractions').send(body);
  const most = limitsInForce.callsPerMinute.address;
  const answers = [];
  for (let sent = 0; sent < most + 20; sent += 20) {
    const urls = Array.from({ length: 20 }, (_, i) => (i % 2 ? other.url : server.url));
    answers.push(...(await Promise.all(urls.map(post))));
  }
  expect(answers.filter(({ status }) => status === 200)).toHaveLength(most);
  const refused = answers.filter(({ status }) => status === 429);
  expect(refused).toHaveLength(20);
  expect(refused[0]?.body.type).toMatch(/too-many-requests$/);
  expect(Number(refused[0]?.headers['retry-after'])).toBeGreaterThan(0);
}, 30_000);

test('a wrong environment stops the start with its name and reason', () => {
  const started = spawnSync(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
    cwd: path.join(__dirname, '../..'),
    encoding: 'utf8',
    env: {
      PATH: process.env.PATH,
      PORT: 'eighty',
      TSX_TSCONFIG_PATH: 'server/tsconfig.json',
      DATABASE_URL: 'postgresql://x',
    },
  });
  expect(started.status).toBe(1);
  expect(started.stderr).toMatch(/PORT: must be a whole number/);
  expect(started.stderr).toMatch(/KEY_PEPPERS is missing/);
});
