import type { z } from 'zod';
import type { systemInput } from '../../shared/system';
import type { SystemText } from './system-text';

export interface StoredChoice {
  readonly kind: 'stored';
  readonly id: string;
}

/** A stored system by its id, or one that was typed. */
export type Choice = StoredChoice | { readonly kind: 'typed'; readonly system: SystemText };

/** The system as a call asks for it. */
export function systemAsked(choice: Choice): z.input<typeof systemInput> {
  if (choice.kind === 'stored') return { id: choice.id };
  const { name, ...system } = choice.system;
  return name === undefined ? system : { name, ...system };
}

/** What typing begins with where no system is drawn yet. */
export const plainSystem: SystemText = { fullyProtonatedCharge: 0, pKa: ['7'] };
