import fc from 'fast-check';
import { curveDigits, gridOf, rangeOf } from '../../../components/curves/curve-grid';
import { examples } from '../../../components/curves/examples';
import { costOf, limits } from '../../../shared/limits';
import { gridCount, pHGrid } from '../../../shared/ph';
import { systemInFull } from '../../../shared/system';

const constants = fc.array(fc.integer({ min: -5000, max: 7000 }), { minLength: 1, maxLength: 64 });

describe('the grid of a curve', () => {
  test('covers 0 to 14, and one unit beside an outlying constant', () => {
    expect(rangeOf(['2.148', '7.198', '12.35'])).toEqual([0, 14]);
    expect(rangeOf(['0.0', '10.37'])).toEqual([-1, 14]);
    expect(rangeOf(['13.5'])).toEqual([0, 15]);
    expect(rangeOf(['-50', '70'])).toEqual([-20, 40]);
  });

  test('has 701 points where nothing is unusual', () => {
    expect(gridOf(['7.198'])).toEqual({ from: '0', to: '14', step: '0.02' });
  });

  test('fits the contract, the public cost and about 700 points whatever the constants', () => {
    fc.assert(
      fc.property(constants, (hundredths) => {
        const pKa = hundredths.map((value) => (value / 100).toFixed(2));
        const grid = pHGrid.parse(gridOf(pKa));
        const points = gridCount(grid);
        expect(points).toBeLessThanOrEqual(701);
        expect(points).toBeGreaterThan(280);
        expect(costOf(points, pKa.length + 1, curveDigits)).toBeLessThanOrEqual(limits.publicCost);
      }),
    );
  });
});

describe('the examples', () => {
  test.each(examples)('$id fits the contract and names each of its forms', (example) => {
    const { system, formulas, source } = example;
    expect(systemInFull.safeParse(system).success).toBe(true);
    expect(formulas).toHaveLength(system.pKa.length + 1);
    expect(source).not.toBe('');
    const charges = formulas.map((formula) => {
      const [, count = '', sign] = /\^(\d*)([+-])$/.exec(formula) ?? [];
      return sign === undefined ? 0 : Number(`${sign}${count || 1}`);
    });
    expect(charges).toEqual(formulas.map((_, lost) => system.fullyProtonatedCharge - lost));
  });
});
