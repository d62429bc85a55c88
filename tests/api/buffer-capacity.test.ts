import request from 'supertest';
import { bufferCapacityAnswer } from '../../shared/buffer-capacity';
import { createClient, ProblemError } from '../../shared/client';
import { faultsIn, postWithKey } from '../support/calls';
import { asItShould, refusalOf, type RefusedCall } from '../support/refused';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const path = '/v1/buffer-capacity';
const acetic = { fullyProtonatedCharge: 0, pKa: ['4.756'] };
const one = { system: acetic, concentration: '0.1' };
const ask = async (body: object) => {
  const answer = await postWithKey(server, path).send(body);
  expect(answer.body.errors).toBeUndefined();
  return bufferCapacityAnswer.parse(answer.body);
};

test('a monoprotic buffer peaks at its pKa, with ln 10/4 of its concentration', async () => {
  // Van Slyke (1922): β = ln 10 (c K h/(K + h)² + h + w/h); at h = K the first part is c ln 10/4,
  // 0.05756463 by hand.
  const { points, maxima } = await ask({ components: [one], pH: '4.756', digits: 12 });
  const expected = 0.05756463 + 2.302585 * (10 ** -4.756 + 10 ** (4.756 - 13.9945));
  // ln 10/4 is written to seven places here.
  expect(Math.abs(Number(points[0]?.total) - expected)).toBeLessThan(1e-8);
  expect(maxima).toHaveLength(1);
  expect(Number(maxima[0]?.pH)).toBeCloseTo(4.756, 2);
});

test('the whole is the water and every part', async () => {
  const components = [one, { system: { id: 'phosphoric-acid' }, concentration: '50 mmol/L' }];
  const pH = { from: '2', to: '12', step: '2.5' };
  const { points } = await ask({ components, pH, digits: 20 });
  for (const point of points) {
    const parts = [point.water, ...point.components].map(Number);
    const sum = parts.reduce((all, part) => all + part, 0);
    // Sums of doubles.
    expect(Math.abs(sum / Number(point.total) - 1)).toBeLessThan(1e-14);
  }
  expect(points.map(({ pH: at }) => Number(at))).toEqual([2, 4.5, 7, 9.5, 12]);
});

test('water alone buffers at both ends and has no maximum', async () => {
  const conditions = { pKw: '14' };
  const { points, maxima } = await ask({ components: [], pH: ['7', '0'], conditions, digits: 7 });
  // ln 10 × 2 × 10⁻⁷ and ln 10 × (1 + 10⁻¹⁴).
  expect(points.map(({ total }) => total)).toEqual(['4.605170e-7', '2.302585']);
  expect([points[0]?.components, maxima]).toEqual([[], []]);
});

test('the model behind it has the water, and constants moved by the ionic strength', async () => {
  const components = [{ system: { id: 'phosphoric-acid' }, concentration: '0.05' }];
  const { model, maxima } = await ask({
    components,
    pH: '7',
    conditions: { ionicStrength: '0.15', temperature: '37' },
    digits: 6,
  });
  expect(model).toMatchObject({
    conditions: { activityModel: 'davies', ionicStrength: '0.15', temperature: '37' },
    constantsUsed: [{ system: { id: 'phosphoric-acid', revision: 1 } }],
  });
  // IAPWS R11-07 at 37 °C: 13.62 (recalled).
  expect(Math.abs(Number(model.pKw) - 13.62)).toBeLessThan(0.01);
  expect(maxima.length).toBeGreaterThan(0);
});

test('as CSV there is a line a pH, a column a component', async () => {
  const body = { components: [one, one], pH: ['4.756', '7'], digits: 3 };
  const answer = await postWithKey(server, path).set('Accept', 'text/csv').send(body);
  expect(answer.headers['content-type']).toBe('text/csv; charset=utf-8; header=present');
  const lines = answer.text.split('\r\n');
  expect(lines[0]).toBe('pH,total,water,component_0,component_1');
  const [pH, , , ...parts] = lines[1]?.split(',') ?? [];
  expect([pH, ...parts]).toEqual(['4.756', '0.0576', '0.0576']);
  expect(lines).toHaveLength(4);
  const dry = await postWithKey(server, path)
    .set('Accept', 'text/csv')
    .send({ ...body, dryRun: true });
  expect([dry.headers['content-type'], dry.body.dryRun]).toEqual(['application/json', true]);
});

test('a dry run tells the cost: points and the search for maxima, of each system and the water', async () => {
  const pH = { from: '0', to: '14', step: '0.1' };
  const body = { components: [one], pH, digits: 16, dryRun: true };
  const { body: dry } = await postWithKey(server, path).send(body);
  expect(dry).toEqual({ dryRun: true, cost: (141 + 100) * 4 * 36, computeUnits: 4, warnings: [] });
});

test('24 components with all digits give the same bytes twice', async () => {
  const components = Array.from({ length: 24 }, (_, i) => ({
    system: { fullyProtonatedCharge: 1, pKa: [String(i / 2)] },
    concentration: '0.01',
  }));
  const body = { components, pH: '7', digits: 60 };
  const texts = [1, 2].map(() => postWithKey(server, path).send(body));
  const [first, second] = await Promise.all(texts);
  expect(first?.text).toBe(second?.text);
  expect(bufferCapacityAnswer.parse(first?.body).points[0]?.components).toHaveLength(24);
});

test('a concentration in any unit is one concentration; of nothing, only the water buffers', async () => {
  const total = async (concentration: string) =>
    (await ask({ components: [{ system: acetic, concentration }], pH: '5' })).points[0]?.total;
  expect(await total('25 mmol/L')).toBe(await total('0.025'));
  expect(await total('25 mol/m3')).toBe(await total('0.025'));
  expect(await total('0')).toBe((await ask({ components: [], pH: '5' })).points[0]?.total);
});

test('the typed client and the public path answer and refuse alike', async () => {
  const client = createClient({ baseUrl: server.url, key: server.key });
  const body = { components: [one], pH: ['4', '5'] };
  expect(await client.publicBufferCapacity(body)).toEqual(await client.bufferCapacity(body));
  const wrong = client.bufferCapacity({ ...body, pH: '99' });
  await expect(wrong).rejects.toBeInstanceOf(ProblemError);
  const costly = await request(server.url)
    .post('/v1/public/buffer-capacity')
    .send({ components: [one], pH: { from: '0', to: '14', step: '0.003' }, digits: 60 });
  expect([costly.status, faultsIn(costly.body)]).toEqual([422, [' cost-over-limit']]);
});

const call = (part: object) => ({ components: [one], pH: '7', ...part });
const refused: RefusedCall[] = [
  ['no components', call({ components: undefined }), 400, '/components missing', /needed/],
  [
    '25 components',
    call({ components: Array(25).fill(one) }),
    400,
    '/components out-of-range',
    /24/,
  ],
  [
    'no concentration',
    call({ components: [{ system: acetic }] }),
    400,
    '/components/0/concentration missing',
    /needed/,
  ],
  [
    'a form, which makes no difference',
    call({ components: [{ ...one, form: 1 }] }),
    400,
    '/components/0/form unknown-field',
    /./,
  ],
  [
    'an unknown system',
    call({ components: [one, { ...one, system: { id: 'no-such' } }] }),
    400,
    '/components/1/system/id unknown-system',
    /no system no-such/,
  ],
  ['a pH of 41', call({ pH: '41' }), 400, '/pH out-of-range', /-20 and 40/],
  [
    'constants of another medium',
    call({
      components: [{ ...one, system: { id: 'egta' } }],
      conditions: { ionicStrength: '0.2' },
    }),
    422,
    '/components/0/system/id constants-outside-medium',
    /EGTA/,
  ],
  [
    'an ionic strength of no composition',
    call({ conditions: { ionicStrength: 'self-consistent' } }),
    422,
    '/conditions/ionicStrength model-needs-composition',
    /\/v1\/mixtures/,
  ],
  [
    'I = 2 by Davies',
    call({ conditions: { ionicStrength: '2' } }),
    422,
    '/conditions/activityModel outside-model-range',
    /here I = 2 mol\/L/,
  ],
];

test.each(refused)('%s is refused in words', async (...row) => {
  expect(await refusalOf(server, path, row)).toEqual(asItShould(row));
});
