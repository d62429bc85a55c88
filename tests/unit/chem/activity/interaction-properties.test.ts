import fc from 'fast-check';
import { pitzerAmong } from '../../../../server/chem/activity/pitzer';
import { specificInteractionAmong } from '../../../../server/chem/activity/specific-interaction';
import { decimals, doubles } from '../../../../server/chem/decimals/arithmetic';
import { nth } from '../../../../server/chem/decimals/nth';

/** With pairs, θ, ψ, λ, unlike charges of both signs, an unnamed ion and β2 among them. */
const all = [
  { name: 'H^+', charge: 1 },
  { name: 'Na^+', charge: 1 },
  { name: 'K^+', charge: 1 },
  { name: 'Ca^2+', charge: 2 },
  { name: undefined, charge: 2 },
  { name: 'Cl^-', charge: -1 },
  { name: 'OH^-', charge: -1 },
  { name: 'H2PO4^-', charge: -1 },
  { name: 'HPO4^2-', charge: -2 },
  { name: 'PO4^3-', charge: -3 },
  { name: 'H3PO4', charge: 0 },
];
const models = [
  ['specific ion interaction', specificInteractionAmong],
  ['Pitzer', pitzerAmong],
] as const;

const molality = fc.integer({ min: 1, max: 3_000 }).map((n) => `${n}e-3`);
const molalities = fc.array(molality, { minLength: all.length, maxLength: all.length });

const precise = decimals(60);
const A = '0.509785';

describe.each(models)('%s', (_, among) => {
  const lgGamma = (m: readonly string[], ions = all) =>
    among(ions).lgGamma(precise, precise.of(A), m.map(precise.of));

  test('the order of the ions does not matter', () => {
    const places = fc.shuffledSubarray(
      all.map((_ion, i) => i),
      { minLength: all.length },
    );
    fc.assert(
      fc.property(molalities, places, (m, order) => {
        const straight = lgGamma(m);
        const shuffled = lgGamma(
          order.map((i) => nth(m, i)),
          order.map((i) => nth(all, i)),
        );
        order.forEach((i, place) => {
          const apart = nth(shuffled, place).minus(nth(straight, i)).abs();
          expect(apart.lessThan('1e-50')).toBe(true);
        });
      }),
      { numRuns: 25 },
    );
  });

  test('doubles and decimals agree to 10⁻¹²', () => {
    fc.assert(
      fc.property(molalities, (m) => {
        const exact = lgGamma(m);
        among(all)
          .lgGamma(doubles, Number(A), m.map(Number))
          .forEach((lg, i) => {
            // Relative where γ is far from 1: a hundred terms of either sign go into it.
            const scale = Math.max(1, Math.abs(lg));
            expect(Math.abs(lg - nth(exact, i).toNumber())).toBeLessThan(1e-12 * scale);
          });
      }),
      { numRuns: 25 },
    );
  });

  test('they agree where hardly anything is dissolved, too', () => {
    const m = all.map(() => '1e-9');
    const exact = lgGamma(m);
    among(all)
      .lgGamma(doubles, Number(A), m.map(Number))
      .forEach((lg, i) => {
        expect(Math.abs(lg - nth(exact, i).toNumber())).toBeLessThan(1e-12);
      });
  });

  test('infinitely dilute, every ion follows the limiting law −A z² √I', () => {
    const m = all.map(() => '1e-30');
    const I = all.reduce((sum, { charge }) => sum + charge ** 2 / 2, 0) * 1e-30;
    lgGamma(m).forEach((lg, i) => {
      const limiting = -Number(A) * nth(all, i).charge ** 2 * Math.sqrt(I);
      // ᴱθ m falls as I^0.86, the next after √I: 10⁻¹⁰ of it here.
      expect(Math.abs(lg.toNumber() - limiting)).toBeLessThan(1e-8 * Math.sqrt(I));
    });
  });

  test('all coefficients come from one energy: ∂lg γ_i/∂m_j = ∂lg γ_j/∂m_i', () => {
    const step = precise.of('1e-15');
    const slopes = (m: readonly string[], j: number) => {
      const [above, below] = [1, -1].map((sign) =>
        lgGamma(m.map((one, i) => (i === j ? step.times(sign).plus(one).toString() : one))),
      );
      return all.map((_ion, i) =>
        nth(above ?? [], i)
          .minus(nth(below ?? [], i))
          .dividedBy(step.times(2)),
      );
    };
    fc.assert(
      fc.property(molalities, (m) => {
        const matrix = all.map((_ion, j) => slopes(m, j));
        all.forEach((_row, i) => {
          all.forEach((_column, j) => {
            // A central difference errs by step²/6 times the third derivative, at most 10⁹ here.
            const apart = nth(nth(matrix, i), j)
              .minus(nth(nth(matrix, j), i))
              .abs();
            expect(apart.lessThan('1e-20')).toBe(true);
          });
        });
      }),
      { numRuns: 5 },
    );
  });
});
