import { mixtureAnswer } from '../../shared/mixtures';
import { postWithKey } from '../support/calls';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const warned = async (body: object) => {
  const answer = await postWithKey(server, '/v1/mixtures').send(body);
  const { model } = mixtureAnswer.parse(answer.body);
  return model.warnings.map(({ code, pointer = '' }) => `${pointer} ${code}`.trim());
};

const phosphate = (part: object = {}, conditions?: object) => ({
  components: [{ system: { id: 'phosphoric-acid' }, concentration: '0.1', form: 1, ...part }],
  ...(conditions && { conditions }),
});
const many = Array.from({ length: 20 }, (_, i) => (3 + i / 10).toFixed(1));
const lime = {
  ions: [{ charge: 2, concentration: '0.01', ion: 'Ca2+' }],
  ionPairs: [{ ion: 'Ca2+' }],
};
const unnamed = { ions: [1, -1].map((charge) => ({ charge, concentration: '0.05' })) };
const model = '/conditions/activityModel';
const rows: [string, object, string[]][] = [
  ['none', phosphate(), []],
  [
    'an ion that takes part, as a counter-ion',
    phosphate({ counterIon: 'NH4+' }),
    ['/ions ion-takes-part'],
  ],
  [
    'a system whose constants begin late',
    phosphate({ system: { id: 'sulfuric-acid' }, form: 0, counterIon: 'Na+' }),
    ['/components/0/system/id note-of-system'],
  ],
  [
    'I as good as at the end of a range',
    { strongAcid: '0.5', conditions: { ionicStrength: '0.5004' } },
    [],
  ],
  [
    'I beyond Davies’s range',
    phosphate({ concentration: '0.8' }),
    [`${model} outside-model-range`],
  ],
  [
    'another I than the composition’s',
    phosphate({}, { ionicStrength: '0.3' }),
    ['/conditions/ionicStrength ionic-strength-differs'],
  ],
  [
    'parameters of 25 °C',
    phosphate({}, { activityModel: 'specific-ion-interaction', temperature: '37' }),
    ['/conditions/temperature parameters-of-another-temperature'],
  ],
  [
    'pairs without parameters',
    phosphate(
      { system: { fullyProtonatedCharge: 0, pKa: ['4.7'] } },
      { activityModel: 'specific-ion-interaction' },
    ),
    [`${model} missing-interaction`],
  ],
  [
    'ions without a name',
    { ...unnamed, conditions: { activityModel: 'specific-ion-interaction' } },
    ['/ions unnamed-ion', `${model} missing-interaction`],
  ],
  [
    'ions of unknown size',
    { ...unnamed, conditions: { activityModel: 'extended-debye-huckel' } },
    ['ion-size-assumed'],
  ],
  [
    'lg K of 25 °C',
    { ...lime, conditions: { temperature: '37' } },
    ['/ionPairs pka-not-temperature-corrected'],
  ],
  // Three ionic strengths fit this acid: the case that the model's description names.
  [
    'several ionic strengths',
    {
      components: [
        { system: { fullyProtonatedCharge: 0, pKa: many }, concentration: '0.01', form: 0 },
      ],
      conditions: { outOfRange: 'compute' },
    },
    [
      '/components/0/system/pKa charge-beyond-model',
      '/conditions/ionicStrength several-ionic-strengths',
    ],
  ],
];
test.each(rows)('%s: told beside the answer', async (_name, body, expected) => {
  expect(await warned(body)).toEqual(expected);
});

test('bicarbonate in a gas that holds carbon dioxide is its alkalinity alone', async () => {
  const air = { system: { id: 'carbonic-acid' }, heldBy: { partialPressure: '0.00042 atm' } };
  const soda = { system: { id: 'carbonic-acid' }, concentration: '0.01', form: 1 };
  const [asWeighed, asBase] = await Promise.all(
    [{ components: [soda, air] }, { components: [air], strongBase: '0.01' }].map(async (body) => {
      const answer = await postWithKey(server, '/v1/mixtures').send({ ...body, digits: 8 });
      return mixtureAnswer.parse(answer.body);
    }),
  );
  expect(asWeighed?.pH).toBe(asBase?.pH);
  // A caller’s own charge balance at 120 digits gave 9.0856378 for the second.
  expect(asWeighed?.pH).toBe('9.0856378');
  expect(asWeighed?.model.warnings.map(({ code }) => code)).toContain('held-by-gas');
});
