import { asItShould, refusalOf, type RefusedCall } from '../support/refused';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const acid = { fullyProtonatedCharge: 0, pKa: ['4.7'] };
const phosphate = (part: object = {}, conditions?: object) => ({
  components: [{ system: { id: 'phosphoric-acid' }, concentration: '0.1', form: 1, ...part }],
  ...(conditions && { conditions }),
});
const charged = { fullyProtonatedCharge: 7, pKa: ['4'] };
const pitzer = { activityModel: 'pitzer' };
const place = '/components/0';
const model = '/conditions/activityModel';

const chemistry: RefusedCall[] = [
  [
    '3 mol/L by Davies',
    phosphate({ concentration: '3' }),
    422,
    `${model} outside-model-range`,
    /good to I = 0\.5 mol\/L; here I = 3\.\d+ mol\/L/,
  ],
  [
    'a dry run at I = 5',
    { ...phosphate({}, { ionicStrength: '5' }), dryRun: true },
    422,
    `${model} outside-model-range`,
    /here I = 5 mol/,
  ],
  [
    'constants of a medium at any ionic strength',
    phosphate({ system: { id: 'egta' } }),
    422,
    `${place}/system/id constants-outside-medium`,
    /whatever ionic strength the mixture has/,
  ],
  [
    'seven charges by Davies',
    phosphate({ system: charged }),
    422,
    `${place}/system/pKa charge-beyond-model`,
    /"outOfRange": "compute"/,
  ],
  [
    'seven charges by Pitzer, whatever is asked',
    phosphate({ system: charged }, { ...pitzer, outOfRange: 'compute' }),
    422,
    `${place}/system/pKa charge-beyond-model`,
    /"ideal"\.$/,
  ],
  [
    'an ionic strength for Pitzer',
    phosphate({}, { ...pitzer, ionicStrength: '0.1' }),
    422,
    '/conditions/ionicStrength model-needs-composition',
    /leave the ionic strength out/,
  ],
  [
    'a salt that Pitzer’s tables miss',
    phosphate({ system: acid }, pitzer),
    422,
    `${model} interaction-missing`,
    /no parameters here for Na\^\+ with 1-/,
  ],
  [
    'carbon dioxide above 90 °C',
    {
      components: [{ system: { id: 'carbonic-acid' }, heldBy: { partialPressure: '40' } }],
      conditions: { temperature: '91' },
    },
    422,
    `${place}/heldBy/henryConstant henry-constant-needed`,
    /known to 90 °C/,
  ],
  [
    'no ionic strength that fits',
    {
      ions: [{ charge: 6, concentration: '50' }],
      conditions: { activityModel: 'debye-huckel', outOfRange: 'compute' },
    },
    422,
    `${model} no-ionic-strength`,
    /far outside the model’s range/,
  ],
  [
    'more work than a call may ask for',
    {
      components: Array(24).fill({
        system: { fullyProtonatedCharge: 0, pKa: Array(64).fill('7') },
        concentration: '0.1',
        form: 0,
      }),
    },
    422,
    ' cost-over-limit',
    /may ask for 12000000/,
  ],
  [
    'hours of Pitzer’s pairs',
    {
      components: Array(24).fill({
        system: { fullyProtonatedCharge: 6, pKa: Array(12).fill('7') },
        concentration: '0.1',
        form: 6,
      }),
      conditions: { ...pitzer, outOfRange: 'compute' },
    },
    422,
    ' cost-over-limit',
    /GET \/v1\/limits/,
  ],
];

test.each(chemistry)('%s is refused in words', async (...call) => {
  expect(await refusalOf(server, '/v1/mixtures', call)).toEqual(asItShould(call));
});
