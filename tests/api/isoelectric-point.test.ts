import request from 'supertest';
import { createClient, ProblemError } from '../../shared/client';
import { isoelectricPointAnswer } from '../../shared/isoelectric-point';
import { faultsIn, postWithKey } from '../support/calls';
import { asItShould, refusalOf, type RefusedCall } from '../support/refused';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const path = '/v1/isoelectric-point';
const glycine = { fullyProtonatedCharge: 1, pKa: ['2.350', '9.778'] };
const ask = async (body: object) => {
  const answer = await postWithKey(server, path).send(body);
  expect(answer.body.errors).toBeUndefined();
  return isoelectricPointAnswer.parse(answer.body);
};

test('an ampholyte of two constants carries no charge at their mean', async () => {
  // Exact, by symmetry: (2.350 + 9.778)/2.
  const { isoelectricPoint, slope, species, isoionicPoint, model } = await ask({
    system: glycine,
    digits: 20,
  });
  expect(isoelectricPoint).toBe('6.0640000000000000000');
  // dz̄/dpH = −ln 10 × 2α with α = 10^−3.714/(1 + 2 × 10^−3.714), by hand.
  const share = 10 ** -3.714 / (1 + 2 * 10 ** -3.714);
  expect(Number(slope)).toBeCloseTo(-Math.LN10 * 2 * share, 12);
  expect(species[0]?.fraction).toBe(species[2]?.fraction);
  expect(species.map(({ charge }) => charge)).toEqual([1, 0, -1]);
  expect([isoionicPoint, model.pKw]).toEqual([null, null]);
});

test('inverted constants have one all the same, and a warning', async () => {
  const system = { fullyProtonatedCharge: 1, pKa: ['9', '2'] };
  const { isoelectricPoint, model } = await ask({ system, digits: 3 });
  expect(isoelectricPoint).toBe('5.50');
  expect(model.warnings.map(({ code }) => code)).toEqual(['inverted-constants']);
});

describe('the isoionic point', () => {
  test('nears the isoelectric point the more there is', async () => {
    const at = async (concentration: string) =>
      Number((await ask({ system: glycine, concentration })).isoionicPoint);
    const found = await Promise.all(['0', '1e-4', '0.01', '1'].map(at));
    const away = found.map((pH) => Math.abs(pH - 6.064));
    expect([...away].sort((a, b) => b - a)).toEqual(away);
    // Nothing in water leaves water.
    expect(found[0]).toBeCloseTo(13.9945 / 2, 3);
  });

  test('is by Davies at the solution’s own ionic strength, and says so beside the ideal answer', async () => {
    const answer = await ask({ system: { id: 'glycine' }, concentration: '100 mmol/L', digits: 6 });
    expect(answer.isoionicConditions?.activityModel).toBe('davies');
    expect(Number(answer.isoionicConditions?.ionicStrength)).toBeLessThan(1e-4);
    expect(answer.model).toMatchObject({
      conditions: { activityModel: 'ideal', ionicStrength: '0' },
      constantsUsed: [{ system: { id: 'glycine', revision: 1 } }],
    });
    expect(answer.model.pKw).not.toBeNull();
  });

  test('takes the conditions that are given', async () => {
    const conditions = { ionicStrength: '0.1', temperature: '37' };
    const answer = await ask({ system: { id: 'glycine' }, concentration: '0.1', conditions });
    expect(answer.isoionicConditions).toEqual({
      ionicStrength: '0.1000000000000000',
      activityModel: 'davies',
    });
    expect(answer.model.conditions).toMatchObject(conditions);
  });
});

test('from 1 to 60 digits, and the same bytes each time', async () => {
  const system = { fullyProtonatedCharge: 2, pKa: ['2.16', '9.06', '10.54'] };
  const at = async (digits: number) => (await ask({ system, digits })).isoelectricPoint;
  const sixty = await at(60);
  expect(sixty).toHaveLength(61);
  expect([await at(1), await at(15)]).toEqual(['1e+1', Number(sixty).toPrecision(15)]);
  const body = { system, concentration: '0.02', digits: 30 };
  const [one, two] = await Promise.all([1, 2].map(() => postWithKey(server, path).send(body)));
  expect(one?.text).toBe(two?.text);
});

test('a dry run tells cost and warnings, those of the isoionic point too', async () => {
  const system = { ...glycine, constants: { kind: 'mixed', ionicStrength: '0.1' } };
  const body = { system, digits: 16, dryRun: true };
  const { body: dry } = await postWithKey(server, path).send(body);
  expect(dry).toMatchObject({ dryRun: true, cost: 60 * 3 * 36 });
  expect(dry.warnings).toHaveLength(1);
  const isoionic = await postWithKey(server, path).send({ ...body, concentration: '0.1' });
  expect(faultsIn(isoionic.body)).toEqual(['/system/pKa constants-outside-medium']);
});

test('the typed client and the public path answer and refuse alike', async () => {
  const client = createClient({ baseUrl: server.url, key: server.key });
  const body = { system: glycine, concentration: '0.01' };
  expect(await client.publicIsoelectricPoint(body)).toEqual(await client.isoelectricPoint(body));
  const none = client.isoelectricPoint({ system: { id: 'phosphoric-acid' } });
  await expect(none).rejects.toBeInstanceOf(ProblemError);
  const post = (sent: object) =>
    request(server.url).post('/v1/public/isoelectric-point').send(sent);
  expect(faultsIn((await post({ ...body, dryRun: true })).body)).toEqual(['/dryRun unknown-field']);
});

const many = { fullyProtonatedCharge: 10, pKa: Array(20).fill('7') };
const refused: RefusedCall[] = [
  [
    'an acid without a base',
    { system: { id: 'phosphoric-acid' } },
    422,
    '/system charge-stays-negative',
    /^No isoelectric point: the charge stays negative at every pH\.$/,
  ],
  [
    'a base without an acid',
    { system: { id: 'tris' } },
    422,
    '/system charge-stays-positive',
    /^No isoelectric point: the charge stays positive at every pH\.$/,
  ],
  [
    'ten charges in a solution by Davies',
    { system: many, concentration: '0.01' },
    422,
    '/system/pKa charge-beyond-model',
    /"activityModel": "ideal"/,
  ],
  [
    'an isoionic point beyond Davies’s range',
    { system: glycine, concentration: '1', conditions: { ionicStrength: '3' } },
    422,
    '/conditions/activityModel outside-model-range',
    /I = 3 mol/,
  ],
  [
    'Pitzer of no composition',
    { system: glycine, conditions: { activityModel: 'pitzer' } },
    422,
    '/conditions/activityModel model-needs-composition',
    /every ion/,
  ],
  ['an unknown system', { system: { id: 'no-such' } }, 400, '/system/id unknown-system', /no-such/],
  ['no system', {}, 400, '/system missing', /needed/],
  [
    '51 mol/L',
    { system: glycine, concentration: '51' },
    400,
    '/concentration out-of-range',
    /between 0 and 50/,
  ],
  [
    'a number for a concentration',
    { system: glycine, concentration: 1 },
    400,
    '/concentration decimal-must-be-string',
    /as a string/,
  ],
  ['61 digits', { system: glycine, digits: 61 }, 400, '/digits out-of-range', /60/],
];

test.each(refused)('%s is refused in words', async (...row) => {
  expect(await refusalOf(server, path, row)).toEqual(asItShould(row));
});
