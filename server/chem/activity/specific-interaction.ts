import { nth } from '../decimals/nth';
import type { Ion } from './ion';
import { ionicStrength } from './ionic-strength';
import { type AmongIons, byPair, pairsAmong } from './pairs';
import { type Interaction, interactions } from './specific-interaction-data';

const table = byPair(interactions);

/**
 * Specific ion interaction (Brønsted, Guggenheim, Scatchard; as the NEA uses it):
 *
 *     lg γ_i = −z_i² D + Σ_k ε(i,k) m_k,   D = A √I/(1 + 1.5 √I),   I = ½ Σ z² m
 *
 * k over the ions of opposite charge, molalities those of free ions, 25 °C. Interactions of like
 * charges and of neutral species are 0 by convention; a missing ε counts 0 and is named.
 */
export function specificInteractionAmong(ions: readonly Ion[]): AmongIons<Interaction> {
  const { pairs, used, missing } = pairsAmong(ions, table);
  return {
    used,
    missing,
    lgGamma(arithmetic, A, molalities) {
      const { of, plus, minus, times, over, sqrt } = arithmetic;
      const root = sqrt(ionicStrength(arithmetic, ions, molalities));
      const D = over(times(A, root), plus(of(1), times(of('1.5'), root)));
      const lg = ions.map(({ charge }) => minus(of(0), times(of(charge ** 2), D)));
      for (const { cation, anion, row } of pairs) {
        const epsilon = of(row.epsilon);
        lg[cation] = plus(nth(lg, cation), times(epsilon, nth(molalities, anion)));
        lg[anion] = plus(nth(lg, anion), times(epsilon, nth(molalities, cation)));
      }
      return lg;
    },
  };
}
