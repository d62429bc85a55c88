import { fractionsRequest, type FractionsRequestInput } from '../../../shared/fractions';
import { engineVersion } from '../../../server/chem';
import { fractionsCsv } from '../../../server/services/fractions/fractions-csv';
import { resolved } from '../../../server/services/fractions/resolve';

// Golden answers: what this engine version answered when it was published. They are not check
// values (those are in tests/reference); a digit that differs here needs a new engine version and a
// line in docs/engine-changes.md.
const pH = { from: '-2', to: '16', step: '1.5' };
const requests: [string, FractionsRequestInput][] = [
  [
    'three constants',
    { system: { fullyProtonatedCharge: 0, pKa: ['2.148', '7.198', '12.35'] }, pH, digits: 20 },
  ],
  ['inverted constants', { system: { fullyProtonatedCharge: 1, pKa: ['9', '4'] }, pH, digits: 9 }],
  [
    'three equal constants',
    { system: { fullyProtonatedCharge: 0, pKa: ['7', '7', '7'] }, pH, digits: 2 },
  ],
  [
    'constants twenty apart',
    { system: { fullyProtonatedCharge: 2, pKa: ['-5', '15'] }, pH, digits: 60 },
  ],
  [
    'two systems on a list',
    {
      systems: [
        { fullyProtonatedCharge: 1, pKa: ['8.072'] },
        { fullyProtonatedCharge: 2, pKa: ['0.0', '1.5', '2.00', '2.69', '6.13', '10.37'] },
      ],
      pH: ['7.40', '1e1'],
      digits: 16,
    },
  ],
];

test.each(requests)(`engine ${engineVersion} answers as it did: %s`, (_name, request) => {
  expect(fractionsCsv(resolved(fractionsRequest.parse(request), new Map()))).toMatchSnapshot();
});
