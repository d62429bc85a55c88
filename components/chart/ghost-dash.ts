/** Dashes of single lines that a first one is compared with: the second is dotted everywhere. */
const dashes = ['5 3', '1.5 3'] as const;

/** Dash of the ghost at a place among the ghosts. */
export const ghostDash = (place: number): string => dashes[place % dashes.length] ?? dashes[0];
