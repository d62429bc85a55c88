import { alongPoints } from '../../../server/chem/forms/along-points';
import { Exact } from '../../../server/chem/decimals/contexts';
import type { PHPoints } from '../../../server/chem/forms/ph-points';
import { anchorEvery, planFor } from '../../../server/chem/forms/plan';
import {
  fractionQuantities,
  meanChargeQuantity,
  ratioQuantities,
} from '../../../server/chem/forms/quantities';
import { unitExponent } from '../../../server/chem/decimals/rounding';
import type { AcidBaseSystem } from '../../../server/chem';

const sixty = (i: number) =>
  `${i}.${'314159265358979323846264338327950288419716939937510582097494'}`;
const cases: [string, AcidBaseSystem, PHPoints][] = [
  [
    'a triprotic grid',
    { fullyProtonatedCharge: 0, pKa: ['2.148', '7.198', '12.35'] },
    { kind: 'grid', from: '0', step: '0.01', count: anchorEvery },
  ],
  [
    'sixty decimals',
    { fullyProtonatedCharge: 4, pKa: [1, 3, 5, 9].map(sixty) },
    { kind: 'grid', from: sixty(1), step: `0.${'7'.repeat(60)}`, count: 12 },
  ],
  [
    '64 protons',
    { fullyProtonatedCharge: 100, pKa: Array.from({ length: 64 }, (_, i) => `${i % 15}.37`) },
    { kind: 'grid', from: '-20', step: '1.9', count: anchorEvery },
  ],
  [
    'a list',
    { fullyProtonatedCharge: -2, pKa: ['-50', '70', '7.25'] },
    { kind: 'list', values: ['-20', '40', sixty(7), '7'] },
  ],
];

describe('the error bound', () => {
  test.each(cases)('holds against four times the precision: %s', (_, system, points) => {
    const digits = 16;
    const plan = planFor(system, points, digits);
    const quantities = [
      ...fractionQuantities(system, digits),
      ...ratioQuantities(system, digits),
      meanChargeQuantity(system, digits),
    ];
    const units = alongPoints(system, points, plan, ({ at }) =>
      quantities.map(({ of, kept }) => {
        const [value, finer] = [of(at(0)), of(at(2))];
        const unit = `1e${plan.loss - at(0).precision + unitExponent(value, kept(value))}`;
        return new Exact(value).minus(finer).abs().minus(unit).isPositive();
      }),
    );
    expect(units.flat().filter((beyond) => beyond)).toEqual([]);
    expect(units.flat().length).toBeGreaterThan(20);
  });

  test('what is planned leaves five digits clear of the rounding place', () => {
    for (const [, system, points] of cases) {
      for (const digits of [1, 60]) {
        const { loss, precision } = planFor(system, points, digits);
        expect(precision - loss).toBe(5);
        expect(loss).toBeGreaterThan(digits);
        expect(loss).toBeLessThan(digits + 11);
      }
    }
  });
});
