import { type Arithmetic, sum } from '../decimals/arithmetic';
import { nth } from '../decimals/nth';
import type { Ion } from './ion';
import { ionicStrength } from './ionic-strength';
import { type AmongIons, byPair, pairsAmong, placesOf } from './pairs';
import { type PitzerPair, pitzerMixing, pitzerPairs, type PitzerRow } from './pitzer-data';
import { electrostaticMixing, type Screening, screening } from './pitzer-functions';

const table = byPair(pitzerPairs);

/** Where the members of the rows about more than a cation and an anion stand in a list. */
const mixingAmong = (ions: readonly Ion[]) =>
  pitzerMixing.flatMap((row) =>
    row.among
      .reduce<number[][]>(
        (chosen, name) => chosen.flatMap((few) => placesOf(ions, name).map((i) => [...few, i])),
        [[]],
      )
      .map((places) => ({ row, places })),
  );

/** Places of ions of one sign and unlike charge, each two once. */
const unlikeAmong = (ions: readonly Ion[]) =>
  ions.flatMap((first, i) =>
    ions.flatMap((second, j) =>
      i < j && first.charge * second.charge > 0 && first.charge !== second.charge
        ? [[i, j] as const]
        : [],
    ),
  );

const b = '1.2';
/** α of β1, smaller between ions that are both divalent, and of β2, (kg/mol)^½. */
const alphaOf = (cation: Ion, anion: Ion) =>
  cation.charge === 2 && anion.charge === -2 ? '1.4' : '2';
const alphaOfBeta2 = '12';

/** B and I dB/dI of a pair, and C: its second and third virial coefficients. */
function virialCoefficients<N>(arithmetic: Arithmetic<N>, root: N, ions: readonly Ion[]) {
  const { of, plus, times, over, sqrt } = arithmetic;
  const screenings = new Map<string, Screening<N>>();
  const screened = (alpha: string) => {
    const found = screenings.get(alpha) ?? screening(arithmetic, times(of(alpha), root));
    screenings.set(alpha, found);
    return found;
  };
  return ({ cation, anion, row }: { cation: number; anion: number; row: PitzerPair }) => {
    const [positive, negative] = [nth(ions, cation), nth(ions, anion)];
    const first = screened(alphaOf(positive, negative));
    let B = plus(of(row.beta0), times(of(row.beta1), first.value));
    let slopeTimesI = times(of(row.beta1), first.slopeTimesI);
    if (row.beta2 !== undefined) {
      const second = screened(alphaOfBeta2);
      B = plus(B, times(of(row.beta2), second.value));
      slopeTimesI = plus(slopeTimesI, times(of(row.beta2), second.slopeTimesI));
    }
    const product = of(-positive.charge * negative.charge);
    return { B, slopeTimesI, C: over(of(row.cphi), times(of(2), sqrt(product))) };
  };
}

/**
 * Pitzer's equations at 25 °C, K. S. Pitzer, J. Phys. Chem. 77, 268 (1973), for single ions as
 * C. E. Harvie, N. Møller & J. H. Weare, Geochim. Cosmochim. Acta 48, 723 (1984), write them:
 *
 *     ln γ_i = z_i² F + Σ_k m_k (2 B_ik + Z C_ik) + |z_i| Σ_c Σ_a m_c m_a C_ca
 *              + Σ_l m_l (2 Φ_il + Σ_k m_k ψ_ilk) + Σ_{k<k′} m_k m_k′ ψ_kk′i + 2 Σ_n λ_ni m_n
 *     F = −A_φ (√I/(1 + b√I) + (2/b) ln(1 + b√I)) + Σ_c Σ_a m_c m_a B′_ca + Σ_{i<l} m_i m_l Φ′_il
 *     ln γ_n = 2 Σ_i λ_ni m_i
 *
 * k of the opposite sign, l of the same, n neutral; b = 1.2, A_φ = A ln10/3, Z = Σ |z| m,
 * C = Cφ/(2 √|z_c z_a|), Φ = θ + ᴱθ. What has no row counts 0; ᴱθ needs none.
 * All of it is the derivative of one excess energy, so that ∂ln γ_i/∂m_j = ∂ln γ_j/∂m_i.
 */
export function pitzerAmong(ions: readonly Ion[]): AmongIons<PitzerRow> {
  const { pairs, used, missing } = pairsAmong(ions, table);
  const mixing = mixingAmong(ions);
  const unlike = unlikeAmong(ions);
  return {
    used: [...used, ...new Set(mixing.map(({ row }) => row))],
    missing,
    lgGamma<N>(arithmetic: Arithmetic<N>, A: N, molalities: readonly N[]) {
      const { of, plus, minus, times, over, sqrt, ln, isZero } = arithmetic;
      const I = ionicStrength(arithmetic, ions, molalities);
      const lnGamma = ions.map(() => of(0));
      if (isZero(I)) return lnGamma;

      const m = (i: number) => nth(molalities, i);
      const add = (i: number, ...factors: N[]) => {
        lnGamma[i] = plus(
          nth(lnGamma, i),
          factors.reduce((product, each) => times(product, each)),
        );
      };
      const ln10 = ln(of(10));
      const Aphi = times(A, over(ln10, of(3)));
      const root = sqrt(I);
      const crowd = plus(of(1), times(of(b), root));
      const limiting = plus(over(root, crowd), times(over(of(2), of(b)), ln(crowd)));
      let F = minus(of(0), times(Aphi, limiting));

      const Z = sum(
        arithmetic,
        ions.map(({ charge }, i) => times(of(Math.abs(charge)), m(i))),
      );
      let thirds = of(0);
      const virial = virialCoefficients(arithmetic, root, ions);
      for (const pair of pairs) {
        const { B, slopeTimesI, C } = virial(pair);
        const own = plus(times(of(2), B), times(Z, C));
        add(pair.cation, m(pair.anion), own);
        add(pair.anion, m(pair.cation), own);
        const product = times(m(pair.cation), m(pair.anion));
        F = plus(F, times(product, over(slopeTimesI, I)));
        thirds = plus(thirds, times(product, C));
      }

      // θ and λ enter twice, ψ once, each with the molalities of the others in its row.
      for (const { row, places } of mixing) {
        const value = times(of(places.length === 2 ? 2 : 1), of(row.value));
        for (const i of places) add(i, value, ...places.filter((other) => other !== i).map(m));
      }
      const electrostatic = electrostaticMixing(arithmetic, Aphi, I);
      for (const [i, j] of unlike) {
        const { theta, slope } = electrostatic(nth(ions, i).charge, nth(ions, j).charge);
        add(i, of(2), theta, m(j));
        add(j, of(2), theta, m(i));
        F = plus(F, times(slope, times(m(i), m(j))));
      }

      return ions.map(({ charge }, i) => {
        add(i, of(charge ** 2), F);
        add(i, of(Math.abs(charge)), thirds);
        return over(nth(lnGamma, i), ln10);
      });
    },
  };
}
