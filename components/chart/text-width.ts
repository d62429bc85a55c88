import { parseFormula } from '../ui/formula-parts';

/** Advance of every glyph of the figures' monospaced face, em. */
const advance = 0.6;

/** Size of sub- and superscripts against the base, and how far they are moved, em of the base. */
export const scriptSize = 0.72;
export const subDrop = 0.2;
export const supRise = 0.36;

/** Width of a run of figures, px. Combining marks take no room. */
export const numeralsWidth = (text: string, size: number) =>
  [...text.replace(/\p{M}/gu, '')].length * advance * size;

/** Width of a formula, px. */
export const formulaWidth = (formula: string, size: number) =>
  parseFormula(formula).reduce(
    (sum, { text, place }) =>
      sum + numeralsWidth(text, place === 'base' ? size : size * scriptSize),
    0,
  );
