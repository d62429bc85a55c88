import fc from 'fast-check';
import {
  type AcidBaseSystem,
  bufferCapacityPoints,
  type BufferSolution,
  capacityMaxima,
  equilibrium,
  fractionPoints,
  isoelectricPoint,
  pHForFraction,
  waterExponents,
} from '../../server/chem';
import { digitCounts, systems } from './generators';
import { Far } from './mixture-oracle';
import { activityOf, concentrations, inertOf, mixtureOf, pKw } from './mixtures';
import { halfUnit } from './oracle';

const list = (...values: string[]) => ({ kind: 'list', values }) as const;
const ionicStrengths = fc.constantFrom('0', '0.01', '0.1');

/** Systems that can be prepared, in water. */
const solutions = fc
  .record({
    components: fc.array(
      fc.record({ system: systems(-2, 16, 4), concentration: concentrations(-6, 0) }),
      { minLength: 1, maxLength: 3 },
    ),
    I: ionicStrengths,
  })
  .map(({ components, I }): BufferSolution => ({
    components,
    water: waterExponents(pKw, activityOf('davies', I)),
  }));

const capacityAt = (solution: BufferSolution, pH: string, digits = 30) =>
  new Far(bufferCapacityPoints(solution, list(pH), digits)[0]?.total ?? NaN);

const moved = (pH: string, by: string) => new Far(pH).plus(by).toFixed();

describe('buffer capacity', () => {
  test('is positive, and the sum of its parts', () => {
    fc.assert(
      fc.property(
        solutions,
        fc.integer({ min: -2, max: 16 }),
        digitCounts,
        (solution, pH, digits) => {
          const [point] = bufferCapacityPoints(solution, list(`${pH}`), digits);
          const parts = [point?.water ?? '', ...(point?.components ?? [])];
          const sum = parts.reduce((all, each) => all.plus(each), new Far(0));
          const rounding = [point?.total ?? '', ...parts].reduce(
            (all, each) => all.plus(halfUnit(each, digits)),
            new Far(0),
          );
          expect(new Far(point?.total ?? NaN).greaterThan(0)).toBe(true);
          expect(
            sum
              .minus(point?.total ?? NaN)
              .abs()
              .lessThanOrEqualTo(rounding),
          ).toBe(true);
        },
      ),
      { numRuns: 200 },
    );
  });

  test('is the fall of the mean charge with pH, by a difference', () => {
    fc.assert(
      fc.property(
        systems(-2, 16, 4),
        fc.integer({ min: -200, max: 1600 }),
        (system, hundredths) => {
          const pH = (hundredths / 100).toFixed(2);
          const solution = {
            components: [{ system, concentration: '1' }],
            water: { hydrogen: '-400', hydroxide: '400' },
          };
          const at = (by: string) =>
            fractionPoints(system, list(moved(pH, by)), 60)[0]?.meanCharge ?? 'NaN';
          const fall = new Far(at('-1e-15')).minus(at('1e-15')).dividedBy('2e-15');
          // (ln 10)² h²/6 times a third derivative of at most n³, and 60 places over h.
          expect(fall.minus(capacityAt(solution, pH)).abs().lessThan('1e-26')).toBe(true);
        },
      ),
      { numRuns: 150 },
    );
  });

  test('is that of a mixture at its pH', () => {
    fc.assert(
      fc.property(
        concentrations(-4, 0),
        fc.integer({ min: 1, max: 250 }),
        ionicStrengths,
        (amount, percent, I) => {
          const pKa = ['2.148', '7.198', '12.35'];
          const base = new Far(amount).times(percent).dividedBy(100).toFixed();
          const activity = activityOf('davies', I);
          const acid = { charge: 0, pKa, reference: 0, amount, kind: 'mixed' } as const;
          const found = equilibrium(mixtureOf([acid], [inertOf(1, base)], activity));
          const answer = found.ok ? found.inDigits(45) : found;
          if (!answer.ok) throw new Error(answer.reason);
          const solution = {
            components: [{ system: { fullyProtonatedCharge: 0, pKa }, concentration: amount }],
            water: waterExponents(pKw, activity),
          };
          const capacity = capacityAt(solution, answer.numbers.pH);
          expect(
            capacity.dividedBy(answer.numbers.bufferCapacity).minus(1).abs().lessThan('1e-29'),
          ).toBe(true);
        },
      ),
      { numRuns: 60 },
    );
  });

  test('maxima are maxima, and between two of them lies less', () => {
    fc.assert(
      fc.property(solutions, (solution) => {
        const maxima = capacityMaxima(solution, 30);
        maxima.forEach(({ pH, total }, i) => {
          for (const by of ['1e-6', '-1e-6', '0.001', '-0.001']) {
            expect(capacityAt(solution, moved(pH, by), 40).lessThan(total)).toBe(true);
          }
          expect(
            capacityAt(solution, pH, 25).dividedBy(total).minus(1).abs().lessThan('1e-24'),
          ).toBe(true);
          const next = maxima[i + 1];
          if (next !== undefined) expect(Number(next.pH)).toBeGreaterThan(Number(pH));
        });
      }),
      { numRuns: 80 },
    );
  });

  test('no maximum is missed: every turn seen in steps of 0.02 pH has one beside it', () => {
    fc.assert(
      fc.property(solutions, (solution) => {
        const maxima = capacityMaxima(solution, 10).map(({ pH }) => Number(pH));
        const grid = { kind: 'grid', from: '-5', step: '0.02', count: 1250 } as const;
        const totals = bufferCapacityPoints(solution, grid, 12).map(({ pH, total }) => ({
          pH: Number(pH),
          total: Number(total),
        }));
        totals.slice(1, -1).forEach(({ pH, total }, i) => {
          const [before = NaN, after = NaN] = [totals[i]?.total, totals[i + 2]?.total];
          if (!(total > before && total > after)) return;
          expect(maxima.some((each) => Math.abs(each - pH) <= 0.02)).toBe(true);
        });
      }),
      { numRuns: 8 },
    );
  });

  test('a lone monoprotic system peaks at pK′, at c ln 10/4', () => {
    const solution = {
      components: [{ system: { fullyProtonatedCharge: 0, pKa: ['7'] }, concentration: '1' }],
      water: { hydrogen: '0', hydroxide: '14' },
    };
    const [peak, ...others] = capacityMaxima(solution, 30);
    expect(others).toEqual([]);
    expect(peak?.pH).toBe(`7.${'0'.repeat(29)}`);
    const expected = new Far(10).ln().times(new Far('0.25').plus('2e-7'));
    expect(peak?.total).toBe(expected.toPrecision(30));
  });

  // β of two equal systems, pK′ d apart, is level to third order where d = 2 lg(2 + √3) = 1.143895….
  test.each([
    ['7.1438', 1],
    ['7.1439', 2],
    ['7.14391', 2],
    ['7.144', 2],
    ['7.2', 2],
  ])('two equal systems with pK′ 6 and %s peak %i times', (other, peaks) => {
    const components = ['6', other].map((pKa) => ({
      system: { fullyProtonatedCharge: 0, pKa: [pKa] },
      concentration: '1',
    }));
    const maxima = capacityMaxima(
      { components, water: { hydrogen: '-200', hydroxide: '300' } },
      20,
    );
    expect(maxima).toHaveLength(peaks);
    const middle = new Far(other).plus(6);
    const ends = new Far(maxima[0]?.pH ?? NaN).plus(maxima.at(-1)?.pH ?? NaN);
    expect(ends.minus(middle).abs().lessThan('1e-18')).toBe(true);
  });
});

describe('isoelectric point', () => {
  test('has no net charge, falling; without one the charge keeps its sign', () => {
    fc.assert(
      fc.property(systems(-2, 16, 6), digitCounts, (system, digits) => {
        const answer = isoelectricPoint(system, digits);
        const highest = system.fullyProtonatedCharge;
        if (!answer.ok) {
          expect(highest <= 0 || highest >= system.pKa.length).toBe(true);
          return;
        }
        // The charge changes sign within the rounding of the pH.
        const half = halfUnit(answer.pH, digits);
        const charge = (pH: InstanceType<typeof Far>) => new Far(chargeAt(system, pH.toFixed()));
        expect(charge(new Far(answer.pH).minus(half)).greaterThanOrEqualTo(0)).toBe(true);
        expect(charge(new Far(answer.pH).plus(half)).lessThanOrEqualTo(0)).toBe(true);
        expect(Number(answer.slope)).toBeLessThanOrEqual(0);
      }),
      { numRuns: 200 },
    );
  });

  test('of a symmetric ampholyte lies in the middle of its constants', () => {
    for (const [low, high] of [
      ['2.35', '9.78'],
      ['-3', '3'],
      ['9.1', '2.35'],
    ] as const) {
      const middle = new Far(low).plus(high).dividedBy(2);
      const found = isoelectricPoint({ fullyProtonatedCharge: 1, pKa: [low, high] }, 20);
      expect(found.ok && new Far(found.pH).equals(middle)).toBe(true);
    }
  });
});

/** Charge at a pH of up to 100 places, without the limit on places that an answer has. */
function chargeAt(system: AcidBaseSystem, pH: string): string {
  const u = Far.pow(10, pH);
  let term = new Far(1);
  let [sum, weighted] = [new Far(1), new Far(system.fullyProtonatedCharge)];
  system.pKa.forEach((pKa, i) => {
    term = term.times(u).times(Far.pow(10, new Far(pKa).negated()));
    sum = sum.plus(term);
    weighted = weighted.plus(term.times(system.fullyProtonatedCharge - i - 1));
  });
  return weighted.dividedBy(sum).toString();
}

describe('pH for a fraction', () => {
  test('is inverted by the fraction at that pH', () => {
    const question = fc.record({
      system: systems(-2, 16, 5),
      species: fc.nat({ max: 5 }),
      thousandths: fc.integer({ min: 1, max: 999 }),
    });
    fc.assert(
      fc.property(question, ({ system, thousandths, ...asked }) => {
        const species = Math.min(asked.species, system.pKa.length);
        const fraction = (thousandths / 1000).toFixed(3);
        const answer = pHForFraction({ system, species, fraction, digits: 45 });
        const at = (pH: string) =>
          new Far(fractionPoints(system, list(pH), 50)[0]?.fractions[species] ?? NaN);
        if (!answer.ok) {
          // The most there is, to six digits and at a pH of three places.
          expect(Number(answer.most)).toBeLessThanOrEqual(Number(fraction));
          expect(Number(at(answer.pH)) / Number(answer.most)).toBeCloseTo(1, 3);
          return;
        }
        for (const { pH, side } of answer.solutions) {
          // A fraction changes by at most ln 10·n/4 … n² of what the pH does.
          if (side !== 'maximum') expect(at(pH).minus(fraction).abs().lessThan('1e-40')).toBe(true);
          const slope = at(moved(pH, '1e-10')).minus(at(moved(pH, '-1e-10')));
          if (side === 'rising') expect(slope.greaterThan(0)).toBe(true);
          if (side === 'falling') expect(slope.lessThan(0)).toBe(true);
        }
        expect(answer.solutions.length).toBe(
          species === 0 || species === system.pKa.length || answer.solutions[0]?.side === 'maximum'
            ? 1
            : 2,
        );
      }),
      { numRuns: 200 },
    );
  });

  test('a maximum that is exactly the fraction asked for is the one solution', () => {
    // Four equal constants: all five species weigh the same at pH = pK′, and each is 1/5.
    const system = { fullyProtonatedCharge: 0, pKa: ['7', '7', '7', '7'] };
    const question = { system, species: 2, digits: 20 };
    expect(pHForFraction({ ...question, fraction: '0.2' })).toEqual({
      ok: true,
      solutions: [{ pH: `7.${'0'.repeat(19)}`, side: 'maximum' }],
    });
    expect(pHForFraction({ ...question, fraction: `0.2${'0'.repeat(40)}1` })).toMatchObject({
      ok: false,
      most: '0.200000',
    });
    const below = pHForFraction({ ...question, fraction: `0.1${'9'.repeat(40)}` });
    expect(below).toMatchObject({ ok: true, solutions: [{ side: 'rising' }, { side: 'falling' }] });
  });

  test('the middle form of constants 2 apart reaches 5/6 at most', () => {
    // 1/(1 + 2·10^−1), halfway between the constants.
    const system = { fullyProtonatedCharge: 0, pKa: ['6', '8'] };
    expect(pHForFraction({ system, species: 1, fraction: '0.9', digits: 6 })).toEqual({
      ok: false,
      most: '0.833333',
      pH: '7.000',
    });
  });
});
