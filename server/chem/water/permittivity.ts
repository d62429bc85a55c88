import type Decimal from 'decimal.js';
import type { Context } from '../decimals/contexts';
import { densityIn } from './density';
import { type Relation, toDigits } from '../decimals/right-digits';

/** N of the term N (ρ/ρc)^i (Tc/T)^j, with i and 4j as integers. */
const terms: readonly (readonly [coefficient: string, i: number, quartersOfJ: number])[] = [
  ['0.978224486826', 1, 1],
  ['-0.957771379375', 1, 4],
  ['0.237511794148', 1, 10],
  ['0.714692244396', 2, 6],
  ['-0.298217036956', 3, 6],
  ['-0.108863472196', 3, 10],
  ['0.949327488264e-1', 4, 8],
  ['-0.980469816509e-2', 5, 8],
  ['0.165167634970e-4', 6, 20],
  ['0.937359795772e-4', 7, 2],
  ['-0.123179218720e-9', 10, 40],
];
/** N₁₂ (ρ/ρc) (T/228 K − 1)^−1.2 */
const last = { coefficient: '0.196096504426e-2', kelvin: 228, exponent: '-1.2' };

const criticalKelvin = '647.096';
const criticalDensity = 322;

/** Belong to the fit, so newer values would make it worse. SI units; 1/ε₀ = 4π·10⁻⁷ c². */
const own = {
  speedOfLight: 299_792_458,
  avogadro: '6.0221367e23',
  boltzmann: '1.380658e-23',
  polarizability: '1.636e-40',
  dipole: '6.138e-30',
  molarMass: '0.018015268',
};

/** The Harris–Alder factor g, which tells how molecules turn with their neighbours. */
function correlation(context: Context, kelvin: Decimal, density: Decimal): Decimal {
  const reduced = new context(density).dividedBy(criticalDensity);
  const quarterPower = new context(criticalKelvin).dividedBy(kelvin).sqrt().sqrt();
  const above = new context(kelvin).dividedBy(last.kelvin).minus(1);
  return terms.reduce(
    (sum, [coefficient, i, quarters]) =>
      sum.plus(reduced.pow(i).times(quarterPower.pow(quarters)).times(coefficient)),
    above.pow(last.exponent).times(reduced).times(last.coefficient).plus(1),
  );
}

/** The release's relation evaluated in a context, density in kg/m³; error as in the relation. */
export function permittivityIn(context: Context, kelvin: Decimal, density: Decimal): Decimal {
  const perElectric = context
    .acos(-1)
    .times('4e-7')
    .times(own.speedOfLight)
    .times(own.speedOfLight);
  const scaled = perElectric.times(own.avogadro).times(density).dividedBy(own.molarMass);
  const a = scaled
    .times(own.dipole)
    .times(own.dipole)
    .times(correlation(context, kelvin, density))
    .dividedBy(new context(own.boltzmann).times(kelvin));
  const b = scaled.times(own.polarizability).dividedBy(3);
  const root = a
    .times(a.plus(b.times(10)).plus(2))
    .plus(b.times(b.plus(2)).times(9))
    .plus(9)
    .sqrt();
  return root
    .plus(a)
    .plus(b.times(5))
    .plus(1)
    .dividedBy(new context(4).minus(b.times(4)));
}

/**
 * Loss: the terms of g reach 150 times g in absolute value, and each is good to 300u (the 10th power
 * of a density good to 20u, the 40th of the quarter root); so g to 45,000u, and ε, no more than
 * proportional to g and ρ, to 50,000u of 120: 3·10^7·10^−p.
 */
const loss = 8;

export const permittivityRelation = (kelvin: Decimal): Relation => ({
  in: (context) => permittivityIn(context, kelvin, densityIn(context, kelvin)),
  loss,
});

/**
 * Static relative permittivity of water at T and a density in kg/m³, to `precision` right digits:
 * ε = (1 + A + 5B + √(9 + 2A + 18B + A² + 10AB + 9B²))/(4 − 4B), A = N_A μ² ρ g/(ε₀ k T M),
 * B = N_A α ρ/(3 ε₀ M). IAPWS R8-97; D. P. Fernández, A. R. H. Goodwin, E. W. Lemmon,
 * J. M. H. Levelt Sengers, R. C. Williams, J. Phys. Chem. Ref. Data 26, 1125 (1997). 238–873 K,
 * to 1,000 MPa. Other formulas of the liquid depart from it by up to 0.2 (0.1 at 25 °C).
 */
export const permittivityAt = (precision: number, kelvin: Decimal, density: Decimal): Decimal =>
  toDigits({ in: (context) => permittivityIn(context, kelvin, density), loss }, precision);

/** The same for the liquid at 0.1 MPa, 0–100 °C. */
export const permittivity = (precision: number, kelvin: Decimal): Decimal =>
  toDigits(permittivityRelation(kelvin), precision);
