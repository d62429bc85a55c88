import fc from 'fast-check';
import { type FractionPoint, fractionPoints } from '../../server/chem';
import { digitCounts, largeSystems, pHWithin, systems } from './generators';
import { halfUnit, recomputed, Wide } from './oracle';

const list = (...values: string[]) => ({ kind: 'list', values }) as const;
const significant = (point: FractionPoint | undefined) => [
  ...(point?.fractions ?? []),
  ...(point?.neighbourRatios ?? []),
];

describe('digits', () => {
  test('every digit is that of the relations written out with 260 digits', () => {
    fc.assert(
      fc.property(systems(), pHWithin(), digitCounts, (system, pH, digits) => {
        expect(fractionPoints(system, list(pH), digits)).toEqual([recomputed(system, pH, digits)]);
      }),
      { numRuns: 400 },
    );
  });

  test('every digit is, along grids too', () => {
    const step = fc.constantFrom('0.01', '0.05', '0.3', '0.123456789', '1');
    fc.assert(
      fc.property(
        systems(-10, 20, 3),
        pHWithin(-20, 0),
        step,
        digitCounts,
        (system, from, by, digits) => {
          const count = 36;
          const points = fractionPoints(system, { kind: 'grid', from, step: by, count }, digits);
          expect(points).toHaveLength(count);
          for (const i of [1, 31, 35]) {
            const pH = new Wide(by).times(i).plus(from);
            expect(new Wide(points[i]?.pH ?? NaN).equals(pH)).toBe(true);
            const expected = recomputed(system, pH.toFixed(), digits);
            expect({ ...points[i], pH: expected.pH }).toEqual(expected);
          }
        },
      ),
      { numRuns: 40 },
    );
  });

  test('every digit is, for 64 protons too', () => {
    fc.assert(
      fc.property(largeSystems, pHWithin(), digitCounts, (system, pH, digits) => {
        expect(fractionPoints(system, list(pH), digits)).toEqual([recomputed(system, pH, digits)]);
      }),
      { numRuns: 8 },
    );
  });

  test('|d(n) − d(n + 10)| is at most half a unit in place n, for every number', () => {
    const digits = fc.oneof(fc.constantFrom(1, 50), fc.integer({ min: 1, max: 50 }));
    fc.assert(
      fc.property(systems(), pHWithin(), digits, (system, pH, n) => {
        const [few] = fractionPoints(system, list(pH), n);
        const [more] = fractionPoints(system, list(pH), n + 10);
        const finer = significant(more);
        significant(few).forEach((written, i) => {
          const difference = new Wide(written).minus(finer[i] ?? NaN).abs();
          expect(difference.lessThanOrEqualTo(halfUnit(written, n))).toBe(true);
        });
        const charges = new Wide(few?.meanCharge ?? NaN).minus(more?.meanCharge ?? NaN).abs();
        expect(charges.lessThanOrEqualTo(`5e${-n - 1}`)).toBe(true);
        expect(more?.predominant).toBe(few?.predominant);
      }),
      { numRuns: 1500 },
    );
  });

  test('exactly so many digits are written', () => {
    fc.assert(
      fc.property(systems(), pHWithin(), digitCounts, (system, pH, digits) => {
        const [point] = fractionPoints(system, list(pH), digits);
        for (const written of significant(point)) {
          const coefficient = written.split('e')[0]?.replace('.', '').replace(/^0+/, '');
          expect(coefficient).toHaveLength(digits);
          const { e } = new Wide(written);
          expect(written.includes('e')).toBe(e < -6 || e >= digits);
        }
        expect(point?.meanCharge).toMatch(new RegExp(`^-?\\d+\\.\\d{${digits}}$`));
        expect(point?.meanCharge).not.toMatch(/^-[0.]*$/);
      }),
      { numRuns: 500 },
    );
  });
});
