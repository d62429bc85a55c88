import type { Species } from '../../shared/species';
import type { SystemText } from '../constants/system-text';

/** `^2-`, `^+`, or nothing for a neutral form. */
const chargeSign = (charge: number) =>
  charge === 0 ? '' : `^${Math.abs(charge) === 1 ? '' : Math.abs(charge)}${charge < 0 ? '-' : '+'}`;

const protons = (count: number) => (count === 0 ? '' : count === 1 ? 'H' : `H${count}`);

/** General formulas: HₙA down to A, each with its charge. */
export const genericFormulas = ({ fullyProtonatedCharge, pKa }: SystemText): string[] =>
  Array.from(
    { length: pKa.length + 1 },
    (_, lost) => `${protons(pKa.length - lost)}A${chargeSign(fullyProtonatedCharge - lost)}`,
  );

/** Formulas of the forms; general ones where that of any form is not known. */
export function formulasOf(species: readonly Species[], system: SystemText): readonly string[] {
  const known = species.flatMap(({ formula }) => formula ?? []);
  return known.length === species.length ? known : genericFormulas(system);
}
