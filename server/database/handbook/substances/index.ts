import { amines } from './amines';
import { aminoAcids } from './amino-acids';
import { buffers } from './buffers';
import { carboxylicAcids } from './carboxylic-acids';
import { complexingAgents } from './complexing-agents';
import { heterocycles } from './heterocycles';
import { indicators } from './indicators';
import { inorganic } from './inorganic';
import { phenolsAndImides } from './phenols-and-imides';
import type { Substance } from './substance';

/**
 * The mapping from the tables' rows to substances. Formulas and CAS numbers of what only the table
 * of thermodynamic quantities has were added from memory; a test checks every check digit and that
 * forms of one substance differ by protons alone.
 */
export const substances: readonly Substance[] = [
  ...inorganic,
  ...carboxylicAcids,
  ...phenolsAndImides,
  ...amines,
  ...heterocycles,
  ...complexingAgents,
  ...buffers,
  ...aminoAcids,
  ...indicators,
];
