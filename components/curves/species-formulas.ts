import type { Choice } from './curves-state';
import { exampleOf, systemOf } from './curves-state';
import type { SystemText } from './system-text';

/** `^2-`, `^+`, or nothing for a neutral form. */
const chargeSign = (charge: number) =>
  charge === 0 ? '' : `^${Math.abs(charge) === 1 ? '' : Math.abs(charge)}${charge < 0 ? '-' : '+'}`;

const protons = (count: number) => (count === 0 ? '' : count === 1 ? 'H' : `H${count}`);

/** Formulas of a typed system: HₙA down to A, each with its charge. */
export const genericFormulas = ({ fullyProtonatedCharge, pKa }: SystemText): string[] =>
  Array.from(
    { length: pKa.length + 1 },
    (_, lost) => `${protons(pKa.length - lost)}A${chargeSign(fullyProtonatedCharge - lost)}`,
  );

/** Formulas of the forms that are drawn, from fully protonated to fully deprotonated. */
export const formulasOf = (choice: Choice): readonly string[] =>
  exampleOf(choice)?.formulas ?? genericFormulas(systemOf(choice));
