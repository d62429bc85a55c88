import { fractionPoints } from '../../server/chem';
import facts from './data/trade-facts.json';

/** Common practice of the trade, and arithmetic; no publication is claimed for these. */
const at = (pKa: string, pH: string, digits: number, fullyProtonatedCharge = 0) => {
  const [point] = fractionPoints(
    { fullyProtonatedCharge, pKa: [pKa] },
    { kind: 'list', values: [pH] },
    digits,
  );
  if (point === undefined) throw new Error('No point was answered.');
  return point;
};

describe('common practice', () => {
  test('fractions(pH = pKa) are equal', () => {
    expect(at('4.76', '4.76', 6).fractions).toEqual(['0.500000', '0.500000']);
    expect(at('4.76', '4.76', 6).neighbourRatios).toEqual(['1.00000']);
  });

  test('each pH unit changes the ratio by a factor of ten', () => {
    const ratios = ['3.76', '4.76', '5.76', '6.76'].map((pH) => at('4.76', pH, 3).neighbourRatios);
    expect(ratios.flat()).toEqual(['0.100', '1.00', '10.0', '100']);
  });

  test('two units above pKa the base outnumbers the acid 100:1, two below the acid the base', () => {
    expect(at('4.76', '6.76', 4).neighbourRatios).toEqual(['100.0']);
    expect(at('4.76', '2.76', 4).neighbourRatios).toEqual(['0.01000']);
  });

  test.each((facts.rows[0]?.exact ?? []).map(([units, fraction]) => [units, fraction] as const))(
    '%d pH units above pKa the base is %d of the whole (arithmetic, six places)',
    (units = NaN, fraction = NaN) => {
      const { fractions } = at('7', String(7 + units), 6);
      expect(fractions[1]).toBe(String(fraction));
      expect(at('7', String(7 - units), 6).fractions[0]).toBe(String(fraction));
    },
  );

  test('a carboxylic acid of pKa 4.76 is mostly base at pH 5.5, 5.50:1', () => {
    const point = at('4.76', '5.5', 3);
    expect(point.neighbourRatios).toEqual(['5.50']);
    expect(point.predominant).toBe(1);
  });

  test('a protonated amine of pKa 11 is above 99.999 % acid at pH 5.5', () => {
    const point = at('11', '5.5', 10, 1);
    expect(Number(point.fractions[0])).toBeGreaterThan(0.99999);
    expect(point.predominant).toBe(0);
  });
});
