import { fractionsRequest } from '../../../shared/fractions';
import { gridCount, pHInput } from '../../../shared/ph';
import { decimalString } from '../../../shared/decimal';

const accepts = (value: unknown) => pHInput.safeParse(value).success;

test.each(['0', '-0', '7.40', '1e-3', '-2.5E+1', '0.000', `0.${'1'.repeat(70)}`])(
  '%s is a decimal',
  (value) => {
    expect(decimalString.safeParse(value).success).toBe(true);
  },
);

test.each([
  '',
  ' 7',
  '+7',
  '.5',
  '5.',
  '07',
  '7,4',
  'NaN',
  'Infinity',
  '0x10',
  '1e401',
  '1e',
  '７',
  `0.${'1'.repeat(79)}`,
  '7\u0000',
  '--7',
  7.4,
  null,
])('%j is no decimal', (value) => {
  expect(decimalString.safeParse(value).success).toBe(false);
});

describe('a pH', () => {
  test.each(['-20', '40', '7.4', '1e1', `7.${'0'.repeat(59)}1`])('may be %s', (value) => {
    expect(accepts(value)).toBe(true);
  });
  test.each(['-20.0000000000000000000000001', '40.00000000000000000000000000000001', '1e-61'])(
    'may not be %s, though a binary float could not tell',
    (value) => {
      expect(accepts(value)).toBe(false);
    },
  );
});

describe('a grid', () => {
  test('counts both ends where the step reaches them', () => {
    expect(gridCount({ from: '0', to: '14', step: '0.01' })).toBe(1401);
    expect(gridCount({ from: '0', to: '1', step: '0.3' })).toBe(4);
    expect(gridCount({ from: '7', to: '7', step: '1' })).toBe(1);
  });

  test('counts exactly where sixty decimals decide', () => {
    const tiny = `0.${'0'.repeat(59)}1`;
    expect(gridCount({ from: '0', to: `1.${'0'.repeat(59)}1`, step: tiny })).toBeGreaterThan(5001);
    expect(gridCount({ from: tiny, to: '2', step: '1' })).toBe(2);
    expect(gridCount({ from: '0', to: '2', step: `1.${'0'.repeat(59)}1` })).toBe(2);
  });

  test('has at most 5,001 points', () => {
    expect(accepts({ from: '0', to: '5', step: '0.001' })).toBe(true);
    expect(accepts({ from: '0', to: '5.001', step: '0.001' })).toBe(false);
  });
});

describe('a request', () => {
  const system = { fullyProtonatedCharge: 0, pKa: ['4.76'] };

  test('has 16 digits where none are asked for', () => {
    expect(fractionsRequest.parse({ system, pH: '7' })).toMatchObject({
      digits: 16,
      dryRun: false,
    });
  });

  test('asks for one system or several, never both or neither', () => {
    expect(fractionsRequest.safeParse({ pH: '7' }).success).toBe(false);
    expect(fractionsRequest.safeParse({ system, systems: [system], pH: '7' }).success).toBe(false);
  });

  test('may not carry a field of a later issue', () => {
    const later = { system: { ...system, thermo: [] }, pH: '7', conditions: { temperature: '37' } };
    expect(fractionsRequest.safeParse(later).success).toBe(false);
  });
});
