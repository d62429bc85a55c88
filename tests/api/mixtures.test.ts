import request from 'supertest';
import { createClient, ProblemError } from '../../shared/client';
import { mixtureAnswer } from '../../shared/mixtures';
import { faultsIn, postWithKey } from '../support/calls';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const phosphoric = { id: 'phosphoric-acid' };
const equimolal = {
  components: [
    { system: phosphoric, concentration: '0.025', form: 1, counterIon: 'K+' },
    { system: phosphoric, concentration: '0.025', form: { charge: -2 }, counterIon: 'Na+' },
  ],
  conditions: { basis: 'mol/kg' },
};
const ask = async (body: object) => {
  const answer = await postWithKey(server, '/v1/mixtures').send(body);
  expect(answer.body.errors).toBeUndefined();
  return mixtureAnswer.parse(answer.body);
};
test('the equimolal phosphate buffer is within 0.02 of its certified pH by Davies', async () => {
  // 6.865 at 25 °C: NIST/IUPAC reference buffer (recalled); 0.02 is what the model claims.
  const { pH, ionicStrengthUsed, model, components, ions } = await ask(equimolal);
  expect(Math.abs(Number(pH) - 6.865)).toBeLessThan(0.02);
  // I = ½ Σ m z²: 0.025 of KH2PO4 and 3 × 0.025 of Na2HPO4, by hand.
  expect(Number(ionicStrengthUsed)).toBeCloseTo(0.1, 3);
  expect(model.basis).toBe('mol/kg');
  expect(model.constantsUsed.map(({ system }) => system)).toEqual(
    [0, 1].map(() => ({ id: 'phosphoric-acid', revision: 1 })),
  );
  expect(components.map(({ weighedAs }) => weighedAs?.counterIon)).toEqual([
    { ion: 'K^+', charge: 1, concentration: '0.02500000000000000' },
    { ion: 'Na^+', charge: 1, concentration: '0.05000000000000000' },
  ]);
  expect(components[1]?.weighedAs).toMatchObject({ index: 2, charge: -2, formula: 'HPO4^2-' });
  expect(ions.map(({ ion }) => ion)).toEqual(['K^+', 'Na^+']);
});

test('water alone has the pH of half its ion product', async () => {
  const water = await ask({ digits: 20, conditions: { pKw: '14', activityModel: 'ideal' } });
  expect(water.pH).toBe('7.0000000000000000000');
  expect(water.hydrogen).toBe('1.0000000000000000000e-7');
  expect([water.components, water.ions, water.shortcuts]).toEqual([[], [], []]);
});

test('a strong acid has the pH of its concentration where activities are left out', async () => {
  // −lg 0.01 = 2: water adds 10⁻¹² in 10⁻².
  const { pH, ions } = await ask({
    strongAcid: '10 mmol/L',
    conditions: { activityModel: 'ideal' },
    digits: 6,
  });
  expect([pH, ions[0]?.ion, ions[0]?.concentration]).toEqual(['2.00000', 'Cl^-', '0.0100000']);
});

test('what is not there changes nothing', async () => {
  const nothing = { components: [{ system: phosphoric, concentration: '0', form: 0 }] };
  const [water, none] = [await ask({}), await ask({ ...nothing, strongAcid: '0' })];
  expect(none.pH).toBe(water.pH);
  expect(none.components[0]?.species.map(({ concentration }) => Number(concentration))).toEqual([
    0, 0, 0, 0,
  ]);
});

test('a gas holds its neutral species by its solubility', async () => {
  // 0.034 mol/(kg atm) × 0.00042 atm, by hand.
  const part = { partialPressure: '0.00042 atm', henryConstant: '0.034' };
  const { components } = await ask({
    components: [{ system: { id: 'carbonic-acid' }, heldBy: part }],
    digits: 6,
  });
  expect(components[0]).toMatchObject({
    weighedAs: null,
    heldBy: { partialPressure: '42.5565', henryConstant: '0.034' },
  });
  expect(components[0]?.species[0]?.concentration).toBe('0.0000142800');
});

test('ions of one name are one, those without a name stay apart', async () => {
  const { ions } = await ask({
    strongBase: '0.01',
    ions: [
      { charge: 1, concentration: '0.02', ion: 'Na+' },
      { charge: -1, concentration: '0.01' },
      { charge: -1, concentration: '0.02' },
    ],
    digits: 3,
  });
  expect(ions.map(({ ion, concentration }) => [ion, concentration])).toEqual([
    ['Na^+', '0.0300'],
    [null, '0.0100'],
    [null, '0.0200'],
  ]);
});

test('parameters of ions for each other stand in the answer with their source', async () => {
  const { model } = await ask({ ...equimolal, conditions: { activityModel: 'pitzer' } });
  expect(model.interactions?.length).toBeGreaterThan(3);
  expect(model.interactions?.every(({ source, provenance }) => source && provenance)).toBe(true);
  expect((await ask(equimolal)).model.interactions).toBeUndefined();
});

test('from 1 to 60 digits, each is the next one rounded; the same request gives the same bytes', async () => {
  const at = async (digits: number) => (await ask({ ...equimolal, digits })).pH;
  const sixty = await at(60);
  expect(sixty).toHaveLength(61);
  expect([await at(1), await at(16)]).toEqual(['7', Number(sixty).toPrecision(16)]);
  const texts = [1, 2].map(() => postWithKey(server, '/v1/mixtures').send(equimolal));
  const [one, two] = await Promise.all(texts);
  expect(one?.text).toBe(two?.text);
});

test('24 components are answered, and a dry run tells the cost of it beforehand', async () => {
  const system = { fullyProtonatedCharge: 0, pKa: ['4.7'] };
  const body = {
    components: Array(24).fill({ system, concentration: '0.01', form: 1 }),
    digits: 3,
  };
  expect((await ask(body)).components).toHaveLength(24);
  const { body: dry } = await postWithKey(server, '/v1/mixtures').send({ ...body, dryRun: true });
  // (35 + 3) points × (24 × 2 species + 24 counter-ions + 20) × (30 + 20), as GET /v1/limits has it.
  const cost = 38 * 92 * 50;
  expect(dry).toEqual({ dryRun: true, cost, computeUnits: Math.ceil(cost / 10_000), warnings: [] });
});

test('the typed client and the public path answer and refuse alike', async () => {
  const client = createClient({ baseUrl: server.url, key: server.key });
  const body = { components: [{ system: phosphoric, concentration: '0.1', form: 1 }] };
  const [keyed, open] = [await client.mixture(body), await client.publicMixture(body)];
  expect(open).toEqual(keyed);
  expect((await client.mixture({ ...body, dryRun: true })).computeUnits).toBeGreaterThan(0);
  await expect(client.mixture({ strongAcid: '99' })).rejects.toBeInstanceOf(ProblemError);
  const post = (sent: object) => request(server.url).post('/v1/public/mixtures').send(sent);
  expect(faultsIn((await post({ dryRun: true })).body)).toEqual(['/dryRun unknown-field']);
  const costly = await post({ components: Array(24).fill(body.components[0]) });
  expect([costly.status, faultsIn(costly.body)]).toEqual([422, [' cost-over-limit']]);
});
