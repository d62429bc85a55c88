import type Decimal from 'decimal.js';
import type { Context } from '../decimals/contexts';
import { densityIn } from './density';
import { permittivityIn } from './permittivity';
import {
  avogadroConstant,
  boltzmannConstant,
  electricConstant,
  elementaryCharge,
} from './physical-constants';
import { type Relation, toDigits } from '../decimals/right-digits';

/** A in (kg/mol)^½ for lg γ, and B in (kg/mol)^½/nm. */
export interface DebyeHuckelConstants {
  readonly A: Decimal;
  readonly B: Decimal;
}

/**
 * A and B of a solvent of any relative permittivity and density (kg/m³), evaluated in a context.
 * The Bjerrum length l = e²/(4π ε₀ ε k T) is where two unit charges hold each other with kT; one
 * over the thickness of the ionic atmosphere is κ = √(8π l N_A ρ I), I in mol/kg; and
 * ln γ = −z² (l/2) κ/(1 + κ å). So B = √(8π l N_A ρ) and A = B l/(2 ln 10).
 */
export function debyeHuckelIn(
  context: Context,
  kelvin: Decimal,
  { permittivity, density }: { permittivity: Decimal; density: Decimal },
): DebyeHuckelConstants {
  const pi = context.acos(-1);
  const charge = new context(elementaryCharge);
  const bjerrum = charge
    .times(charge)
    .dividedBy(
      pi
        .times(4)
        .times(electricConstant)
        .times(permittivity)
        .times(boltzmannConstant)
        .times(kelvin),
    );
  const perMetre = pi.times(8).times(bjerrum).times(avogadroConstant).times(density).sqrt();
  return {
    A: perMetre.times(bjerrum).dividedBy(context.ln(10).times(2)),
    B: perMetre.times('1e-9'),
  };
}

const liquidIn = (context: Context, kelvin: Decimal) => {
  const density = densityIn(context, kelvin);
  const permittivity = permittivityIn(context, kelvin, density);
  return debyeHuckelIn(context, kelvin, { permittivity, density });
};

/** Loss: ε is good to 50,000u; 1.5 times that, of A below 1, and half that, of B below 4: 10^6. */
export const debyeHuckelRelations = (kelvin: Decimal): { A: Relation; B: Relation } => ({
  A: { in: (context) => liquidIn(context, kelvin).A, loss: 7 },
  B: { in: (context) => liquidIn(context, kelvin).B, loss: 7 },
});

/**
 * Debye–Hückel constants of liquid water at 0.1 MPa, 0–100 °C, molal, to `precision` right digits:
 * CODATA 2018, permittivity by IAPWS R8-97, density by Kell 1975. P. Debye, E. Hückel, Physik. Z.
 * 24, 185 (1923). Printed values of A differ by up to 0.4 % with the permittivity they rest on.
 */
export function debyeHuckel(precision: number, kelvin: Decimal): DebyeHuckelConstants {
  const { A, B } = debyeHuckelRelations(kelvin);
  return { A: toDigits(A, precision), B: toDigits(B, precision) };
}
