import request from 'supertest';
import { operations } from '../../server/routes';
import { parseNetwork } from '../../server/http/networks';
import { demoPassword } from '../../server/services/demo/demo-data';
import { rawCall, statusIn } from '../support/raw-call';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
let proxied: TestServer;
beforeAll(async () => {
  const trustedProxies = ['127.0.0.1', '10.0.0.0/8'].flatMap((text) => parseNetwork(text) ?? []);
  [server, proxied] = await Promise.all([
    startTestServer(),
    startTestServer({ config: { trustedProxies } }),
  ]);
});
afterAll(() => Promise.all([server.close(), proxied.close()]));

const elsewhere = 'evil.example';
const under = (host: string, path = '/v1/limits') =>
  request(server.url).get(path).set('Host', host);

describe('a request for another host', () => {
  const closed = operations.filter(({ anyHost }) => !anyHost);

  test.each(closed.map((one) => [one.operationId, one] as const))(
    'is misdirected: %s',
    async (_name, { method, path }) => {
      const call = request(server.url)[method](path.replace(/\{\w+\}/g, 'x'));
      const answer = await call.set({ Host: elsewhere, Authorization: `Bearer ${server.key}` });
      expect([answer.status, answer.body.type]).toEqual([
        421,
        `${server.url}/problems/misdirected-request`,
      ]);
    },
  );

  test.each(['/', '/docs', '/openapi.json', '/problems', '/nothing', '/livez/', '/LIVEZ'])(
    'is misdirected at %s too, where there is no operation',
    async (path) => {
      expect((await under(elsewhere, path)).status).toBe(421);
    },
  );

  test('is refused before anything else of it is read', async () => {
    const answer = await request(server.url)
      .post('/v1/fractions')
      .set({ Host: elsewhere, 'Content-Type': 'text/plain', Accept: 'image/png' })
      .set('Authorization', 'nonsense')
      .send('x'.repeat(2_000_000));
    expect(answer.status).toBe(421);
    expect(answer.headers['www-authenticate']).toBeUndefined();
    expect(answer.headers['content-security-policy']).toContain("default-src 'self'");
    expect(answer.text).not.toContain(elsewhere);
  });

  test('asks whether we live and are ready all the same: load balancers know no name', async () => {
    expect((await under('10.1.2.3:8080', '/livez')).status).toBe(200);
    expect((await under('10.1.2.3:8080', '/readyz')).body).toEqual({ status: 'ok' });
  });

  test('is not mended by a proxy’s header', async () => {
    const { host } = new URL(proxied.url);
    const answer = await request(proxied.url)
      .get('/v1/limits')
      .set({ Host: elsewhere, 'X-Forwarded-Host': host, Forwarded: `host=${host}` });
    expect(answer.status).toBe(421);
  });
});

test('our own host is one, in any case, and so is this machine by its number', async () => {
  const { port } = new URL(server.url);
  expect((await under(`LocalHost:${port}`)).status).toBe(200);
  expect((await under(`127.0.0.1:${port}`)).status).toBe(200);
  expect((await under('localhost:1')).status).toBe(421);
  expect((await under(`localhost:${port}.evil.example`)).status).toBe(421);
});

test('a request names one host: none, two, or another in its target are refused', async () => {
  const { host } = new URL(server.url);
  const status = async (...lines: string[]) => statusIn(await rawCall(server.url, lines));
  expect(await status('GET /v1/limits HTTP/1.1', `Host: ${host}`)).toBe(200);
  expect(await status('GET /v1/limits HTTP/1.1')).toBe(400);
  expect(await status('GET /v1/limits HTTP/1.0')).toBe(421);
  expect(await status('GET /v1/limits HTTP/1.1', `Host: ${host}`, `Host: ${host}`)).toBe(400);
  expect(await status('GET /v1/limits HTTP/1.1', 'Host:')).toBe(421);
  expect(await status(`GET http://${host}/v1/limits HTTP/1.1`, `Host: ${host}`)).toBe(200);
  expect(await status(`GET http://evil.example/v1/limits HTTP/1.1`, `Host: ${host}`)).toBe(421);
  expect(await status(`GET http://${host}/v1/limits HTTP/1.1`, 'Host: evil.example')).toBe(421);
});

/** Address in the log line of a call. */
async function addressLogged(at: TestServer, forwarded: string): Promise<unknown> {
  const answer = await request(at.url).get('/v1/limits').set('X-Forwarded-For', forwarded);
  const lines = at.logs.map((text) => JSON.parse(text));
  return lines.find(({ requestId }) => requestId === answer.headers['x-request-id'])?.address;
}

test('the log has the caller’s address, from a trusted proxy only', async () => {
  expect(await addressLogged(server, '198.51.100.1')).toBe('127.0.0.1');
  expect(await addressLogged(proxied, '198.51.100.1')).toBe('198.51.100.1');
  expect(await addressLogged(proxied, '203.0.113.5, ::ffff:198.51.100.1, 10.1.1.1')).toBe(
    '198.51.100.1',
  );
  expect(await addressLogged(proxied, 'stepwell, , 10.1.1.1')).toBe('10.1.1.1');
});

/** Calls left in the window, as a caller at this address is told. */
async function left(at: TestServer, forwarded: string): Promise<number> {
  const answer = await request(at.url)
    .get('/v1/public/systems?query=tris')
    .set('X-Forwarded-For', forwarded);
  return Number(/r=(\d+)/.exec(String(answer.headers.ratelimit))?.[1]);
}

test('limits count the caller behind a trusted proxy, and nobody by what they claim', async () => {
  const first = await left(proxied, '198.51.100.7');
  expect(await left(proxied, '198.51.100.7')).toBe(first - 1);
  expect(await left(proxied, '203.0.113.9, 198.51.100.7')).toBe(first - 2);
  expect(await left(proxied, '198.51.100.8')).toBe(first);
  const claimed = await left(server, '198.51.100.7');
  expect(await left(server, '198.51.100.8')).toBe(claimed - 1);
});

test('failed sign-ins are counted by the caller’s address, not the proxy’s', async () => {
  const signIn = (address: string, password: string) =>
    request(proxied.url)
      .post('/v1/sessions')
      .set({ Origin: proxied.url, 'X-Forwarded-For': address })
      .send({ email: 'developer@larkmoor.example', password });
  for (let i = 0; i < 10; i += 1) {
    expect((await signIn('198.51.100.21', 'wrong')).status).toBe(401);
  }
  expect((await signIn('198.51.100.21', demoPassword)).status).toBe(429);
  expect((await signIn('198.51.100.22', demoPassword)).status).toBe(201);
}, 30_000);

test('what a proxy says of the protocol is not believed: PUBLIC_URL says it', async () => {
  const { headers } = await request(proxied.url)
    .post('/v1/sessions')
    .set({ Origin: proxied.url, 'X-Forwarded-Proto': 'https', 'X-Forwarded-For': '198.51.100.30' })
    .send({ email: 'developer@larkmoor.example', password: demoPassword });
  const cookies = headers['set-cookie'] as unknown as string[];
  expect(cookies.join()).not.toMatch(/__Host-|Secure/);
});
