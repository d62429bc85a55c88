import request from 'supertest';
import { ProblemError, createClient } from '../../shared/client';
import { fractionsAnswer, manyFractionsAnswer } from '../../shared/fractions';
import { phosphoric, postWithKey } from '../support/calls';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const ask = (body: object) => postWithKey(server, '/v1/fractions').send(body);

test('phosphoric acid at pH 7.4 is answered as the multi-precision reference has it', async () => {
  // reference data: highprec frac_phosphoric_7.4 (mpmath, 90 digits), rounded half-even to 10.
  const { body, status } = await ask({ system: phosphoric, pH: '7.4', digits: 10 });
  expect(status).toBe(200);
  expect(body.points).toEqual([
    {
      pH: '7.4',
      fractions: ['0.000002159365213', '0.3857679123', '0.6142230366', '0.000006891695821'],
      neighbourRatios: ['178648.7575', '1.592208727', '0.00001122018454'],
      meanCharge: '-1.6142346606',
      predominant: 2,
    },
  ]);
  expect(body.species).toEqual(
    [0, 1, 2, 3].map((index) => ({ index, charge: 0 - index || 0, protonsLost: index })),
  );
  expect(body.predominance).toEqual([
    { species: 0, from: null, to: '2.148000000' },
    { species: 1, from: '2.148000000', to: '7.198000000' },
    { species: 2, from: '7.198000000', to: '12.35000000' },
    { species: 3, from: '12.35000000', to: null },
  ]);
});

test('the model behind an answer is filled in to the last default', async () => {
  const { body } = await ask({ system: { name: 'H3PO4', ...phosphoric }, pH: '7' });
  expect(fractionsAnswer.parse(body).model).toEqual({
    engineVersion: '1',
    digits: 16,
    conditions: {
      temperature: '25',
      ionicStrength: '0',
      activityModel: 'ideal',
      outOfRange: 'refuse',
    },
    constantsUsed: [{ name: 'H3PO4', kind: 'thermodynamic', ...phosphoric }],
    pKw: null,
    activityConstants: null,
    basis: 'mol/L',
    warnings: [],
  });
});

test('each pH of a list comes back as it was written and in that order', async () => {
  const pH = ['7.40', '-2', '1e1', '7.40'];
  const { body } = await ask({ system: phosphoric, pH });
  expect(body.points.map((point: { pH: string }) => point.pH)).toEqual(pH);
});

test('a grid and the list of its points give the same numbers', async () => {
  const grid = await ask({ system: phosphoric, pH: { from: '6.9', to: '7.1', step: '0.05' } });
  const pH = ['6.90', '6.95', '7.00', '7.05', '7.10'];
  const list = await ask({ system: phosphoric, pH });
  expect(grid.body.points).toEqual(list.body.points);
});

test('the same request gives the same bytes', async () => {
  const body = { system: phosphoric, pH: { from: '0', to: '14', step: '0.5' }, digits: 34 };
  const [one, two] = await Promise.all([ask(body), ask(body)]);
  expect(one.text).toBe(two.text);
});

test('a hundred systems are answered in their order', async () => {
  const systems = Array.from({ length: 100 }, (_, i) => ({
    name: `acid ${i}`,
    fullyProtonatedCharge: 1,
    pKa: [`${i / 10}`],
  }));
  const { body } = await ask({ systems, pH: '5' });
  const answer = manyFractionsAnswer.parse(body);
  expect(answer.items.map(({ name }) => name)).toEqual(systems.map(({ name }) => name));
  expect(answer.items[50]?.points[0]?.meanCharge).toBe('0.5000000000000000');
});

test('inverted constants are computed with a warning that points at them', async () => {
  const { body } = await ask({ system: { fullyProtonatedCharge: 0, pKa: ['9', '4'] }, pH: '7' });
  expect(body.model.warnings).toEqual([
    {
      code: 'inverted-constants',
      message:
        'pKa 1 (9) is greater than pKa 2 (4): species 1 never predominates, and others beside it may not either.',
      pointer: '/system/pKa/0',
    },
  ]);
  expect(body.predominance.map(({ species }: { species: number }) => species)).toEqual([0, 2]);
});

test('a dry run tells cost and warnings and computes nothing', async () => {
  const pH = { from: '0', to: '14', step: '0.01' };
  const { body } = await ask({ system: phosphoric, pH, digits: 34, dryRun: true });
  expect(body).toEqual({ dryRun: true, cost: 1401 * 4 * 54, computeUnits: 31, warnings: [] });
});

test('as CSV there is a line a system and pH under one head', async () => {
  const systems = [phosphoric, { fullyProtonatedCharge: 1, pKa: ['8.072'] }];
  const answer = await ask({ systems, pH: ['7', '8.072'], digits: 3 }).set('Accept', 'text/csv');
  expect(answer.headers['content-type']).toBe('text/csv; charset=utf-8; header=present');
  const lines = answer.text.split('\r\n');
  expect(lines[0]).toBe(
    'system,pH,fraction_0,fraction_1,fraction_2,fraction_3,neighbour_ratio_0,neighbour_ratio_1,neighbour_ratio_2,mean_charge,predominant',
  );
  expect(lines[4]).toBe('1,8.072,0.500,0.500,,,1.00,,,0.500,0');
  expect(lines).toHaveLength(6);
});

test('the largest call allowed is answered, and one digit more is refused before work starts', async () => {
  const pKa = Array.from({ length: 64 }, (_, i) => `${(i * 0.2).toFixed(1)}`);
  const system = { fullyProtonatedCharge: 20, pKa };
  const pH = { from: '-20', to: '40', step: '0.05' };
  const within = await ask({ system, pH, digits: 60, dryRun: true });
  expect(within.body.cost).toBe(1201 * 65 * 80);
  const { body, status } = await ask({ system, pH, digits: 60 });
  expect(status).toBe(200);
  expect(body.points).toHaveLength(1201);
  const over = await ask({ system, pH: { ...pH, step: '0.02' }, digits: 60 });
  expect([over.status, over.body.errors[0].code]).toEqual([422, 'cost-over-limit']);
});

test('the typed client computes with a key and throws what is refused', async () => {
  const client = createClient({ baseUrl: server.url, key: server.key });
  const answer = await client.fractions({ system: phosphoric, pH: '7.198', digits: 3 });
  expect(answer.points[0]?.neighbourRatios[1]).toBe('1.00');
  const refused = client.fractions({ system: phosphoric, pH: '99' });
  await expect(refused).rejects.toBeInstanceOf(ProblemError);
  const away = createClient({ baseUrl: 'http://127.0.0.1:9', key: server.key });
  await expect(away.fractions({ system: phosphoric, pH: '7' })).rejects.toMatchObject({
    problem: { status: 0 },
  });
});

test('without a key one system is answered on the public path, at a lower bound', async () => {
  const post = (body: object) => request(server.url).post('/v1/public/fractions').send(body);
  const answer = await post({ system: phosphoric, pH: '7.4', digits: 3 });
  expect(answer.body.points[0].fractions[2]).toBe('0.614');
  expect(answer.headers['ratelimit-policy']).toMatch(/publicFractions/);
  const many = await post({ systems: [phosphoric], pH: '7.4' });
  expect(many.status).toBe(400);
  const pH = { from: '0', to: '14', step: '0.003' };
  const costly = await post({ system: phosphoric, pH, digits: 60 });
  expect([costly.status, costly.body.errors[0].code]).toEqual([422, 'cost-over-limit']);
});
