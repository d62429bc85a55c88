import type { StoredSystem } from '../../shared/stored-system';
import type { Choice } from '../constants/choice';
import { formulasOf, genericFormulas } from '../curves/species-formulas';
import { systemTitle } from '../handbook/system-title';

/** What is known of a system before anything is computed with it. */
export interface KnownSystem {
  readonly title: string;
  readonly fullyProtonatedCharge: number;
  /** Formulas of its forms, by protons lost. */
  readonly formulas: readonly string[];
}

/** A system of the handbook as it was read. */
export const storedSystem = (system: StoredSystem): KnownSystem => ({
  title: systemTitle(system.name),
  fullyProtonatedCharge: system.fullyProtonatedCharge,
  formulas: formulasOf(system.species, system),
});

/** A system as it was typed. */
export const typedSystem = ({ system }: Extract<Choice, { kind: 'typed' }>): KnownSystem => ({
  title: system.name ?? 'Your own constants',
  fullyProtonatedCharge: system.fullyProtonatedCharge,
  formulas: genericFormulas(system),
});

/** Protons lost of the uncharged form; undefined where every form is charged. */
export function unchargedForm({ fullyProtonatedCharge, formulas }: KnownSystem) {
  const lost = fullyProtonatedCharge;
  return lost >= 0 && lost < formulas.length ? lost : undefined;
}

/** The form that a component is weighed in as: the one chosen, else the uncharged, else the first. */
export const formOf = (form: number | undefined, system: KnownSystem): number =>
  form !== undefined && form < system.formulas.length ? form : (unchargedForm(system) ?? 0);
