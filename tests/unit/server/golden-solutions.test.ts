import { engineVersion } from '../../../server/chem';
import { exampleSystems } from '../../../server/routes/example-systems';
import { type QuestionName, questionOf } from '../../../server/services/compute/questions';
import { bufferCapacityRequest } from '../../../shared/buffer-capacity';
import { fractionsRequest } from '../../../shared/fractions';
import { isoelectricPointRequest } from '../../../shared/isoelectric-point';
import { mixtureRequest } from '../../../shared/mixtures';
import { pHForFractionRequest } from '../../../shared/ph-for-fraction';

// Golden answers, as in golden.test.ts: what this engine version answered when it was published. They
// are not check values; a digit that differs here needs a new engine version and a line in
// docs/engine-changes.md.
const schemas = {
  fractions: fractionsRequest,
  mixture: mixtureRequest,
  bufferCapacity: bufferCapacityRequest,
  isoelectricPoint: isoelectricPointRequest,
  pHForFraction: pHForFractionRequest,
};
const phosphoric = { id: 'phosphoric-acid' };
const phosphate = [
  { system: phosphoric, concentration: '0.025', form: 1, counterIon: 'K+' },
  { system: phosphoric, concentration: '0.025', form: 2, counterIon: 'Na+' },
];
const lime = { ions: [{ charge: 2, concentration: '0.0203', ion: 'Ca2+' }] };
const air = { system: { id: 'carbonic-acid' }, heldBy: { partialPressure: '0.00042 atm' } };
const warm = { temperature: '37', ionicStrength: '0.15' };

const requests: [string, QuestionName, object][] = [
  [
    'constants moved by Davies',
    'fractions',
    { system: phosphoric, pH: '7.4', conditions: warm, digits: 20 },
  ],
  ['a buffer by Davies', 'mixture', { components: phosphate, digits: 20 }],
  [
    'a buffer by ion sizes',
    'mixture',
    { components: phosphate, conditions: { activityModel: 'extended-debye-huckel' }, digits: 9 },
  ],
  [
    'a buffer by specific interaction',
    'mixture',
    {
      components: phosphate,
      conditions: { activityModel: 'specific-ion-interaction', basis: 'mol/kg' },
      digits: 20,
    },
  ],
  [
    'a buffer by Pitzer',
    'mixture',
    { components: phosphate, conditions: { activityModel: 'pitzer', basis: 'mol/kg' }, digits: 12 },
  ],
  ['water open to the air', 'mixture', { components: [air], digits: 30 }],
  ['lime water with its ion pair', 'mixture', { ...lime, ionPairs: [{ ion: 'Ca2+' }], digits: 6 }],
  [
    'a capacity and its maxima',
    'bufferCapacity',
    {
      components: [{ system: phosphoric, concentration: '0.05' }],
      pH: ['2', '7.4'],
      conditions: warm,
      digits: 20,
    },
  ],
  [
    'an isoelectric and an isoionic point',
    'isoelectricPoint',
    { system: { id: 'glycine' }, concentration: '0.1', digits: 20 },
  ],
  [
    'both sides of a maximum',
    'pHForFraction',
    { system: phosphoric, species: 1, fraction: '0.99', digits: 60 },
  ],
];

/** What is no number of the engine's: words, the handbook's constants, how the answer was reached. */
const beside = new Set(
  'constantsUsed interactions solver weighedAs name index charge formula source why'.split(' '),
);

/** The numbers of an answer, a line each under where it stands. */
function numbersOf(value: unknown, path = ''): string[] {
  if (typeof value !== 'object' || value === null) return [`${path} ${String(value)}`];
  return Object.entries(value).flatMap(([name, part]) =>
    beside.has(name) ? [] : numbersOf(part, path ? `${path}.${name}` : name),
  );
}

test.each(requests)(`engine ${engineVersion} answers as it did: %s`, (_title, name, request) => {
  const { resolved, answer } = questionOf(name);
  const asked = schemas[name].parse(request);
  expect(numbersOf(answer(resolved(asked, exampleSystems))).join('\n')).toMatchSnapshot();
});
