import { numberParts, spokenNumber, withMinus } from '../../../components/ui/number';

const minus = '\u2212';

test.each([
  ['0.614', { significand: '0.614' }],
  ['-1.61', { significand: `${minus}1.61` }],
  ['0.614(5)', { significand: '0.614(5)' }],
  ['2.16(6)e-6', { significand: '2.16(6)', exponent: `${minus}6` }],
  ['1.5E+300', { significand: '1.5', exponent: '300' }],
  ['-1e-07', { significand: `${minus}1`, exponent: `${minus}7` }],
])('%s is set with a true minus and its exponent apart', (text, parts) => {
  expect(numberParts(text)).toEqual(parts);
});

test.each(['lims-nightly', '2026-12-01', 'HPO4^2-', '', '-', '1.2.3', '5.', '.5', '1e', 'NaN'])(
  '“%s” is no number and keeps its hyphens',
  (text) => {
    expect(numberParts(text)).toBeUndefined();
  },
);

test('only a hyphen that leads a number becomes a minus', () => {
  expect(withMinus('-3')).toBe(`${minus}3`);
  expect(withMinus('pre-3')).toBe('pre-3');
  expect(withMinus('-x')).toBe('-x');
});

test('a number is said with its sign and its power in words', () => {
  const said = (text: string) => spokenNumber(numberParts(text) ?? { significand: '' });
  expect(said('-1.61')).toBe('minus 1.61');
  expect(said('2.16e-6')).toBe('2.16 times 10 to the power minus 6');
});
