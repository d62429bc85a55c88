import fc from 'fast-check';
import { type Balance, effectiveSystem, equilibrium, fractionPoints } from '../../server/chem';
import { decimalWithin } from './generators';
import { Far } from './mixture-oracle';
import {
  acidOf,
  activityOf,
  concentrations,
  ideal,
  inertOf,
  ionicStrengths,
  mixtureOf,
  pKw,
  plainModels,
  type Weighed,
  weighedAcids,
} from './mixtures';

function numbersOf(balance: Balance, digits: number) {
  const found = equilibrium(balance);
  const answer = found.ok ? found.inDigits(digits) : found;
  if (!answer.ok) throw new Error(answer.reason);
  return answer.numbers;
}

const given = fc.tuple(plainModels, ionicStrengths).map(([model, I]) => activityOf(model, I));
const mixed = fc.tuple(fc.array(weighedAcids(), { minLength: 1, maxLength: 4 }), given);

/** A strong base is its cation, a strong acid its anion. */
const strong = (amount: string) =>
  amount.startsWith('-') ? inertOf(-1, amount.slice(1)) : inertOf(1, amount);

describe('what follows from the equilibrium of a mixture', () => {
  test('buffer capacity is positive and is dQ/dpH by a difference, at constant ionic strength', () => {
    const digits = 60;
    const h = '1e-20';
    fc.assert(
      fc.property(mixed, ([acids, activity]) => {
        const with_ = (base: string) => mixtureOf(acids, [strong(base)], activity);
        const capacity = new Far(numbersOf(with_('0'), digits).bufferCapacity);
        expect(capacity.isPositive()).toBe(true);
        const [above, below] = [h, `-${h}`].map((base) => numbersOf(with_(base), digits).pH);
        const rise = new Far(above ?? NaN).minus(below ?? NaN);
        const found = new Far(h).times(2).dividedBy(rise);
        // What is left of a central difference is of the order of (h/β)², the charges' rounding 1e-38/h.
        const left = new Far(h).dividedBy(capacity).pow(2).times(100).plus('1e-30');
        expect(found.dividedBy(capacity).minus(1).abs().lessThan(left)).toBe(true);
      }),
      { numRuns: 60 },
    );
  });

  test('strong base raises the pH, strong acid lowers it', () => {
    fc.assert(
      fc.property(mixed, concentrations(-6, 0), ([acids, activity], amount) => {
        const pH = (base: string) =>
          new Far(numbersOf(mixtureOf(acids, [strong(base)], activity), 40).pH);
        expect(pH(amount).greaterThan(pH('0'))).toBe(true);
        expect(pH(`-${amount}`).lessThan(pH('0'))).toBe(true);
      }),
      { numRuns: 60 },
    );
  });

  test('a shift of every constant shifts a charge balance without water', () => {
    // [H⁺] and [OH⁻] have no place on the shifted scale: they are left out.
    fc.assert(
      fc.property(
        fc.array(weighedAcids(), { minLength: 2, maxLength: 4 }),
        decimalWithin(-8, 8),
        (acids, by) => {
          const balance = (list: readonly Weighed[]): Balance => ({
            ...mixtureOf(list, [], ideal),
            pKw: undefined,
          });
          const moved = acids.map((acid) => ({
            ...acid,
            pKa: acid.pKa.map((each) => new Far(each).plus(by).toFixed()),
          }));
          const [here, there] = [equilibrium(balance(acids)), equilibrium(balance(moved))];
          fc.pre(acids.some(({ reference }) => reference > 0));
          fc.pre(acids.some(({ reference, pKa }) => reference < pKa.length));
          expect(here.ok && there.ok).toBe(true);
          if (!here.ok || !there.ok) return;
          expect(there.pH - here.pH).toBeCloseTo(Number(by), 9);
        },
      ),
      { numRuns: 150 },
    );
  });

  test('mirrored at the neutral point, acids become bases: pH and pKa for pKw minus themselves', () => {
    // H⁺ and OH⁻ change places where every charge changes sign; each γ is one of |z| here.
    const models = fc.constantFrom('ideal', 'davies', 'guntelberg', 'debye-huckel' as const);
    fc.assert(
      fc.property(
        fc.array(weighedAcids(concentrations(-5, -2)), { minLength: 1, maxLength: 3 }),
        models,
        ionicStrengths,
        (weighed, model, I) => {
          const acids = weighed.map((acid): Weighed => ({ ...acid, kind: 'thermodynamic' }));
          const mirrored = acids.map((acid): Weighed => ({
            ...acid,
            charge: acid.pKa.length - acid.charge,
            pKa: acid.pKa.map((each) => new Far(pKw).minus(each).toFixed()).toReversed(),
            reference: acid.pKa.length - acid.reference,
          }));
          const activity = activityOf(model, I);
          const here = numbersOf(mixtureOf(acids, [], activity), 40);
          const there = numbersOf(mixtureOf(mirrored, [], activity), 40);
          expect(new Far(here.pH).plus(there.pH).minus(pKw).abs().lessThan('1e-37')).toBe(true);
          expect(there.hydroxide).toBe(here.hydrogen);
          expect(there.bufferCapacity).toBe(here.bufferCapacity);
        },
      ),
      { numRuns: 60 },
    );
  });

  test('two routes to one composition agree: acid and strong base, or half of it as its salt', () => {
    const digits = 40;
    fc.assert(
      fc.property(
        weighedAcids(),
        given,
        fc.integer({ min: 1, max: 99 }),
        (acid, activity, share) => {
          fc.pre(acid.pKa.length > acid.reference);
          const part = new Far(acid.amount).times(share).dividedBy(100);
          const rest = new Far(acid.amount).minus(part);
          const salt = {
            ...acid,
            reference: acid.reference + 1,
            amount: part.toFixed(),
          };
          const neutralised = mixtureOf([acid], [strong(part.toFixed())], activity);
          const together = mixtureOf([{ ...acid, amount: rest.toFixed() }, salt], [], activity);
          const [one, other] = [numbersOf(neutralised, digits), numbersOf(together, digits)];
          expect(other.pH).toBe(one.pH);
          expect(other.bufferCapacity).toBe(one.bufferCapacity);
        },
      ),
      { numRuns: 60 },
    );
  });

  test('KH2PO4 and as much NaOH is a solution of KNaHPO4, by every model', () => {
    const pKa = ['2.148', '7.198', '12.35'];
    const names = ['H3PO4', 'H2PO4^-', 'HPO4^2-', 'PO4^3-'];
    const phosphate = { charge: 0, pKa, names, amount: '0.025', held: false };
    const models = [
      'ideal',
      'extended-debye-huckel',
      'guntelberg',
      'davies',
      'specific-ion-interaction',
      'pitzer',
    ] as const;
    for (const model of models) {
      const [sodium, potassium] = [inertOf(1, '0.025', 'Na^+'), inertOf(1, '0.025', 'K^+')];
      const as = (reference: number): Balance => ({
        acids: [acidOf({ ...phosphate, reference })],
        inert: [sodium, potassium],
        pKw,
        activity: activityOf(model),
      });
      // How it was reached is told beside the numbers, and may differ.
      const reached = { iterations: 0, residual: '' };
      expect({ ...numbersOf(as(2), 30), ...reached }).toEqual({
        ...numbersOf(as(1), 30),
        ...reached,
      });
    }
  });

  test('fractions in a mixture are those of the effective system at its pH', () => {
    const digits = 20;
    fc.assert(
      fc.property(mixed, ([acids, activity]) => {
        const numbers = numbersOf(mixtureOf(acids, [], activity), 50);
        acids.forEach((weighed, k) => {
          const acid = acidOf(weighed);
          const system = effectiveSystem(
            { fullyProtonatedCharge: weighed.charge, ...acid },
            activity,
          );
          const values = [numbers.pH];
          const [point] = fractionPoints(system, { kind: 'list', values }, digits);
          const printed = numbers.acids[k]?.species ?? [];
          expect(point?.fractions).toHaveLength(printed.length);
          point?.fractions.forEach((fraction, j) => {
            const off = new Far(printed[j]?.fraction ?? NaN).dividedBy(fraction).minus(1).abs();
            // Half a unit of 20 digits; the pH's 50 digits add nothing.
            expect(off.lessThanOrEqualTo('5.0001e-20')).toBe(true);
          });
        });
      }),
      { numRuns: 60 },
    );
  });

  test('what a gas holds stays at its concentration, whatever base is added', () => {
    const carbonate = { charge: 0, pKa: ['6.351', '10.329'], reference: 0, held: true } as const;
    fc.assert(
      fc.property(concentrations(-8, -1), concentrations(-7, 0), given, (held, base, activity) => {
        const { acids } = numbersOf(
          mixtureOf([{ ...carbonate, amount: held }], [inertOf(1, base)], activity),
          30,
        );
        const [acid] = acids;
        expect(new Far(acid?.species[0]?.concentration ?? NaN).equals(held)).toBe(true);
        const total = (acid?.species ?? []).reduce(
          (sum, { concentration }) => sum.plus(concentration),
          new Far(0),
        );
        expect(
          total
            .dividedBy(acid?.total ?? NaN)
            .minus(1)
            .abs()
            .lessThan('1e-28'),
        ).toBe(true);
      }),
      { numRuns: 60 },
    );
  });
});
