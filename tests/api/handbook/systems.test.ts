import request from 'supertest';
import { handbook } from '../../../server/database/handbook/handbook';
import { seedHandbook } from '../../../server/database/seed-handbook';
import { createClient } from '../../../shared/client';
import { storedSystem, systemList, type SystemSummary } from '../../../shared/stored-system';
import { demoOrganizations } from '../../../server/services/demo/demo-data';
import { faultsIn } from '../../support/calls';
import { signedIn } from '../../support/people';
import { startTestServer, type TestServer } from '../../support/server';
import { insertOwnSystem } from '../../support/own-system';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
  await insertOwnSystem(server.database, demoOrganizations[0].id, 'bench-buffer-k3x7q2');
});
afterAll(() => server.close());

const get = (path: string, query: Record<string, string> = {}) =>
  request(server.url).get(path).query(query).set('Authorization', `Bearer ${server.key}`);
const idsIn = (body: { items: SystemSummary[] }) => body.items.map(({ id }) => id);
const found = async (query: string) => idsIn((await get('/v1/systems', { query })).body);

describe('a search', () => {
  const finds: [what: string, query: string, first: string][] = [
    ['a name', 'phosphoric acid', 'phosphoric-acid'],
    ['a name in any case', 'Citric ACID', 'citric-acid'],
    ['the beginning of a name', 'acet', 'acetic-acid'],
    ['an id', 'boric-acid', 'boric-acid'],
    ['an alias', 'tromethamine', 'tris'],
    ['an abbreviation', 'EDTA', 'edta'],
    ['the name of the ion', 'bicarbonate', 'carbonic-acid'],
    ['a name with another hyphen', 'bis tris', 'bis-tris'],
    ['a name without its primes', '2,2-bipyridine', '2-2-bipyridine'],
    ['a formula', 'H3PO4', 'phosphoric-acid'],
    ['a formula in subscripts', 'H₃PO₄', 'phosphoric-acid'],
    ['the formula of a form', 'HPO4^2-', 'phosphoric-acid'],
    ['the formula of a form as people type it', 'hpo42-', 'phosphoric-acid'],
    ['the molecular formula of a written-out one', 'C2H4O2', 'acetic-acid'],
    ['a CAS number', '77-92-9', 'citric-acid'],
    ['the CAS number of the ion that the table has', '14798-03-9', 'ammonia'],
  ];
  test.each(finds)('finds by %s', async (_what, query, first) => {
    expect((await found(query))[0]).toBe(first);
  });

  test('puts the whole name before its beginning, and that before a part', async () => {
    const ids = await found('tris');
    expect(ids[0]).toBe('tris');
    expect(ids.indexOf('bis-tris')).toBeGreaterThan(0);
    const acids = await found('acetic acid');
    expect(acids[0]).toBe('acetic-acid');
    expect(acids).toContain('chloroacetic-acid');
    expect(acids.indexOf('phenylacetic-acid')).toBeGreaterThan(0);
  });

  test.each(['nothing like it', '%', '_', '***', "';--", '77-92-0'])(
    'for %s finds nothing',
    async (query) => {
      const { status, body } = await get('/v1/systems', { query });
      expect([status, body]).toEqual([200, { items: [] }]);
    },
  );

  test('without a query lists all by name, in short', async () => {
    const { body } = await get('/v1/systems', { limit: '100' });
    expect(systemList.safeParse(body).error).toBeUndefined();
    const names = systemList.parse(body).items.map(({ name }) => name.toLowerCase());
    expect(names).toEqual([...names].sort());
  });
});

/** Every page from the first on, doing something between them. */
async function pages(query: Record<string, string>, between: () => Promise<unknown>) {
  const ids: string[][] = [];
  let path: string | undefined = `/v1/systems?${new URLSearchParams(query).toString()}`;
  while (path !== undefined) {
    const answer: request.Response = await get(path);
    expect(answer.status).toBe(200);
    ids.push(idsIn(answer.body));
    path = /^<([^>]+)>; rel="next"$/.exec(answer.headers.link ?? '')?.[1];
    await between();
  }
  return ids;
}

describe('paging', () => {
  const ofHandbook = () =>
    handbook()
      .map(({ id }) => id)
      .sort();

  test('goes through everything once, the last page without a link', async () => {
    const all = await pages({ limit: '40' }, () => Promise.resolve());
    expect(
      all
        .map((ids) => ids.length)
        .slice(0, -1)
        .every((count) => count === 40),
    ).toBe(true);
    expect(
      all
        .flat()
        .filter((id) => id !== 'bench-buffer-k3x7q2')
        .sort(),
    ).toEqual(ofHandbook());
    expect(new Set(all.flat()).size).toBe(all.flat().length);
  });

  test('keeps the order of a query from page to page', async () => {
    const whole = await pages({ query: 'acid', limit: '100' }, () => Promise.resolve());
    const parts = await pages({ query: 'acid', limit: '7' }, () => Promise.resolve());
    expect(parts.flat()).toEqual(whole.flat());
  });

  test('neither repeats nor skips when systems come between the pages', async () => {
    let count = 0;
    const all = await pages({ limit: '60' }, async () => {
      for (const start of ['aa', 'mm', 'zz']) {
        await insertOwnSystem(server.database, demoOrganizations[0].id, `${start}-new-${count++}`);
      }
    });
    const old = all.flat().filter((id) => !id.includes('-new-') && id !== 'bench-buffer-k3x7q2');
    expect(old.sort()).toEqual(ofHandbook());
    expect(new Set(all.flat()).size).toBe(all.flat().length);
    await server.database.query(`DELETE FROM system_terms WHERE system_id LIKE '%-new-%'`);
  });

  const next = async (query: Record<string, string>) => {
    const { headers } = await get('/v1/systems', query);
    return new URL(/^<([^>]+)>/.exec(headers.link ?? '')?.[1] ?? '', server.url).searchParams;
  };

  test('refuses a cursor of another query, one made up, and one cut short', async () => {
    const cursor = (await next({ query: 'acid', limit: '2' })).get('cursor') ?? '';
    expect(cursor).not.toBe('');
    const made = (value: unknown) => Buffer.from(JSON.stringify(value)).toString('base64url');
    const after = { rank: 0, name: 'a\u0000', id: 'a' };
    for (const [query, wrong] of [
      ['citric', cursor],
      ['acid', 'x'],
      ['acid', cursor.slice(0, -6)],
      ['acid', made({ query: 'acid', after })],
      ['acid', made({ query: 'acid', after: { ...after, name: 'a', rank: 1e30 } })],
    ] as const) {
      const { status, body } = await get('/v1/systems', { query, cursor: wrong });
      expect([wrong, status, faultsIn(body)]).toEqual([wrong, 400, ['?cursor not-a-cursor']]);
    }
  });
});

describe('refusals of a list', () => {
  const wrong: [query: Record<string, string>, fault: string][] = [
    [{ limit: '0' }, '?limit out-of-range'],
    [{ limit: '101' }, '?limit out-of-range'],
    [{ limit: 'ten' }, '?limit wrong-type'],
    [{ query: '' }, '?query out-of-range'],
    [{ query: 'a\u0000' }, '?query unfit-character'],
    [{ query: 'x'.repeat(101) }, '?query out-of-range'],
    [{ q: 'acid' }, '?q unknown-field'],
  ];
  test.each(wrong)('%j is a 400 that names the parameter', async (query, fault) => {
    const { status, body } = await get('/v1/systems', query);
    expect([status, faultsIn(body)]).toEqual([400, [fault]]);
  });

  test('a parameter given twice is a 400', async () => {
    const { status } = await get('/v1/systems?query=a&query=b');
    expect(status).toBe(400);
  });
});

describe('one system', () => {
  test('comes with every determination, the preferred one first, and what is known of each constant', async () => {
    const { body, status } = await get('/v1/systems/boric-acid');
    expect(status).toBe(200);
    expect(storedSystem.safeParse(body).error).toBeUndefined();
    expect(body).toMatchObject({
      id: 'boric-acid',
      revision: 1,
      origin: 'handbook',
      formula: 'H3BO3',
      cas: '10043-35-3',
      species: [
        { formula: 'H3BO3', charge: 0 },
        { formula: 'B(OH)4^-', charge: -1 },
      ],
      determinations: [
        {
          preferred: true,
          listedAs: 'borate',
          constants: [
            {
              step: 1,
              value: '9.237',
              kind: 'thermodynamic',
              temperature: '25',
              ionicStrength: '0',
              uncertainty: null,
              deltaH: '13.8',
              deltaCp: '-240.0',
              approximate: true,
              estimate: false,
              provenance: 'recalled',
            },
          ],
        },
        {
          preferred: false,
          listedAs: 'boric acid (20 C)',
          constants: [{ value: '9.27', temperature: '20', deltaH: null, provenance: 'read' }],
        },
      ],
    });
  });

  test.each([
    'no-such-system',
    'Phosphoric-Acid',
    'phosphoric-acid@9',
    'phosphoric-acid@0',
    'x@',
    '%00',
    'a'.repeat(300),
  ])('%s is a 404', async (id) => {
    const { status, body } = await get(`/v1/systems/${id}`);
    expect([status, body.title]).toEqual([404, 'There is nothing at this address']);
  });

  test('is not sent again to whoever holds it', async () => {
    const first = await get('/v1/systems/tris');
    const etag = String(first.headers.etag);
    expect(etag).toMatch(/^"[\w-]{27}"$/);
    expect(first.headers['cache-control']).toBe('private, no-cache');
    for (const held of [etag, `W/${etag}`, `"x", ${etag}`, '*']) {
      const again = await get('/v1/systems/tris').set('If-None-Match', held);
      expect([held, again.status, again.text, again.headers.etag]).toEqual([held, 304, '', etag]);
    }
    const other = await get('/v1/systems/tris').set('If-None-Match', '"x"');
    expect([other.status, other.body]).toEqual([200, first.body]);
    expect((await get('/v1/systems/citric-acid')).headers.etag).not.toBe(etag);
  });

  test('keeps its old revisions readable, and its tag changes with a new one', async () => {
    const before = await get('/v1/systems/ches');
    const changed = handbook().map((entry) =>
      entry.id === 'ches' ? { ...entry, note: 'changed' } : entry,
    );
    await seedHandbook(server.database, changed);
    const present = await get('/v1/systems/ches');
    expect([present.body.revision, present.body.note]).toEqual([2, 'changed']);
    expect(present.headers.etag).not.toBe(before.headers.etag);
    const old = await get('/v1/systems/ches@1');
    expect(old.body).toEqual(before.body);
    expect(old.headers.etag).toBe(before.headers.etag);
  });
});

describe('an organization’s own system', () => {
  const id = 'bench-buffer-k3x7q2';
  const paths = [`/v1/systems/${id}`, `/v1/systems/${id}/fractions?pH=7`];

  test('is found and read by the organization, by key and by session', async () => {
    const scientist = await signedIn(server, 'scientist@larkmoor.example');
    for (const path of paths) {
      expect([path, (await get(path)).status]).toEqual([path, 200]);
      expect([path, (await scientist.get(path)).status]).toEqual([path, 200]);
    }
    expect(await found('bench buffer')).toEqual([id]);
    expect((await get(`/v1/systems/${id}`)).body.origin).toBe('organization');
  });

  test('is not there for another organization, nor for the public', async () => {
    const stranger = await signedIn(server, 'admin@tarnstreet.example');
    for (const path of paths)
      expect([path, (await stranger.get(path)).status]).toEqual([path, 404]);
    const list = await stranger.get('/v1/systems').query({ query: 'bench buffer' });
    expect(list.body.items).toEqual([]);
    const body = { system: { id }, pH: '7' };
    const computed = await stranger.post('/v1/fractions').send(body);
    expect([computed.status, faultsIn(computed.body)]).toEqual([
      400,
      ['/system/id unknown-system'],
    ]);
    const open = request(server.url);
    expect((await open.get(`/v1/public/systems/${id}`)).status).toBe(404);
    expect((await open.get('/v1/public/systems?query=bench+buffer')).body.items).toEqual([]);
    const openly = await open.post('/v1/public/fractions').send(body);
    expect(faultsIn(openly.body)).toEqual(['/system/id unknown-system']);
  });
});

describe('the public handbook', () => {
  test('answers the same without a key', async () => {
    const open = (path: string) => request(server.url).get(path);
    const one = await open('/v1/public/systems/phosphoric-acid');
    expect(one.body).toEqual((await get('/v1/systems/phosphoric-acid')).body);
    expect(one.headers['cache-control']).toBe('no-cache');
    const list = await open('/v1/public/systems?query=phosph&limit=2');
    const keyed = await get('/v1/systems?query=phosph&limit=2');
    expect(list.body).toEqual(keyed.body);
    expect(list.headers.link).toMatch(/^<\/v1\/public\/systems\?query=phosph&limit=2&cursor=/);
    expect(list.headers['ratelimit-policy']).toMatch(/listPublicSystems/);
  });
});

test('the typed client finds, pages and reads, with a key and without', async () => {
  const client = createClient({ baseUrl: server.url, key: server.key });
  const first = await client.systems.find({ query: 'phosph', limit: 2 });
  expect(first.items).toHaveLength(2);
  const second = await client.systems.find({ query: 'phosph', limit: 2, cursor: first.next ?? '' });
  expect(second.items.map(({ id }) => id)).not.toContain(first.items[0]?.id);
  expect((await client.systems.read('phosphoric-acid@1')).pKa).toEqual(['2.148', '7.198', '12.35']);
  const open = createClient({ baseUrl: server.url });
  expect((await open.publicSystems.read('tris')).name).toBe('tris');
  await expect(open.publicSystems.read('no-such')).rejects.toMatchObject({
    problem: { status: 404 },
  });
});
