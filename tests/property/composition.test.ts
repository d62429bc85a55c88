import fc from 'fast-check';
import { fractionPoints } from '../../server/chem';
import { decimalWithin, digitCounts, largeSystems, pHWithin, systems } from './generators';
import { halfUnit, sumOf, Wide } from './oracle';

const list = (...values: string[]) => ({ kind: 'list', values }) as const;
const anySystem = fc.oneof(
  { weight: 9, arbitrary: systems() },
  { weight: 1, arbitrary: largeSystems },
);

describe('composition', () => {
  test('Σα = 1 within the rounding of its parts', () => {
    fc.assert(
      fc.property(anySystem, pHWithin(), digitCounts, (system, pH, digits) => {
        const fractions = fractionPoints(system, list(pH), digits)[0]?.fractions ?? [];
        expect(fractions).toHaveLength(system.pKa.length + 1);
        const off = sumOf(fractions.map((each) => new Wide(each))).minus(1);
        const allowed = sumOf(fractions.map((each) => halfUnit(each, digits)));
        expect(off.abs().lessThanOrEqualTo(allowed)).toBe(true);
      }),
      { numRuns: 800 },
    );
  });

  test('the mean charge is Σ z α within the rounding of its parts', () => {
    fc.assert(
      fc.property(anySystem, pHWithin(), digitCounts, (system, pH, digits) => {
        const [point] = fractionPoints(system, list(pH), digits);
        const fractions = point?.fractions ?? [];
        const charge = (lost: number) => system.fullyProtonatedCharge - lost;
        const sum = sumOf(fractions.map((each, lost) => new Wide(each).times(charge(lost))));
        const allowed = sumOf(
          fractions.map((each, lost) => halfUnit(each, digits).times(charge(lost)).abs()),
        ).plus(`5e${-digits - 1}`);
        expect(
          sum
            .minus(point?.meanCharge ?? NaN)
            .abs()
            .lessThanOrEqualTo(allowed),
        ).toBe(true);
      }),
      { numRuns: 800 },
    );
  });

  test('a neighbour ratio is the quotient of the fractions within their rounding', () => {
    fc.assert(
      fc.property(anySystem, pHWithin(), digitCounts, (system, pH, digits) => {
        const [point] = fractionPoints(system, list(pH), digits);
        const ends = (written = 'NaN') => {
          const [value, half] = [new Wide(written), halfUnit(written, digits)];
          return [value.minus(half), value.plus(half)] as const;
        };
        point?.neighbourRatios.forEach((ratio, i) => {
          const [lowBase, highBase] = ends(point.fractions[i + 1]);
          const [lowAcid, highAcid] = ends(point.fractions[i]);
          const [lowRatio, highRatio] = ends(ratio);
          expect(lowRatio.times(lowAcid).lessThanOrEqualTo(highBase)).toBe(true);
          expect(highRatio.times(highAcid).greaterThanOrEqualTo(lowBase)).toBe(true);
        });
      }),
      { numRuns: 800 },
    );
  });

  test('the mean charge never rises with pH', () => {
    fc.assert(
      fc.property(
        anySystem,
        fc.array(pHWithin(), { minLength: 2, maxLength: 6 }),
        digitCounts,
        (system, values, digits) => {
          const rising = values.toSorted((a, b) => new Wide(a).comparedTo(b));
          const charges = fractionPoints(system, list(...rising), digits).map(
            (point) => new Wide(point.meanCharge),
          );
          charges.forEach((charge, i) => {
            expect(charge.lessThanOrEqualTo(charges[i - 1] ?? Infinity)).toBe(true);
          });
        },
      ),
      { numRuns: 500 },
    );
  });

  test('a shift of pH and of every constant changes nothing', () => {
    const shifted = (value: string, by: string) => new Wide(value).plus(by).toFixed();
    fc.assert(
      fc.property(
        systems(-40, 60),
        pHWithin(-10, 30),
        decimalWithin(-10, 10),
        digitCounts,
        (system, pH, by, digits) => {
          const moved = { ...system, pKa: system.pKa.map((each) => shifted(each, by)) };
          const [here] = fractionPoints(system, list(pH), digits);
          const [there] = fractionPoints(moved, list(shifted(pH, by)), digits);
          expect({ ...there, pH }).toEqual(here);
        },
      ),
      { numRuns: 800 },
    );
  });

  test('a grid is the list of its points, byte for byte', () => {
    const step = fc.constantFrom('0.01', '0.05', '0.125', '0.3333333333', '1e-30', '0.0010');
    fc.assert(
      fc.property(
        systems(-10, 20, 4),
        pHWithin(-20, 0),
        step,
        fc.integer({ min: 1, max: 80 }),
        digitCounts,
        (system, from, by, count, digits) => {
          const grid = fractionPoints(system, { kind: 'grid', from, step: by, count }, digits);
          const values = grid.map((point) => point.pH);
          expect(fractionPoints(system, list(...values), digits)).toEqual(grid);
        },
      ),
      { numRuns: 150 },
    );
  });
});
