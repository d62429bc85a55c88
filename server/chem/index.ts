/** The model's version, raised whenever a digit of an answer changes. */
export const engineVersion = '1';

export { type AcidBaseSystem, effectivePKa, invertedNeighbours, speciesOf } from './system';
export type { PHPoints } from './ph-points';
export { type FractionPoint, fractionPoints, fractionRows } from './fraction-points';
export { predominanceRanges } from './predominance';
