import type { MixtureAnswer } from '../../shared/mixtures';

type Component = MixtureAnswer['components'][number];

/** lg of a decimal as the API writes it, rarer than a double can hold too; −∞ for 0. */
function lgOf(text: string): number {
  const [significand = '', exponent = '0'] = text.toLowerCase().split('e');
  return Math.log10(Number(significand)) + Number(exponent);
}

const ln10 = Math.LN10;

/**
 * Part of a component in the buffer capacity, mol/L per pH, at a pH so far from the answer's, with
 * the activity coefficients of the answer kept: the amount of form j over that of form 0 then
 * changes by exactly 10^(j·d), so the answer's own digits carry over.
 *
 * A component with a fixed total gives ln10·c·v, v the variance of the charge (Van Slyke, J. Biol.
 * Chem. 52, 525 (1922)); one that a gas holds, whose uncharged form is fixed, ln10·Σ c z².
 */
export function capacityOf(component: Component, fromPH: number): number {
  const { species, heldBy } = component;
  if (heldBy !== null) {
    return (
      ln10 *
      species.reduce((sum, { charge, concentration }) => {
        // Losing protons from the uncharged form, charge falls as their number rises.
        return sum + charge ** 2 * 10 ** (lgOf(concentration) - charge * fromPH);
      }, 0)
    );
  }
  const lgs = species.map(({ fraction }, j) => lgOf(fraction) + j * fromPH);
  const most = Math.max(...lgs);
  const amounts = lgs.map((lg) => 10 ** (lg - most));
  const total = amounts.reduce((sum, amount) => sum + amount, 0);
  const alphas = amounts.map((amount) => amount / total);
  // Σ(i<j) (j − i)² αᵢ αⱼ is the variance, and loses no digit where it is small.
  let variance = 0;
  for (const [i, lower] of alphas.entries()) {
    for (let j = i + 1; j < alphas.length; j++) {
      variance += (j - i) ** 2 * lower * (alphas[j] ?? 0);
    }
  }
  return ln10 * Number(component.total) * variance;
}

/** Part of water in the buffer capacity, mol/L per pH, at a pH so far from the answer's. */
export const capacityOfWater = (
  { hydrogen, hydroxide }: Pick<MixtureAnswer, 'hydrogen' | 'hydroxide'>,
  fromPH: number,
): number => ln10 * (Number(hydrogen) * 10 ** -fromPH + Number(hydroxide) * 10 ** fromPH);
