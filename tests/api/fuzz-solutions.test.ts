import fc from 'fast-check';
import { problem } from '../../shared/problem';
import { postWithKey } from '../support/calls';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

/** One of what is right, or now and then of what is not. */
const mostly = <T>(right: readonly T[], wrong: readonly T[]) =>
  fc.oneof(
    { weight: 30, arbitrary: fc.constantFrom(...right) },
    { weight: 1, arbitrary: fc.constantFrom(...wrong) },
  );

const quantity = mostly(['0', '1e-60', '1e-9', '0.1', '25 mmol/L', '50'], ['51', '-1', '7 x']);
const pKa = mostly(['-50', '70', '7', '0', '2.148', '12.35'], ['71', 'NaN']);
const many = <T>(one: fc.Arbitrary<T>, count: number) =>
  fc.array(one, { minLength: count, maxLength: count });
const inFull = fc.integer({ min: 1, max: 5 }).chain((protons) =>
  fc.record(
    {
      fullyProtonatedCharge: fc.integer({ min: -3, max: 8 }),
      pKa: many(pKa, protons),
      thermo: many(
        mostly<object | null>([null, { deltaH: '-500', deltaCp: '5000' }, { deltaH: '500' }], [{}]),
        protons,
      ),
      constants: mostly<object>(
        [
          { kind: 'mixed', ionicStrength: '0.1' },
          { kind: 'concentration', ionicStrength: '20', temperature: '100' },
        ],
        [{ kind: 'mixed' }],
      ),
      ionSizes: many(mostly(['50', '5000', '0.4 nm'], ['49']), protons + 1),
      formulas: many(fc.constantFrom('H3PO4', 'Cl^-', '^', 'Na'), protons + 1),
    },
    { requiredKeys: ['fullyProtonatedCharge', 'pKa'] },
  ),
);
const stored = mostly(['phosphoric-acid', 'carbonic-acid', 'glycine', 'edta'], ['no-such']);
const system = fc.oneof(
  stored.map((id) => ({ id })),
  inFull,
);
const ion = mostly(['Na+', 'Ca2+', 'SO4^2-', 'Cl-'], ['SO42-', 'X', '__proto__']);
const heldBy = fc.record(
  {
    partialPressure: mostly(['0', '40', '1 atm', '1e7'], ['1e8']),
    henryConstant: mostly(['1e-12', '0.034', '1e6'], ['0']),
  },
  { requiredKeys: ['partialPressure'] },
);
const form = mostly<unknown>([0, 1, 1, { charge: 0 }], [-1, 4, { charge: -3 }, '1']);
const component = fc.oneof(
  fc.record(
    { system, concentration: quantity, form, counterIon: ion },
    { requiredKeys: ['system', 'concentration', 'form'] },
  ),
  fc.record({ system, heldBy }),
);
const conditions = fc.record(
  {
    temperature: mostly(['0', '25', '37 °C', '100', '373.15 K'], ['101']),
    ionicStrength: fc.constantFrom('0', '0.1', '20', 'self-consistent', '1e-40'),
    activityModel: fc.constantFrom(
      'ideal',
      'debye-huckel',
      'extended-debye-huckel',
      'guntelberg',
      'davies',
      'specific-ion-interaction',
      'pitzer',
    ),
    pKw: mostly(['5', '14', '25'], ['26']),
    activityConstants: mostly<object>(
      [
        { A: '0', linear: '1' },
        { A: '2', B: '10' },
      ],
      [{}],
    ),
    basis: fc.constantFrom('mol/L', 'mol/kg'),
  },
  { requiredKeys: [] },
);
const rest = { conditions, digits: mostly([1, 3, 16, 60], [61]), dryRun: fc.boolean() };
const requiredKeys: [] = [];

const questions: Record<string, fc.Arbitrary<object>> = {
  '/v1/mixtures': fc.record(
    {
      components: fc.array(component, { maxLength: 3 }),
      strongAcid: quantity,
      strongBase: quantity,
      ions: fc.array(
        fc.record(
          { charge: fc.integer({ min: -2, max: 2 }), concentration: quantity, ion },
          { requiredKeys: ['charge', 'concentration'] },
        ),
        { maxLength: 3 },
      ),
      ionPairs: fc.array(fc.record({ ion, lgK: fc.constantFrom('1.3', '-5', '10') }), {
        maxLength: 2,
      }),
      ...rest,
    },
    { requiredKeys },
  ),
  '/v1/buffer-capacity': fc.record(
    {
      components: fc.array(fc.record({ system, concentration: quantity }), { maxLength: 3 }),
      pH: fc.oneof(pKa, fc.constantFrom(['7', '-20'], { from: '0', to: '14', step: '1' })),
      ...rest,
    },
    { requiredKeys: ['components', 'pH'] },
  ),
  '/v1/isoelectric-point': fc.record(
    { system, concentration: quantity, ...rest },
    { requiredKeys: ['system'] },
  ),
  '/v1/ph-for-fraction': fc.record(
    {
      system,
      species: fc.integer({ min: -1, max: 4 }),
      fraction: mostly(['0.5', '1', '1e-60', `0.${'9'.repeat(60)}`], ['2']),
      ...rest,
    },
    { requiredKeys: ['system', 'species', 'fraction'] },
  ),
};

test.each(Object.entries(questions))(
  '%s answers anything near its schema, or refuses it in words',
  async (path, body) => {
    await fc.assert(
      fc.asyncProperty(body, async (sent) => {
        const answer = await postWithKey(server, path).send(sent);
        expect([200, 400, 422]).toContain(answer.status);
        if (answer.status !== 200) expect(problem.safeParse(answer.body).error).toBeUndefined();
        else expect(answer.text).not.toMatch(/NaN|Infinity|undefined/);
      }),
      { numRuns: 300 },
    );
  },
);
