import fc from 'fast-check';
import { type Balance, type BalanceNumbers, equilibrium, ionsOf } from '../../server/chem';
import { digitCounts } from './generators';
import { chargeOf, Far, solvedAt, solvedNear, strengthOf } from './mixture-oracle';
import {
  activityOf,
  concentrations,
  inertOf,
  ionicStrengths,
  mixtureOf,
  plainModels,
  weighedAcids,
} from './mixtures';
import { halfUnit } from './oracle';

const furtherIons = fc.array(
  fc
    .tuple(fc.constantFrom(1, -1, 1, -1, 2, -2), concentrations(-4, 0))
    .map(([charge, amount]) => inertOf(charge, amount)),
  { maxLength: 3 },
);

/** Mixtures at a given ionic strength, or at their own. */
const mixtures = (strengths: fc.Arbitrary<string | 'self-consistent'>) =>
  fc
    .record({
      acids: fc.array(weighedAcids(), { maxLength: 4 }),
      further: furtherIons,
      model: plainModels,
      ionicStrength: strengths,
    })
    .map(({ acids, further, model, ionicStrength }) =>
      mixtureOf(acids, further, activityOf(model, ionicStrength)),
    );

const given = mixtures(ionicStrengths);
const own = mixtures(fc.constant('self-consistent'));
const anyMixture = fc.oneof({ weight: 3, arbitrary: given }, { weight: 1, arbitrary: own });

/** The numbers of an answer. Only the limiting law ever has none. */
function numbersOf(balance: Balance, digits: number): BalanceNumbers {
  const found = equilibrium(balance);
  if (!found.ok) fc.pre(balance.activity.model !== 'debye-huckel');
  const answer = found.ok ? found.inDigits(digits) : found;
  if (!answer.ok) throw new Error(answer.reason);
  return answer.numbers;
}

/** Concentrations in the order of `ionsOf`. */
const concentrationsOf = ({ hydrogen, hydroxide, acids, inert }: BalanceNumbers) => [
  hydrogen,
  hydroxide,
  ...acids.flatMap(({ species }) => species.map(({ concentration }) => concentration)),
  ...inert.map(({ concentration }) => concentration),
];

/** Every number of an answer that has `digits` significant digits, in one order. */
const allNumbers = (numbers: BalanceNumbers): string[] => [
  numbers.pH,
  numbers.pHOfConcentration,
  ...concentrationsOf(numbers),
  numbers.hydrogenActivityCoefficient,
  numbers.hydroxideActivityCoefficient,
  numbers.ionicStrengthUsed,
  numbers.ionicStrengthOfComposition,
  numbers.bufferCapacity,
  ...numbers.acids.flatMap(({ total, species }) => [
    total,
    ...species.flatMap(({ fraction, activityCoefficient }) => [fraction, activityCoefficient]),
  ]),
  ...numbers.inert.map(({ activityCoefficient }) => activityCoefficient),
];

const sumOf = (values: readonly InstanceType<typeof Far>[]) =>
  values.reduce((sum, each) => sum.plus(each), new Far(0));

describe('equilibrium of a mixture', () => {
  test('every digit is that of a bisection with 120 digits, at a given ionic strength', () => {
    fc.assert(
      fc.property(given, digitCounts, (balance, digits) => {
        const numbers = numbersOf(balance, digits);
        const {
          u,
          concentrations: exact,
          ionicStrength,
        } = solvedAt(balance, new Far(balance.activity.ionicStrength));
        expect(numbers.pH).toBe(u.log(10).toPrecision(digits));
        expect(concentrationsOf(numbers)).toEqual(exact.map((each) => each.toPrecision(digits)));
        expect(numbers.ionicStrengthOfComposition).toBe(ionicStrength.toPrecision(digits));
      }),
      { numRuns: 100 },
    );
  });

  test('every digit is, at the ionic strength of the composition itself', () => {
    fc.assert(
      fc.property(own, digitCounts, (balance, digits) => {
        fc.pre(balance.activity.model !== 'ideal');
        const numbers = numbersOf(balance, digits);
        const exact = solvedNear(balance, numbersOf(balance, 20).ionicStrengthUsed);
        expect(numbers.pH).toBe(exact.u.log(10).toPrecision(digits));
        expect(numbers.ionicStrengthUsed).toBe(exact.I.toPrecision(digits));
        expect(concentrationsOf(numbers)).toEqual(
          exact.concentrations.map((each) => each.toPrecision(digits)),
        );
      }),
      { numRuns: 12 },
    );
  });

  test('printed concentrations balance in charge and mass and add up to the ionic strength', () => {
    const digits = 50;
    fc.assert(
      fc.property(anyMixture, (balance) => {
        const numbers = numbersOf(balance, digits);
        const printed = concentrationsOf(numbers).map((each) => new Far(each));
        const charges = ionsOf(balance).map(({ charge }) => charge);
        const rounding = sumOf(
          concentrationsOf(numbers).map((each, i) =>
            halfUnit(each, digits).times(Math.abs(charges[i] ?? 0)),
          ),
        );
        expect(chargeOf(balance, printed).abs().lessThanOrEqualTo(rounding)).toBe(true);

        const strength = new Far(numbers.ionicStrengthOfComposition);
        expect(
          strengthOf(balance, printed).minus(strength).abs().lessThan(strength.times('1e-47')),
        ).toBe(true);

        numbers.acids.forEach(({ total, species }, k) => {
          expect(new Far(total).equals(balance.acids[k]?.amount ?? NaN)).toBe(true);
          const parts = sumOf(species.map(({ concentration }) => new Far(concentration)));
          expect(parts.minus(total).abs().lessThanOrEqualTo(new Far(total).times('1e-48'))).toBe(
            true,
          );
          const one = sumOf(species.map(({ fraction }) => new Far(fraction)));
          expect(one.minus(1).abs().lessThan('1e-48')).toBe(true);
        });
      }),
      { numRuns: 120 },
    );
  });

  test('a(H⁺) is γ[H⁺] is 10^−pH, and a(H⁺)a(OH⁻) is Kw', () => {
    const digits = 40;
    fc.assert(
      fc.property(anyMixture, (balance) => {
        const numbers = numbersOf(balance, digits);
        const hydrogen = new Far(numbers.hydrogen).times(numbers.hydrogenActivityCoefficient);
        const hydroxide = new Far(numbers.hydroxide).times(numbers.hydroxideActivityCoefficient);
        // A pH of 40 digits near 10 fixes 10^−pH to 38.
        const off = (value: InstanceType<typeof Far>, exponent: string) =>
          value.times(Far.pow(10, exponent)).minus(1).abs();
        expect(off(hydrogen, numbers.pH).lessThan('1e-36')).toBe(true);
        expect(off(new Far(numbers.hydrogen), numbers.pHOfConcentration).lessThan('1e-36')).toBe(
          true,
        );
        expect(off(hydrogen.times(hydroxide), balance.pKw ?? 'NaN').lessThan('1e-37')).toBe(true);
      }),
      { numRuns: 150 },
    );
  });

  test('|d(n) − d(n + 10)| is at most half a unit in place n, for every number', () => {
    fc.assert(
      fc.property(
        anyMixture,
        fc.oneof(fc.constantFrom(1, 50), fc.integer({ min: 1, max: 50 })),
        (balance, n) => {
          const finer = allNumbers(numbersOf(balance, n + 10));
          allNumbers(numbersOf(balance, n)).forEach((written, i) => {
            const difference = new Far(written).minus(finer[i] ?? NaN).abs();
            expect(difference.lessThanOrEqualTo(halfUnit(written, n))).toBe(true);
          });
        },
      ),
      { numRuns: 120 },
    );
  });

  test('permuting what is mixed permutes the answer', () => {
    fc.assert(
      fc.property(anyMixture, digitCounts, (balance, digits) => {
        const turned = {
          ...balance,
          acids: balance.acids.toReversed(),
          inert: balance.inert.toReversed(),
        };
        // How it was reached is told beside the numbers, and may differ.
        const reached = { iterations: 0, residual: '' };
        const { acids, inert, ...there } = numbersOf(turned, digits);
        expect({
          ...there,
          acids: acids.toReversed(),
          inert: inert.toReversed(),
          ...reached,
        }).toEqual({ ...numbersOf(balance, digits), ...reached });
      }),
      { numRuns: 120 },
    );
  });

  test('doubles are as near as doubles can be', () => {
    fc.assert(
      fc.property(anyMixture, (balance) => {
        const found = equilibrium(balance);
        fc.pre(found.ok);
        const answer = found.inDigits(25);
        if (!answer.ok) throw new Error(answer.reason);
        // Unbuffered, pH loses to 16 digits of a charge what the charges exceed the buffering by.
        const { pH, bufferCapacity, ionicStrengthOfComposition: strength } = answer.numbers;
        const cancelled = 1 + Number(strength) / Number(bufferCapacity);
        expect(Math.abs(found.pH - Number(pH))).toBeLessThan(1e-13 * cancelled * 15);
        expect(Math.abs(found.ionicStrength / Number(strength) - 1)).toBeLessThan(
          1e-12 * cancelled,
        );
      }),
      { numRuns: 150 },
    );
  });
});
