import fc from 'fast-check';
import { fractionPoints, predominanceRanges } from '../../server/chem';
import { digitCounts, largeSystems, pHWithin, systems } from './generators';
import { exponents, Wide } from './oracle';

const list = (...values: string[]) => ({ kind: 'list', values }) as const;
const anySystem = fc.oneof(
  { weight: 9, arbitrary: systems() },
  { weight: 1, arbitrary: largeSystems },
);

describe('predominance', () => {
  test('the predominant species has the largest fraction, the lowest index among equals', () => {
    fc.assert(
      fc.property(anySystem, pHWithin(), digitCounts, (system, pH, digits) => {
        const [point] = fractionPoints(system, list(pH), digits);
        const largest = new Wide(point?.fractions[point.predominant] ?? NaN);
        for (const fraction of point?.fractions ?? []) {
          expect(largest.greaterThanOrEqualTo(fraction)).toBe(true);
        }
        const powers = exponents(system, pH);
        const top = Wide.max(...powers);
        expect(point?.predominant).toBe(powers.findIndex((power) => power.equals(top)));
      }),
      { numRuns: 1000 },
    );
  });

  test('ranges follow one another without a gap, from unbounded to unbounded', () => {
    fc.assert(
      fc.property(anySystem, digitCounts, (system, digits) => {
        const ranges = predominanceRanges(system, digits);
        expect(ranges[0]).toMatchObject({ species: 0, from: null });
        expect(ranges.at(-1)).toMatchObject({ species: system.pKa.length, to: null });
        ranges.slice(1).forEach((range, i) => {
          expect(range.from).toBe(ranges[i]?.to);
          expect(range.species).toBeGreaterThan(ranges[i]?.species ?? Infinity);
        });
      }),
      { numRuns: 500 },
    );
  });

  test('inside its range a species predominates', () => {
    fc.assert(
      fc.property(anySystem, (system) => {
        for (const { species, from, to } of predominanceRanges(system, 60)) {
          const low = new Wide(from ?? new Wide(to ?? 0).minus(1));
          const high = new Wide(to ?? low.plus(1));
          const middle = low.plus(high).dividedBy(2).toDecimalPlaces(60);
          if (!middle.greaterThan(low) || !middle.lessThan(high)) continue;
          const [point] = fractionPoints(system, list(middle.toFixed()), 1);
          expect(point?.predominant).toBe(species);
        }
      }),
      { numRuns: 500 },
    );
  });

  test('at the end of a range the species on both sides are equal, none larger', () => {
    fc.assert(
      fc.property(systems(), (system) => {
        const ranges = predominanceRanges(system, 60);
        ranges.slice(1).forEach(({ species, from }, i) => {
          const below = ranges[i]?.species ?? NaN;
          const sum = system.pKa
            .slice(below, species)
            .reduce((s, each) => s.plus(each), new Wide(0));
          const boundary = sum.dividedBy(species - below);
          expect(boundary.toPrecision(60)).toBe(new Wide(from ?? NaN).toPrecision(60));
          const powers = exponents(system, boundary.toFixed());
          const top = powers[below] ?? new Wide(NaN);
          const slack = '1e-150';
          expect(
            top
              .minus(powers[species] ?? NaN)
              .abs()
              .lessThan(slack),
          ).toBe(true);
          for (const power of powers) expect(power.minus(top).lessThan(slack)).toBe(true);
        });
      }),
      { numRuns: 500 },
    );
  });
});
