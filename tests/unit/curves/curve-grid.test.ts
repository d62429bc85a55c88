import fc from 'fast-check';
import { curveDigits, gridOf, rangeOf } from '../../../components/curves/curve-grid';
import { costOf, limits } from '../../../shared/limits';
import { gridCount, pHGrid } from '../../../shared/ph';

const constants = fc.array(fc.integer({ min: -5000, max: 7000 }), { minLength: 1, maxLength: 64 });

describe('the grid of a curve', () => {
  test('covers 0 to 14, and one unit beside an outlying constant', () => {
    expect(rangeOf(['2.148', '7.198', '12.35'])).toEqual([0, 14]);
    expect(rangeOf(['0.0', '10.37'])).toEqual([-1, 14]);
    expect(rangeOf(['13.5'])).toEqual([0, 15]);
    expect(rangeOf(['-50', '70'])).toEqual([-20, 40]);
  });

  test('is from 0 to 14 for a stored system, whose constants are not known yet', () => {
    expect(gridOf([])).toEqual({ from: '0', to: '14', step: '0.02' });
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
