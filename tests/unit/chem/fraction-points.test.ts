import { fractionPoints, fractionRows } from '../../../server/chem';

const phosphoric = { fullyProtonatedCharge: 0, pKa: ['2.148', '7.198', '12.35'] };
const acid = (...pKa: string[]) => ({ fullyProtonatedCharge: 0, pKa });
const list = (...values: string[]) => ({ kind: 'list', values }) as const;

describe('fraction points', () => {
  test('phosphoric acid at pH 7.4', () => {
    expect(fractionPoints(phosphoric, list('7.40'), 4)).toEqual([
      {
        pH: '7.40',
        fractions: ['0.000002159', '0.3858', '0.6142', '0.000006892'],
        neighbourRatios: ['1.786e+5', '1.592', '0.00001122'],
        meanCharge: '-1.6142',
        predominant: 2,
      },
    ]);
  });

  test('a list is answered in its order, a repeated pH alike', () => {
    const points = fractionPoints(phosphoric, list('9', '2', '9.0'), 3);
    expect(points.map(({ pH }) => pH)).toEqual(['9', '2', '9.0']);
    expect(points[2]?.fractions).toEqual(points[0]?.fractions);
    expect(points[1]?.fractions).not.toEqual(points[0]?.fractions);
  });

  test('fractions alone are the fractions of the points', () => {
    const grid = { kind: 'grid', from: '0', step: '0.25', count: 57 } as const;
    const points = fractionPoints(phosphoric, grid, 20);
    expect(fractionRows(phosphoric, grid, 20)).toEqual(points.map(({ fractions }) => fractions));
  });

  test('three equal constants at their pH make four quarters', () => {
    const [point] = fractionPoints(acid('7', '7', '7'), list('7'), 5);
    expect(point?.fractions).toEqual(Array(4).fill('0.25000'));
    expect(point?.meanCharge).toBe('-1.50000');
    expect(point?.predominant).toBe(0);
  });

  test('constants 20 units apart: the ampholyte is all there is between them', () => {
    const [point] = fractionPoints(acid('-5', '15'), list('5'), 3);
    expect(point?.fractions).toEqual(['1.00e-10', '1.00', '1.00e-10']);
    expect(point?.meanCharge).toBe('-1.000');
  });

  test('inverted constants: the form between is never the largest', () => {
    const [point] = fractionPoints(acid('9', '4'), list('6.5'), 4);
    expect(point?.fractions).toEqual(['0.4992', '0.001579', '0.4992']);
    expect(point?.predominant).toBe(0);
  });

  test('from pH −20 to 40 with constants from −50 to 70', () => {
    const [low, high] = fractionPoints(acid('-50', '70'), list('-20', '40'), 60);
    const one = `1.${'0'.repeat(59)}`;
    expect(low?.neighbourRatios).toEqual([`1${'0'.repeat(30)}.${'0'.repeat(29)}`, `${one}e-90`]);
    expect(high?.neighbourRatios).toEqual([`${one}e+90`, `${one}e-30`]);
    // 1/(1 + 10⁻³⁰ + 10⁻⁹⁰) = 1 − 10⁻³⁰ + 10⁻⁶⁰ − …
    expect(low?.fractions[1]).toBe(`0.${'9'.repeat(30)}${'0'.repeat(29)}1`);
  });

  test('a fraction of 10⁻³⁰⁰ and far rarer has all its digits', () => {
    const [point] = fractionPoints(acid(...Array<string>(10).fill('-20.5')), list('10'), 5);
    expect(point?.fractions[0]).toBe('1.0000e-305');
    const [rarest] = fractionPoints(acid(...Array<string>(64).fill('70')), list('-20'), 3);
    expect(rarest?.fractions.at(-1)).toBe('1.00e-5760');
    expect(rarest?.meanCharge).toBe('0.000');
  });

  test('a zero charge has no sign, however it is approached', () => {
    const glycine = { fullyProtonatedCharge: 1, pKa: ['2.35', '9.78'] };
    const points = fractionPoints(glycine, list('6.065', '6.0650001'), 3);
    expect(points.map(({ meanCharge }) => meanCharge)).toEqual(['0.000', '0.000']);
  });

  test('a grid of 5,001 points is counted exactly to its end', () => {
    const rows = fractionPoints(
      phosphoric,
      { kind: 'grid', from: '-20', step: '0.012', count: 5001 },
      2,
    );
    expect(rows).toHaveLength(5001);
    expect(rows[0]?.pH).toBe('-20.000');
    expect(rows.at(-1)?.pH).toBe('40.000');
    expect(rows.at(-1)).toEqual(fractionPoints(phosphoric, list('40.000'), 2)[0]);
  });

  test('written forms of one value are one value', () => {
    const plain = fractionPoints(acid('0.001', '7.1', '0'), list('7'), 30)[0];
    const other = fractionPoints(acid('1e-3', '7.10', '-0'), list('7'), 30)[0];
    expect(other).toEqual(plain);
  });
});
