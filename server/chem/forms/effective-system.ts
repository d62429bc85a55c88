import { type ActivityChoice, coefficientsOf, type SizedIon } from '../activity/coefficients';
import { decimals } from '../decimals/arithmetic';
import { Exact } from '../decimals/contexts';
import { nth } from '../decimals/nth';
import type { ConstantKind } from '../constants/constant-kind';
import type { AcidBaseSystem } from './system';

/** A system whose constants are given for a medium. */
export interface SystemInMedium extends AcidBaseSystem {
  readonly kinds: readonly ConstantKind[];
  readonly species: readonly SizedIon[];
}

/**
 * Places after the point of an effective constant. Taken as exact from there on: 60 digits of any
 * answer are decided long before, and shifts that cancel leave the constants exactly as given.
 */
export const effectivePlaces = 150;

/** Digits that lg γ is computed with: integer parts to four digits, and some to spare. */
const precision = effectivePlaces + 20;

/**
 * The constants pK′ that the fractions use on the pH scale, as a system of its own:
 *
 *     thermodynamic  pK′_j = pK°_j + lg γ_j − lg γ_{j−1}
 *     concentration  pK′_j = pK_c,j − lg γ(H⁺)
 *     mixed          pK′_j as given
 *
 * For a model whose coefficients follow from a given ionic strength alone.
 */
export function effectiveSystem(system: SystemInMedium, activity: ActivityChoice): AcidBaseSystem {
  if (activity.model === 'ideal') return system;
  const arithmetic = decimals(precision);
  const ions = [{ name: 'H^+', charge: 1 }, ...system.species];
  const { classOf, lgGamma } = coefficientsOf(ions, activity);
  // Rounded once, so that γ of equal charges are equal and opposite shifts cancel.
  const ofClass = lgGamma(arithmetic, []).map((lg) => lg.toDecimalPlaces(effectivePlaces));
  const lg = classOf.map((one) => new Exact(nth(ofClass, one)));
  return {
    fullyProtonatedCharge: system.fullyProtonatedCharge,
    pKa: system.pKa.map((pKa, i) => {
      const given = new Exact(pKa);
      const kind = system.kinds[i];
      if (kind === 'thermodynamic') {
        return given
          .plus(nth(lg, i + 2))
          .minus(nth(lg, i + 1))
          .toFixed();
      }
      return kind === 'concentration' ? given.minus(nth(lg, 0)).toFixed() : pKa;
    }),
  };
}
