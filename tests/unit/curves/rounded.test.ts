import {
  shownCharge,
  shownConstant,
  shownFraction,
  shownRatio,
} from '../../../components/curves/rounded';
import { formulasOf, genericFormulas } from '../../../components/curves/species-formulas';

describe('numbers as they are read', () => {
  test.each([
    ['0.6142230366163610', '0.614'],
    ['0.9999999', '1.000'],
    ['1', '1.000'],
    ['0.001', '0.001'],
    ['0.00099949', '1.0e-3'],
    ['0.000002159365213354769', '2.2e-6'],
    ['1.5e-300', '1.5e-300'],
    ['0', '0.000'],
  ])('fraction %s as %s', (fraction, shown) => expect(shownFraction(fraction)).toBe(shown));

  test.each([
    ['-1.6142346', '-1.61'],
    ['-0.0000001', '0.00'],
    ['2.0000', '2.00'],
  ])('charge %s as %s', (charge, shown) => expect(shownCharge(charge)).toBe(shown));

  test('ratios have three digits', () => {
    expect(shownRatio('1.592208727')).toBe('1.59');
    expect(shownRatio('34.58')).toBe('34.6');
    expect(shownRatio('2511.886')).toBe('2.51e+3');
    expect(shownRatio('178648.7')).toBe('1.79e+5');
    expect(shownRatio('0.00001122')).toBe('1.12e-5');
  });

  test('a constant is shown as given where that is short, else to three decimals', () => {
    expect(shownConstant('12.35')).toBe('12.35');
    expect(shownConstant('2.00')).toBe('2.00');
    expect(shownConstant('7.1982')).toBe('7.198');
    expect(shownConstant('7.2e0')).toBe('7.200');
  });
});

describe('formulas of a typed system', () => {
  test('HₙA to A with each charge', () => {
    expect(genericFormulas({ fullyProtonatedCharge: 0, pKa: ['1', '2', '3'] })).toEqual([
      'H3A',
      'H2A^-',
      'HA^2-',
      'A^3-',
    ]);
    expect(genericFormulas({ fullyProtonatedCharge: 1, pKa: ['2', '9'] })).toEqual([
      'H2A^+',
      'HA',
      'A^-',
    ]);
    expect(genericFormulas({ fullyProtonatedCharge: 2, pKa: ['2'] })).toEqual(['HA^2+', 'A^+']);
  });

  test('stand in where the formula of any form is not known', () => {
    const system = { fullyProtonatedCharge: 0, pKa: ['9.4'] };
    const form = (index: number, formula: string | null) => ({
      index,
      charge: -index,
      protonsLost: index,
      formula,
    });
    expect(formulasOf([form(0, 'C20H14O4'), form(1, null)], system)).toEqual(['HA', 'A^-']);
    expect(formulasOf([form(0, 'HF'), form(1, 'F^-')], system)).toEqual(['HF', 'F^-']);
  });
});
