import { parseFormula, spokenFormula } from '../../../components/ui/formula-parts';

const written = (formula: string) =>
  parseFormula(formula)
    .map(({ text, place }) => (place === 'base' ? text : `${place}(${text})`))
    .join(' ');

test.each([
  ['H3PO4', 'H sub(3) PO sub(4)'],
  ['HPO4^2-', 'HPO sub(4) sup(2\u2212)'],
  ['H2Gly^+', 'H sub(2) Gly sup(+)'],
  ['H6Y^2+', 'H sub(6) Y sup(2+)'],
  ['2H2O', '2H sub(2) O'],
  ['B(OH)4^-', 'B(OH) sub(4) sup(\u2212)'],
  ['[Fe(CN)6]2^3-', '[Fe(CN) sub(6) ] sub(2) sup(3\u2212)'],
  ['C10H16', 'C sub(10) H sub(16)'],
])('%s has its indices below and its charge above', (formula, expected) => {
  expect(written(formula)).toBe(expected);
});

test('an empty formula has no parts', () => {
  expect(parseFormula('')).toEqual([]);
});

test.each([
  ['HPO4^2-', 'H P O4, charge minus 2'],
  ['PO4^3-', 'P O4, charge minus 3'],
  ['NH4^+', 'N H4, charge plus 1'],
  ['CH3COOH', 'C H3 C O O H'],
  ['Ca(OH)2', 'Ca (O H)2'],
])('%s is said atom by atom, the charge in words', (formula, said) => {
  expect(spokenFormula(formula)).toBe(said);
});
