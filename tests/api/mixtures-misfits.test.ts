import { asItShould, refusalOf, type RefusedCall } from '../support/refused';
import { startTestServer, type TestServer } from '../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

const acid = { fullyProtonatedCharge: 0, pKa: ['4.7'] };
const phosphate = (part: object = {}) => ({
  components: [{ system: { id: 'phosphoric-acid' }, concentration: '0.1', form: 1, ...part }],
});
const held = (system: object, part: object = {}) => ({
  components: [{ system, heldBy: { partialPressure: '40', ...part } }],
});
const calcium = { charge: 2, concentration: '0.01', ion: 'Ca2+' };
const magnesium = { ...calcium, ion: 'Mg2+' };
const charged = { fullyProtonatedCharge: 7, pKa: ['4'] };
const place = '/components/0';

const parts: RefusedCall[] = [
  [
    'a form that is not there',
    phosphate({ form: 4 }),
    400,
    `${place}/form no-such-form`,
    /forms are 0 to 3, of charges 0 to -3/,
  ],
  [
    'a charge that no form has',
    phosphate({ form: { charge: 1 } }),
    400,
    `${place}/form no-such-form`,
    /charges 0 to -3/,
  ],
  ['no form', phosphate({ form: undefined }), 400, `${place}/form missing`, /needed/],
  ['a form in words', phosphate({ form: '1' }), 400, `${place}/form invalid-value`, /protons lost/],
  [
    'a counter-ion of the same sign',
    phosphate({ counterIon: 'Cl-' }),
    400,
    `${place}/counterIon counter-ion-charge`,
    /charge of -1: its counter-ion must have the other sign/,
  ],
  [
    'a counter-ion of a neutral form',
    phosphate({ form: 0, counterIon: 'Na+' }),
    400,
    `${place}/counterIon counter-ion-not-needed`,
    /neutral/,
  ],
  [
    'the ion of water as a counter-ion',
    phosphate({ counterIon: 'H+', form: 1 }),
    400,
    `${place}/counterIon ion-of-water`,
    /strongAcid/,
  ],
  [
    'hydroxide as an inert ion',
    { ions: [{ charge: -1, concentration: '0.1', ion: 'OH-' }] },
    400,
    '/ions/0/ion ion-of-water',
    /strongBase/,
  ],
  [
    'one system held by two gases',
    {
      components: ['40', '50'].map((partialPressure) => ({
        system: { id: 'carbonic-acid' },
        heldBy: { partialPressure },
      })),
    },
    400,
    '/components/1 given-twice',
    /One gas phase/,
  ],
  [
    'a charge run into a count',
    phosphate({ counterIon: 'SO42-' }),
    400,
    `${place}/counterIon not-an-ion`,
    /what follows \^ is the charge/,
  ],
  [
    'no such element',
    phosphate({ counterIon: 'Xx+' }),
    400,
    `${place}/counterIon not-an-ion`,
    /elements/,
  ],
  [
    'a number for a concentration',
    phosphate({ concentration: 0.1 }),
    400,
    `${place}/concentration decimal-must-be-string`,
    /as a string/,
  ],
  [
    'more than 50 mol/L',
    phosphate({ concentration: '50001 mmol/L' }),
    400,
    `${place}/concentration out-of-range`,
    /between 0 and 50 mol\/L/,
  ],
  [
    'an M for a unit',
    phosphate({ concentration: '25 mM' }),
    400,
    `${place}/concentration unknown-unit`,
    /mmol\/L/,
  ],
  [
    'weighed in and held at once',
    phosphate({ heldBy: { partialPressure: '40' } }),
    400,
    `${place}/heldBy unknown-field`,
    /./,
  ],
  [
    'a system that is not there',
    phosphate({ system: { id: 'no-such' } }),
    400,
    `${place}/system/id unknown-system`,
    /no system no-such/,
  ],
  [
    'too few enthalpies',
    phosphate({ system: { ...acid, thermo: [] } }),
    400,
    `${place}/system/thermo wrong-length`,
    /Give 1/,
  ],
  [
    'a gas of unknown solubility',
    held({ id: 'phosphoric-acid' }),
    400,
    `${place}/heldBy/henryConstant henry-constant-needed`,
    /solubility/,
  ],
  [
    'a gas that is never neutral',
    held(charged, { henryConstant: '1' }),
    400,
    `${place}/system no-neutral-form`,
    /neutral species/,
  ],
  [
    'a gas without a pressure',
    held(acid, { partialPressure: undefined }),
    400,
    `${place}/heldBy/partialPressure missing`,
    /needed/,
  ],
  [
    'a pressure in psi',
    held(acid, { partialPressure: '1 psi' }),
    400,
    `${place}/heldBy/partialPressure unknown-unit`,
    /atm/,
  ],
  [
    'an ion without a charge',
    { ions: [{ ...calcium, charge: 0 }] },
    400,
    '/ions/0/charge ion-without-charge',
    /has a charge/,
  ],
  [
    'an ion of another charge',
    { ions: [{ ...calcium, charge: 1 }] },
    400,
    '/ions/0/charge ion-charge',
    /Ca\^2\+ says a charge of 2/,
  ],
  [
    'seven charges',
    { ions: [{ charge: 7, concentration: '1' }] },
    400,
    '/ions/0/charge out-of-range',
    /./,
  ],
  [
    'a pair of an absent ion',
    { ionPairs: [{ ion: 'Ca2+' }] },
    400,
    '/ionPairs/0/ion no-such-ion',
    /no Ca\^2\+ in the mixture/,
  ],
  [
    'a pair of an anion',
    { strongAcid: '1', ionPairs: [{ ion: 'Cl-' }] },
    400,
    '/ionPairs/0/ion ion-charge',
    /anion does not pair/,
  ],
  [
    'a pair given twice',
    { ions: [calcium], ionPairs: [{ ion: 'Ca2+' }, { ion: 'Ca^2+' }] },
    400,
    '/ionPairs/1/ion given-twice',
    /twice/,
  ],
  [
    'a pair of unknown lg K',
    { ions: [magnesium], ionPairs: [{ ion: 'Mg2+' }] },
    400,
    '/ionPairs/0/lgK missing',
    /Give lg K/,
  ],
  [
    '25 components',
    { components: Array(25).fill(phosphate().components[0]) },
    400,
    '/components out-of-range',
    /24/,
  ],
  ['25 ions', { ions: Array(25).fill(calcium) }, 400, '/ions out-of-range', /24/],
  ['a field nobody reads', { water: '1' }, 400, '/water unknown-field', /does not take/],
];

test.each(parts)('%s is refused in words', async (...call) => {
  expect(await refusalOf(server, '/v1/mixtures', call)).toEqual(asItShould(call));
});
