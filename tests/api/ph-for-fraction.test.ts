import { createClient, ProblemError } from '../../shared/client';
import { pHForFractionAnswer } from '../../shared/ph-for-fraction';
import { postWithKey } from '../support/calls';
import { asItShould, refusalOf, type RefusedCall } from '../support/refused';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const path = '/v1/ph-for-fraction';
const acid = { fullyProtonatedCharge: 0, pKa: ['4.756'] };
const ask = async (body: object) => {
  const answer = await postWithKey(server, path).send(body);
  expect(answer.body.errors).toBeUndefined();
  return pHForFractionAnswer.parse(answer.body);
};

describe('a monoprotic acid', () => {
  // pH = pKa + lg(α/(1 − α)), exactly: lg 99 = 1.99563519459755 (ten places and more recalled).
  test.each([
    [1, '0.5', 'rising', '4.75600000000'],
    [0, '0.5', 'falling', '4.75600000000'],
    [1, '0.99', 'rising', '6.75163519460'],
    [0, '0.99', 'falling', '2.76036480540'],
    [1, '1e-60', 'rising', '-55.2440000000'],
  ])('has species %i at a fraction of %s', async (species, fraction, side, pH) => {
    const { solutions } = await ask({ system: acid, species, fraction, digits: 12 });
    expect(solutions).toEqual([{ pH, side }]);
  });
});

test('a species between has one pH on each side of its maximum, as far from it', async () => {
  // Two equal constants at 4: α₁ = u/(1 + u + u²) is 0.3 where u = 10^(pH − 4) solves
  // u² − (7/3) u + 1 = 0, so u = (7 ± √13)/6, by hand.
  const { solutions } = await ask({
    system: { fullyProtonatedCharge: 0, pKa: ['4', '4'] },
    species: 1,
    fraction: '0.3',
    digits: 8,
  });
  expect(solutions.map(({ side }) => side)).toEqual(['rising', 'falling']);
  const expected = [-1, 1].map((sign) => 4 + Math.log10((7 + sign * Math.sqrt(13)) / 6));
  solutions.forEach(({ pH }, i) => {
    expect(Number(pH)).toBeCloseTo(expected[i] ?? NaN, 6);
  });
});

test('the fraction of a stored system comes back at the pH that is answered', async () => {
  const question = { system: { id: 'phosphoric-acid' }, conditions: { ionicStrength: '0.1' } };
  const { solutions, model } = await ask({ ...question, species: 1, fraction: '0.9', digits: 20 });
  const pH = solutions.map((one) => one.pH);
  const { body } = await postWithKey(server, '/v1/fractions').send({ ...question, pH, digits: 12 });
  const back = body.points.map(({ fractions }: { fractions: string[] }) => fractions[1]);
  expect(back).toEqual(['0.900000000000', '0.900000000000']);
  expect(model).toMatchObject({
    conditions: { ionicStrength: '0.1', activityModel: 'davies' },
    constantsUsed: [{ system: { id: 'phosphoric-acid', revision: 1 } }],
    pKw: null,
  });
});

test('from 1 to 60 digits, and the same bytes each time', async () => {
  const body = { system: { id: 'citric-acid' }, species: 2, fraction: '0.3' };
  const at = async (digits: number) => (await ask({ ...body, digits })).solutions[0]?.pH ?? '';
  const sixty = await at(60);
  expect(sixty).toHaveLength(61);
  expect([await at(1), await at(15)]).toEqual([
    Number(sixty).toPrecision(1),
    Number(sixty).toPrecision(15),
  ]);
  const [one, two] = await Promise.all([1, 2].map(() => postWithKey(server, path).send(body)));
  expect(one?.text).toBe(two?.text);
});

test('the typed client answers, throws what is refused, and asks for the cost beforehand', async () => {
  const client = createClient({ baseUrl: server.url, key: server.key });
  const body = { system: acid, species: 1, fraction: '0.5', digits: 16 };
  expect((await client.pHForFraction(body)).solutions).toHaveLength(1);
  const dry = await client.pHForFraction({ ...body, dryRun: true });
  expect(dry).toEqual({ dryRun: true, cost: 60 * 2 * 36, computeUnits: 1, warnings: [] });
  await expect(client.pHForFraction({ ...body, species: 2 })).rejects.toBeInstanceOf(ProblemError);
});

test('as CSV there is none: it is no curve', async () => {
  const body = { system: acid, species: 1, fraction: '0.5' };
  const answer = await postWithKey(server, path).set('Accept', 'text/csv').send(body);
  expect(answer.status).toBe(406);
});

const call = (part: object) => ({
  system: { id: 'phosphoric-acid' },
  species: 1,
  fraction: '0.5',
  ...part,
});
const half = { fullyProtonatedCharge: 0, pKa: ['4', '4.602'] };
const refused: RefusedCall[] = [
  // α₁ at most 1/(1 + 2 × 10^−(7.198 − 2.148)/2) = 0.994065 at pH (2.148 + 7.198)/2 = 4.673, by hand.
  [
    'more than is ever reached',
    call({ fraction: '0.9999' }),
    422,
    '/fraction fraction-not-reached',
    /the most is 0\.994065, at pH 4\.673/,
  ],
  [
    'a hair more than is ever reached',
    call({ system: half, fraction: '0.49999' }),
    422,
    '/fraction fraction-not-reached',
    /the most is 0\.499983/,
  ],
  [
    'all but nothing of species between',
    call({
      system: { fullyProtonatedCharge: 0, pKa: ['-50', '70'] },
      fraction: `0.${'9'.repeat(60)}`,
    }),
    422,
    '/fraction fraction-not-reached',
    /the most is just less than that/,
  ],
  [
    'all of it',
    call({ fraction: '1' }),
    422,
    '/fraction fraction-not-reached',
    /between 0 and 1, both excluded/,
  ],
  ['none of it', call({ fraction: '0' }), 400, '/fraction out-of-range', /between 1e-60 and 1/],
  ['percents', call({ fraction: '50 %' }), 400, '/fraction not-a-decimal', /decimal string/],
  [
    'a number for a fraction',
    call({ fraction: 0.5 }),
    400,
    '/fraction decimal-must-be-string',
    /as a string/,
  ],
  [
    'a species that is not there',
    call({ species: 4 }),
    400,
    '/species no-such-species',
    /species 0 to 3/,
  ],
  ['a species in words', call({ species: '1' }), 400, '/species wrong-type', /./],
  [
    'an unknown system',
    call({ system: { id: 'no-such' } }),
    400,
    '/system/id unknown-system',
    /no-such/,
  ],
  [
    'its own ionic strength',
    call({ conditions: { ionicStrength: 'self-consistent' } }),
    422,
    '/conditions/ionicStrength model-needs-composition',
    /composition/,
  ],
];

test.each(refused)('%s is refused in words', async (...row) => {
  expect(await refusalOf(server, path, row)).toEqual(asItShould(row));
});
