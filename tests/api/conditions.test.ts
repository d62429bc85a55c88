import { fractionsAnswer } from '../../shared/fractions';
import { phosphoric, postWithKey } from '../support/calls';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const stored = { id: 'phosphoric-acid' };
const given = { fullyProtonatedCharge: 0, pKa: ['4.7'] };
const measured = { ...given, constants: { kind: 'mixed', ionicStrength: '0.1' } };
const asked = (conditions: object, system: object = stored) => ({
  system,
  pH: '7',
  digits: 6,
  conditions,
});
const ask = async (conditions: object, system: object = stored) => {
  const { body } = await postWithKey(server, '/v1/fractions').send(asked(conditions, system));
  return fractionsAnswer.parse(body);
};
const warned = async (conditions: object, system?: object) =>
  (await ask(conditions, system)).model.warnings.map(({ code, pointer }) => `${pointer} ${code}`);

test('a model without an ionic strength is said to be the ideal one', async () => {
  const said = ['/conditions/ionicStrength no-ionic-strength-given'];
  expect(await warned({ activityModel: 'davies' })).toEqual(said);
  expect(await warned({ temperature: '25' })).toEqual([]);
});

describe('what nobody says is filled in', () => {
  const filledIn: [string, object, object][] = [
    ['nothing: ideal', {}, { temperature: '25', ionicStrength: '0', activityModel: 'ideal' }],
    ['I alone: Davies', { ionicStrength: '0.1' }, { activityModel: 'davies' }],
    ['I of nothing: ideal', { ionicStrength: '0.0' }, { activityModel: 'ideal' }],
    ['a model alone: I = 0', { activityModel: 'guntelberg' }, { ionicStrength: '0' }],
    ['outOfRange', { temperature: '37' }, { temperature: '37', outOfRange: 'refuse' }],
  ];
  test.each(filledIn)('%s', async (_name, conditions, used) => {
    expect((await ask(conditions)).model.conditions).toMatchObject(used);
  });

  test('a mixture is by Davies at its own ionic strength, in mol/L', async () => {
    const { body } = await postWithKey(server, '/v1/mixtures').send({ strongAcid: '0.01' });
    expect(body.model).toMatchObject({
      conditions: { ionicStrength: 'self-consistent', activityModel: 'davies' },
      basis: 'mol/L',
      digits: 16,
    });
    // 13.995 by IAPWS R11-07 at 25 °C, printed to three places.
    expect(Math.abs(Number(body.model.pKw) - 13.995)).toBeLessThanOrEqual(0.0005);
  });
});

test('a constant moves with the ionic strength as worked by hand', async () => {
  // f = A (√I/(1 + √I) − 0.3 I) = 0.509 × 0.210253 = 0.107019 at I = 0.1 (C. W. Davies, 1962);
  // of H2PO4⁻, z = −1: pK′ = 7.198 − 3 f, of H3PO4, z = 0: 2.148 − f, of HPO4²⁻: 12.35 − 5 f.
  const activityConstants = { A: '0.509', linear: '0.3' };
  const { effectivePKa, model } = await ask({ ionicStrength: '0.1', activityConstants });
  const expected = [2.148 - 0.107019, 7.198 - 3 * 0.107019, 12.35 - 5 * 0.107019];
  effectivePKa.forEach((one, i) => {
    // Six digits are returned, and f is worked to six places.
    expect(Math.abs(Number(one) - (expected[i] ?? NaN))).toBeLessThan(6e-5);
  });
  expect(model.activityConstants).toMatchObject({ ...activityConstants, B: null });
  expect(model.activityConstants?.source).toMatch(/^As given/);
});

test('constants at a temperature are printed beside those they come from', async () => {
  const [used] = (await ask({ temperature: '37' })).model.constantsUsed;
  // ln K(T) by ΔH° and ΔCp° worked by hand for step 2: 3.6 kJ/mol, −230 J/(mol K) give 7.1828.
  expect(used?.pKaAtTemperature?.[1]).toMatch(/^7\.1828/);
  expect(used?.pKa).toEqual(phosphoric.pKa);
  expect(used?.thermo?.[1]).toEqual({ deltaH: '3.6', deltaCp: '-230.0' });
  expect(used?.system).toEqual({ id: 'phosphoric-acid', revision: 1 });
  expect((await ask({ temperature: '25.0' })).model.constantsUsed[0]).not.toHaveProperty('thermo');
});

test('one temperature and one ionic strength in any unit give the same bytes', async () => {
  const texts = await Promise.all(
    [
      { temperature: '37', ionicStrength: '0.15' },
      { temperature: '37 °C', ionicStrength: '150 mmol/L' },
      { temperature: '310.15 K', ionicStrength: '150000 umol/L' },
    ].map(async (one) => (await postWithKey(server, '/v1/fractions').send(asked(one))).text),
  );
  expect(new Set(texts).size).toBe(1);
});

describe('warnings', () => {
  const seven = { fullyProtonatedCharge: 7, pKa: ['1'] };
  const rows: [string, object, object | undefined, string[]][] = [
    ['within Davies’s range', { ionicStrength: '0.5' }, undefined, []],
    [
      'up to twice of it',
      { ionicStrength: '1' },
      undefined,
      ['/conditions/activityModel outside-model-range'],
    ],
    [
      'beyond, and asked for',
      { ionicStrength: '20', outOfRange: 'compute' },
      undefined,
      ['/conditions/activityModel outside-model-range'],
    ],
    [
      'seven charges, and asked for',
      { ionicStrength: '0.01', outOfRange: 'compute' },
      seven,
      ['/system/pKa charge-beyond-model'],
    ],
    ['seven charges by no model', {}, seven, []],
    [
      'constants of another medium, and asked for',
      { ionicStrength: '0.2', outOfRange: 'compute' },
      measured,
      ['/system/pKa constants-outside-medium'],
    ],
    ['constants in their medium', { ionicStrength: '0.10' }, measured, []],
    [
      'constants where no medium is asked about',
      {},
      measured,
      ['/system/pKa constants-at-their-medium'],
    ],
    [
      'no enthalpy at another temperature',
      { temperature: '37' },
      given,
      ['/system/pKa pka-not-temperature-corrected'],
    ],
    [
      'warmer than 60 °C',
      { temperature: '60.1' },
      undefined,
      ['/system/id temperature-beyond-trust'],
    ],
    ['no warmer', { temperature: '60' }, undefined, []],
    [
      'an ion of unknown size',
      { ionicStrength: '0.01', activityModel: 'extended-debye-huckel' },
      given,
      ['/system/pKa ion-size-assumed'],
    ],
    [
      'a size that is given',
      { ionicStrength: '0.01', activityModel: 'extended-debye-huckel' },
      { ...given, ionSizes: ['400', '0.45 nm'] },
      [],
    ],
  ];
  test.each(rows)('%s', async (_name, conditions, system, expected) => {
    expect(await warned(conditions, system)).toEqual(expected);
  });
});
