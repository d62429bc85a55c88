import { asItShould, refusalOf, type RefusedCall } from '../support/refused';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const given = { fullyProtonatedCharge: 0, pKa: ['4.7'] };
const measured = { ...given, constants: { kind: 'mixed', ionicStrength: '0.1' } };
const asked = (conditions: object, system: object = { id: 'phosphoric-acid' }) => ({
  system,
  pH: '7',
  digits: 6,
  conditions,
});

const model = '/conditions/activityModel';
const refused: RefusedCall[] = [
  [
    'beyond twice Davies’s range',
    asked({ ionicStrength: '1.0001' }),
    422,
    `${model} outside-model-range`,
    /good to I = 0\.5 mol\/L; here I = 1\.0001 mol\/L/,
  ],
  [
    'a dry run beyond it',
    { ...asked({ ionicStrength: '2' }), dryRun: true },
    422,
    `${model} outside-model-range`,
    /reaches further/,
  ],
  [
    'the limiting law at 0.02',
    asked({ ionicStrength: '0.02', activityModel: 'debye-huckel' }),
    422,
    `${model} outside-model-range`,
    /limiting law is good to I = 0\.005/,
  ],
  [
    'Güntelberg at 0.21',
    asked({ ionicStrength: '0.21', activityModel: 'guntelberg' }),
    422,
    `${model} outside-model-range`,
    /Güntelberg’s equation is good to I = 0\.1/,
  ],
  [
    'ion sizes at 0.21',
    asked({ ionicStrength: '0.21', activityModel: 'extended-debye-huckel' }),
    422,
    `${model} outside-model-range`,
    /extended Debye–Hückel/,
  ],
  [
    'mixed constants elsewhere',
    asked({ ionicStrength: '0.2' }, measured),
    422,
    '/system/pKa constants-outside-medium',
    /mixed constants for I = 0\.1 mol\/L and 25 °C, asked about at I = 0\.2 mol\/L/,
  ],
  [
    'mixed constants warmer',
    asked({ ionicStrength: '0.1', temperature: '37' }, measured),
    422,
    '/system/pKa constants-outside-medium',
    /and 37 °C/,
  ],
  [
    'stored constants elsewhere',
    asked({ ionicStrength: '0.15' }, { id: 'egta' }),
    422,
    '/system/id constants-outside-medium',
    /^EGTA, pKa 1 \(2\.0\)/,
  ],
  [
    'seven charges',
    asked({ ionicStrength: '0.01' }, { fullyProtonatedCharge: 7, pKa: ['1'] }),
    422,
    '/system/pKa charge-beyond-model',
    /charge of 7 .* trusted to 6/,
  ],
  [
    'its own ionic strength of no composition',
    asked({ ionicStrength: 'self-consistent' }),
    422,
    '/conditions/ionicStrength model-needs-composition',
    /ask \/v1\/mixtures/,
  ],
  [
    'specific interaction of no composition',
    asked({ activityModel: 'specific-ion-interaction' }),
    422,
    `${model} model-needs-composition`,
    /every ion in the solution/,
  ],
  [
    'Pitzer of no composition',
    asked({ activityModel: 'pitzer' }),
    422,
    `${model} model-needs-composition`,
    /every ion in the solution/,
  ],
  [
    '101 °C',
    asked({ temperature: '101' }),
    400,
    '/conditions/temperature out-of-range',
    /between 0 and 100 °C/,
  ],
  [
    'below freezing in kelvin',
    asked({ temperature: '273.14 K' }),
    400,
    '/conditions/temperature out-of-range',
    /between 0 and 100 °C/,
  ],
  [
    'a temperature in °F',
    asked({ temperature: '98.6 °F' }),
    400,
    '/conditions/temperature unknown-unit',
    /one of °C, K/,
  ],
  [
    'a number for a temperature',
    asked({ temperature: 37 }),
    400,
    '/conditions/temperature decimal-must-be-string',
    /as a string/,
  ],
  [
    'a number for an ionic strength',
    asked({ ionicStrength: 0.1 }),
    400,
    '/conditions/ionicStrength decimal-must-be-string',
    /as a string/,
  ],
  [
    'an ionic strength in words',
    asked({ ionicStrength: 'own' }),
    400,
    '/conditions/ionicStrength not-a-quantity',
    /mmol\/L/,
  ],
  [
    'molal units in mol/L',
    asked({ ionicStrength: '0.1 mol/kg' }),
    400,
    '/conditions/ionicStrength unknown-unit',
    /basis is mol\/kg/,
  ],
  [
    'an ionic strength of 21',
    asked({ ionicStrength: '21' }),
    400,
    '/conditions/ionicStrength out-of-range',
    /between 0 and 20/,
  ],
  ['no such model', asked({ activityModel: 'debye' }), 400, `${model} invalid-value`, /davies/],
  ['no such basis', asked({ basis: 'mol' }), 400, '/conditions/basis invalid-value', /mol\/kg/],
  [
    'a field in the wrong case',
    asked({ ionicstrength: '0.1' }),
    400,
    '/conditions/ionicstrength unknown-field',
    /does not take/,
  ],
  ['pKw of 4.9', asked({ pKw: '4.9' }), 400, '/conditions/pKw out-of-range', /between 5 and 25/],
  [
    'constants without A',
    asked({ activityConstants: { linear: '0.2' } }),
    400,
    '/conditions/activityConstants/A missing',
    /needed/,
  ],
  [
    'a formula of another charge',
    asked({}, { ...given, formulas: ['HA', 'SO4^2-'] }),
    400,
    '/system/formulas/1 formula-charge',
    /Species 1 has a charge of -1, and SO4\^2- another/,
  ],
  [
    'mixed constants of no medium',
    asked({}, { ...given, constants: { kind: 'mixed' } }),
    400,
    '/system/constants/ionicStrength missing',
    /at which ionic strength/,
  ],
];

test.each(refused)('%s is refused in words', async (...call) => {
  expect(await refusalOf(server, '/v1/fractions', call)).toEqual(asItShould(call));
});
