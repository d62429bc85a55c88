/** The model's version, raised whenever a digit of an answer changes. */
export const engineVersion = '1';

export { type AcidBaseSystem, effectivePKa, invertedNeighbours, speciesOf } from './forms/system';
export type { PHPoints } from './forms/ph-points';
export { type FractionPoint, fractionPoints, fractionRows } from './forms/fraction-points';
export { predominanceRanges } from './forms/predominance';
